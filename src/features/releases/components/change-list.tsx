/** What changed between two layouts, part by part, with values before and after. */
import { Sign } from '@/components/sign'
import { formatFieldValue } from '../format-field-value'
import { usePreferencesStore } from '@/stores/preferences-store'
import type { LayoutDifference } from '@shared/comparison/compare-layouts'

const CHANGE_WORDS: Record<LayoutDifference['change'], { word: string; tone: string }> = {
  added: { word: 'Added', tone: 'text-good' },
  removed: { word: 'Removed', tone: 'text-bad' },
  changed: { word: 'Changed', tone: 'text-steel' },
}

export function ChangeList({
  differences,
  beforeName,
  afterName,
}: {
  differences: readonly LayoutDifference[]
  /** "release A" */
  beforeName: string
  afterName: string
}) {
  const units = usePreferencesStore((state) => state.units)
  if (differences.length === 0)
    return (
      <p className="flex items-center gap-2 py-3 text-sm">
        <Sign name="check" className="size-4 text-good" />
        Nothing differs between {beforeName} and {afterName}.
      </p>
    )
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Changes">
      <table className="w-full min-w-lg border-collapse text-sm">
        <thead>
          <tr className="border-b border-hairline text-left text-xs text-quiet">
            <th scope="col" className="py-2 pr-4 font-semibold">
              Part
            </th>
            <th scope="col" className="py-2 pr-4 font-semibold">
              Field
            </th>
            <th scope="col" className="py-2 pr-4 text-right font-semibold">
              In {beforeName}
            </th>
            <th scope="col" className="py-2 text-right font-semibold">
              In {afterName}
            </th>
          </tr>
        </thead>
        {differences.map((difference) => {
          const { word, tone } = CHANGE_WORDS[difference.change]
          const head = (
            <th
              scope="rowgroup"
              rowSpan={Math.max(1, difference.fields.length)}
              className="py-1.5 pr-4 text-left align-top font-semibold"
            >
              {difference.name.charAt(0).toUpperCase() + difference.name.slice(1)}{' '}
              <span className={`font-normal ${tone}`}>{word.toLowerCase()}</span>
            </th>
          )
          return (
            <tbody
              key={`${difference.kind} ${difference.id} ${difference.change}`}
              className="border-b border-hairline"
            >
              {difference.fields.length === 0 ? (
                <tr>
                  {head}
                  <td colSpan={3} className="py-1.5 text-quiet">
                    {difference.change === 'added' ? `not in ${beforeName}` : `no longer in ${afterName}`}
                  </td>
                </tr>
              ) : (
                difference.fields.map((field, index) => (
                  <tr key={field.field}>
                    {index === 0 && head}
                    <td className="py-1.5 pr-4">{field.label}</td>
                    <td className="py-1.5 pr-4 text-right tabular-nums">
                      {formatFieldValue(field.before, field.unit, units)}
                    </td>
                    <td className="py-1.5 text-right font-semibold tabular-nums">
                      {formatFieldValue(field.after, field.unit, units)}
                    </td>
                  </tr>
                ))
              )}
            </tbody>
          )
        })}
      </table>
    </div>
  )
}
