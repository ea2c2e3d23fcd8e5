import { CRITERIA_FIELDS } from '@/fields/criteria-fields'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { LayoutTextField } from '@/fields/layout-text-field'
import { criteriaAddress } from '@/fields/part-address'
import { formatGiven } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import { useResultsStore } from '@/stores/results-store'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { totalLengthMm } from '@shared/layout/shaft-geometry'
import { EditingNow } from './editing-now'
import { FieldGrid, Group } from './inspector-parts'
import { MaterialFields, Unfolding } from './lazy-fields'
import { materialWords } from './material-words'

/** Nothing selected: the layout itself. */
export function LayoutInspector({ layout, units }: { layout: LayoutDocument; units: UnitSystem }) {
  const findings = useResultsStore((state) => state.results?.findings)
  const count = (severity: string) => findings?.filter((finding) => finding.severity === severity).length ?? 0
  const facts = [
    `${layout.hubs.length} ${layout.hubs.length === 1 ? 'hub' : 'hubs'}`,
    `${layout.bearings.length} ${layout.bearings.length === 1 ? 'bearing' : 'bearings'}`,
    `${layout.shaft.sections.length} ${layout.shaft.sections.length === 1 ? 'section' : 'sections'}`,
    `${formatGiven(Number(totalLengthMm(layout).toFixed(3)), 'length', units).text} long`,
    `${layout.loadCases.length} ${layout.loadCases.length === 1 ? 'load case' : 'load cases'}`,
  ]
  return (
    <>
      <header>
        <LayoutTextField
          label="Name of the layout"
          arrangement="title"
          address={{
            label: 'Rename the layout',
            field: 'name',
            targets: [{ target: { kind: 'layout' }, value: layout.name }],
          }}
        />
        <p className="text-[13px] text-quiet">{facts.join(', ')}</p>
        {findings !== undefined && (
          <p className="mt-1 text-[13px]">
            <span className={count('fails') > 0 ? 'font-semibold text-bad' : ''}>
              {count('fails') > 0 && <span aria-hidden="true">✕ </span>}
              {count('fails')} failing
            </span>
            , {count('warns')} {count('warns') === 1 ? 'warning' : 'warnings'}, {count('notes')}{' '}
            {count('notes') === 1 ? 'note' : 'notes'}
          </p>
        )}
      </header>
      <Group title="Shaft material">
        <EditingNow partKey="shaft:" />
        <Unfolding summary={materialWords(layout.shaft.material, units)}>
          <MaterialFields
            label="Material of the shaft"
            units={units}
            material={layout.shaft.material}
            address={{
              label: 'Change the shaft material',
              field: 'material',
              targets: [{ target: { kind: 'shaft' }, value: layout.shaft.material }],
            }}
          />
        </Unfolding>
      </Group>
      <Group title="Acceptance criteria" note="least or most allowed">
        <FieldGrid>
          {CRITERIA_FIELDS.map(({ field, label, kind, isOptional, isZeroAllowed, max }) => (
            <LayoutQuantityField
              key={field}
              label={label}
              kind={kind}
              address={criteriaAddress(layout.criteria, field)}
              isOptional={isOptional}
              placeholder={isOptional ? 'not judged' : undefined}
              min={0}
              isMinExclusive={isZeroAllowed !== true}
              max={max}
            />
          ))}
        </FieldGrid>
      </Group>
      <p className="mt-4 text-xs text-quiet">
        Select a part on the drawing or in the schedule to see and change it here.
      </p>
    </>
  )
}
