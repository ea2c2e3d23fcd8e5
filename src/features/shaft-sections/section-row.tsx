import type { MouseEvent } from 'react'
import { Cell } from '@/components/data-table'
import { Icon } from '@/components/icon'
import { Menu } from '@/components/menu'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { sectionAddress } from '@/fields/part-address'
import { formatGiven } from '@/lib/format-quantity'
import type { QuantityKind, UnitSystem } from '@/lib/quantity-units'
import { useSelectionStore } from '@/stores/selection-store'
import type { LayoutDocument, ShaftSection } from '@shared/layout/layout-document'
import type { SectionSpan } from '@shared/layout/shaft-geometry'
import {
  addSection,
  duplicateSection,
  moveSection,
  removeSection,
  type SectionEdit,
} from './section-operations'

interface SectionRowProps {
  span: SectionSpan
  number: number
  layout: LayoutDocument
  canEdit: boolean
  units: UnitSystem
  run: (edit: SectionEdit) => void
}

interface Column {
  field: keyof ShaftSection
  label: string
  kind: QuantityKind
  min: number
  max: number
  isMinExclusive?: boolean
  isOptional?: boolean
  step?: number
}

export function SectionRow({ span, number, layout, canEdit, units, run }: SectionRowProps) {
  const { section, startMm, endMm } = span
  const isSelected = useSelectionStore((state) => state.selectedIds.includes(section.id))
  const isHovered = useSelectionStore((state) => state.hoveredId === section.id)
  const select = useSelectionStore((state) => state.select)
  const toggle = useSelectionStore((state) => state.toggle)
  const hover = useSelectionStore((state) => state.hover)
  const station = (mm: number) => formatGiven(Number(mm.toFixed(3)), 'length', units).number
  const choose = (event: MouseEvent) => {
    if (event.ctrlKey || event.metaKey || event.shiftKey) toggle(section.id)
    else select([section.id])
  }
  const parts = [
    ...layout.hubs
      .filter(({ stationMm, lengthMm }) => stationMm < endMm - 1e-6 && stationMm + lengthMm > startMm + 1e-6)
      .map(({ name }) => name),
    ...layout.bearings
      .filter(({ stationMm }) => stationMm >= startMm && stationMm < endMm)
      .map(({ name }) => `bearing ${name}`),
  ]
  const columns: readonly Column[] = [
    { field: 'lengthMm', label: 'Length', kind: 'length', min: 0, isMinExclusive: true, max: 20_000 },
    {
      field: 'outerDiameterMm',
      label: 'Outer diameter',
      kind: 'length',
      min: section.boreDiameterMm,
      isMinExclusive: true,
      max: 5_000,
    },
    { field: 'boreDiameterMm', label: 'Bore diameter', kind: 'length', min: 0, max: section.outerDiameterMm },
    { field: 'roughnessRzUm', label: 'Roughness', kind: 'roughness', min: 0, max: 1_000 },
    {
      field: 'rightFilletMm',
      label: 'Fillet at the right end',
      kind: 'length',
      min: 0,
      max: 500,
      isOptional: true,
      step: 0.1,
    },
  ]

  return (
    <tr
      aria-selected={isSelected}
      className={isSelected ? 'bg-steel-soft' : isHovered ? 'bg-paper' : ''}
      onClick={choose}
      onFocus={() => !isSelected && select([section.id])}
      onPointerEnter={() => hover(section.id)}
      onPointerLeave={() => hover(null)}
    >
      <Cell className="py-1!">
        <button
          type="button"
          aria-pressed={isSelected}
          aria-label={`Select section ${number}`}
          className={`min-w-6 rounded px-1 text-left tabular-nums ${isSelected ? 'font-bold text-steel' : 'text-quiet'}`}
        >
          {number}
        </button>
      </Cell>
      <Cell align="right" className="py-1! tabular-nums">
        {station(startMm)}
      </Cell>
      <Cell align="right" className="py-1! tabular-nums">
        {station(endMm)}
      </Cell>
      {columns.map(({ field, label, ...rest }) => (
        <Cell key={field} align="right" className="py-1! pr-1.5! pl-1!">
          <LayoutQuantityField
            {...rest}
            label={`${label} of section ${number}`}
            arrangement="cell"
            placeholder={rest.isOptional ? 'sharp' : undefined}
            address={sectionAddress([section], field, () => number)}
            className="ml-auto w-24"
          />
        </Cell>
      ))}
      <Cell className="max-w-64 truncate py-1! text-quiet" title={parts.join(', ')}>
        {parts.join(', ')}
      </Cell>
      {canEdit && (
        <Cell align="right" className="py-1!" onClick={(event) => event.stopPropagation()}>
          <Menu
            label={`Section ${number}`}
            button={<Icon name="more" />}
            buttonClassName="rounded px-2 py-1 hover:bg-paper"
            items={[
              {
                label: 'Insert a section before',
                icon: 'add',
                onSelect: () => run(addSection(layout, number - 1)),
              },
              {
                label: 'Insert a section after',
                icon: 'add',
                onSelect: () => run(addSection(layout, number)),
              },
              { label: 'Duplicate', icon: 'copy', onSelect: () => run(duplicateSection(layout, section)) },
              {
                label: 'Move to the left',
                icon: 'arrowUp',
                isDisabled: number === 1,
                onSelect: () => run(moveSection(layout, section, -1)),
              },
              {
                label: 'Move to the right',
                icon: 'arrowDown',
                isDisabled: number === layout.shaft.sections.length,
                onSelect: () => run(moveSection(layout, section, 1)),
              },
              { kind: 'separator' },
              {
                label: 'Delete',
                icon: 'trash',
                isDangerous: true,
                onSelect: () => run(removeSection(layout, section)),
              },
            ]}
          />
        </Cell>
      )}
    </tr>
  )
}
