/** The shaft as a table of sections from left to right, with the stations they run to. */
import { useState } from 'react'
import { Button } from '@/components/button'
import { ColumnHead } from '@/components/data-table'
import { Icon } from '@/components/icon'
import { commitProblem } from '@/fields/layout-field'
import { formatGiven } from '@/lib/format-quantity'
import { useLayoutSession } from '@/lib/layout-session-context'
import { displayUnit } from '@/lib/quantity-units'
import { useLayoutStore } from '@/stores/layout-store'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useSelectionStore } from '@/stores/selection-store'
import { sectionSpans, totalLengthMm } from '@shared/layout/shaft-geometry'
import { addSection, type SectionEdit } from './section-operations'
import { SectionRow } from './section-row'

export function ShaftSectionsPanel() {
  const layout = useLayoutStore((state) => state.visible)
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const units = usePreferencesStore((state) => state.units)
  const select = useSelectionStore((state) => state.select)
  const session = useLayoutSession()
  const [problem, setProblem] = useState<string | null>(null)
  if (layout === null) return null

  const run = ({ label, operations, selectId }: SectionEdit) => {
    const refused = commitProblem(session.commit(label, operations))
    setProblem(refused)
    if (refused === null) select(selectId === null ? [] : [selectId])
  }
  const mm = displayUnit('length', units).symbol
  const um = displayUnit('roughness', units).symbol
  const heads = [
    `Length, ${mm}`,
    `Outer ⌀, ${mm}`,
    `Bore ⌀, ${mm}`,
    `Roughness Rz, ${um}`,
    `Fillet right, ${mm}`,
  ]

  return (
    <div>
      <div className="max-sm:overflow-x-auto">
        <table className="w-full border-collapse text-sm">
          <caption className="sr-only">Shaft sections</caption>
          <thead className="top-0 z-10 sm:sticky sm:bg-card">
            <tr>
              <ColumnHead>#</ColumnHead>
              <ColumnHead align="right">From z, {mm}</ColumnHead>
              <ColumnHead align="right">To z, {mm}</ColumnHead>
              {heads.map((head) => (
                <ColumnHead key={head} align="right">
                  {head}
                </ColumnHead>
              ))}
              <ColumnHead>On it</ColumnHead>
              {canEdit && (
                <ColumnHead>
                  <span className="sr-only">What to do with the section</span>
                </ColumnHead>
              )}
            </tr>
          </thead>
          <tbody>
            {sectionSpans(layout).map((span, index) => (
              <SectionRow
                key={span.section.id}
                span={span}
                number={index + 1}
                layout={layout}
                canEdit={canEdit}
                units={units}
                run={run}
              />
            ))}
          </tbody>
        </table>
      </div>
      <div className="flex flex-wrap items-center gap-4 px-4 py-3 text-sm">
        {canEdit && (
          <Button
            size="sm"
            icon={<Icon name="add" />}
            onClick={() => run(addSection(layout, layout.shaft.sections.length))}
          >
            Add section at the right end
          </Button>
        )}
        <p className="text-quiet">
          {layout.shaft.sections.length} {layout.shaft.sections.length === 1 ? 'section' : 'sections'},{' '}
          {formatGiven(Number(totalLengthMm(layout).toFixed(3)), 'length', units).text} in all
        </p>
        {problem !== null && (
          <p role="alert" className="text-xs font-medium text-bad">
            {problem}
          </p>
        )}
      </div>
    </div>
  )
}
