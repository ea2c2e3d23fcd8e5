/** What changed between two layouts, part by part, with values before and after. */
import { Sign } from '@/components/sign'
import { usePreferencesStore } from '@/stores/preferences-store'
import type { FieldChange, LayoutDifference } from '@shared/comparison/compare-layouts'
import { formatFieldValue } from '../format-field-value'

const CHANGE_TONES: Record<LayoutDifference['change'], string> = {
  added: 'text-good',
  removed: 'text-bad',
  changed: 'text-steel',
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
  if (differences.length === 0)
    return (
      <p className="flex items-center gap-2 py-3 text-sm">
        <Sign name="check" className="size-4 text-good" />
        Nothing differs between {beforeName} and {afterName}.
      </p>
    )
  return (
    <div className="text-sm">
      <p className="pb-2 text-xs font-semibold text-quiet">
        From {beforeName} to {afterName}
      </p>
      <ul className="divide-y divide-hairline border-y border-hairline">
        {differences.map((difference) => (
          <li
            key={`${difference.kind} ${difference.id} ${difference.change}`}
            className="grid gap-x-6 gap-y-1 py-2 md:grid-cols-[minmax(0,1fr)_minmax(0,2fr)]"
          >
            <p className="font-semibold">
              {difference.name.charAt(0).toUpperCase() + difference.name.slice(1)}{' '}
              <span className={`font-normal ${CHANGE_TONES[difference.change]}`}>{difference.change}</span>
            </p>
            {difference.fields.length > 0 && (
              <dl className="grid gap-y-1">
                {difference.fields.map((field) => (
                  <ChangedField key={field.field} field={field} />
                ))}
              </dl>
            )}
          </li>
        ))}
      </ul>
    </div>
  )
}

function ChangedField({ field }: { field: FieldChange }) {
  const units = usePreferencesStore((state) => state.units)
  return (
    <div className="grid grid-cols-2 gap-x-4">
      <dt>{field.label}</dt>
      <dd className="min-w-0 wrap-break-word tabular-nums">
        <span className="sr-only">was </span>
        <span className="text-quiet">{formatFieldValue(field.before, field.unit, units)}</span>
        <span aria-hidden="true" className="text-quiet">
          {' '}
          →{' '}
        </span>
        <span className="sr-only">, is </span>
        <span className="font-semibold">{formatFieldValue(field.after, field.unit, units)}</span>
      </dd>
    </div>
  )
}
