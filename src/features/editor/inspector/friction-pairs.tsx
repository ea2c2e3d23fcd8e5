import { useId } from 'react'
import { Icon } from '@/components/icon'
import { type Choice, GroupedOptions } from '@/fields/layout-choice-field'
import { setOperations } from '@/fields/layout-field'
import { hubAddress } from '@/fields/part-address'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import { FRICTION_SOURCES, type FrictionPair } from '@shared/engineering/materials/friction-pair'
import { FRICTION_PAIRS } from '@shared/engineering/materials/friction-pairs'
import type { Hub } from '@shared/layout/layout-document'

const isPressing = ({ direction }: FrictionPair) => direction === 'press-in force'
const HOLDING = FRICTION_PAIRS.filter((pair) => !isPressing(pair))
const PRESSING = FRICTION_PAIRS.filter(isPressing)

const choiceOf = ({ id, pairing, surface, assembly, defaultDesign }: FrictionPair): Choice => ({
  value: id,
  label: `${defaultDesign}  ${pairing}, ${surface}`,
  group: assembly,
})

/** Named pairings of the library that set the coefficients. */
export function FrictionPairs({ hubs }: { hubs: readonly Hub[] }) {
  const session = useLayoutSession()
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const set = (label: string, fields: readonly string[], value: number) =>
    session.commit(
      label,
      fields.flatMap((field) => setOperations(hubAddress(hubs, field), value)),
    )
  const isAll = (field: 'circumferential' | 'axial' | 'pressing', value: number) =>
    hubs.every(({ friction }) => friction[field] === value)
  const holding = HOLDING.find(
    ({ defaultDesign: value }) => isAll('circumferential', value) && isAll('axial', value),
  )
  const pressing = PRESSING.find(({ defaultDesign: value }) => isAll('pressing', value))

  return (
    <>
      <PairChoice
        label="Holding, like"
        pairs={HOLDING}
        chosen={holding}
        isReadOnly={!canEdit}
        onChoose={(pair) =>
          set(
            `Take friction of ${pair.pairing}`,
            ['friction.circumferential', 'friction.axial'],
            pair.defaultDesign,
          )
        }
      />
      <PairChoice
        label="Pressing on, like"
        pairs={PRESSING}
        chosen={pressing}
        isReadOnly={!canEdit}
        onChoose={(pair) =>
          set(`Take pressing friction of ${pair.pairing}`, ['friction.pressing'], pair.defaultDesign)
        }
      />
    </>
  )
}

function PairChoice({
  label,
  pairs,
  chosen,
  isReadOnly,
  onChoose,
}: {
  label: string
  pairs: readonly FrictionPair[]
  chosen: FrictionPair | undefined
  isReadOnly: boolean
  onChoose: (pair: FrictionPair) => void
}) {
  const id = useId()
  return (
    <div className="mt-1.5 grid gap-0.5">
      <label htmlFor={id} className="text-xs text-quiet">
        {label}
      </label>
      <span className="relative flex items-center rounded border border-hairline bg-card hover:border-edge focus-within:outline-2 focus-within:-outline-offset-1 focus-within:outline-steel">
        <select
          id={id}
          disabled={isReadOnly}
          value={chosen?.id ?? ''}
          className="w-full min-w-0 appearance-none truncate bg-transparent py-1 pr-6 pl-2 text-sm outline-none disabled:text-ink disabled:opacity-100"
          onChange={(event) => {
            const pair = pairs.find(({ id: pairId }) => pairId === event.target.value)
            if (pair !== undefined) onChoose(pair)
          }}
        >
          <option value="">own value</option>
          <GroupedOptions options={pairs.map(choiceOf)} />
        </select>
        <Icon name="chevronDown" className="pointer-events-none absolute right-1.5 size-3 text-quiet" />
      </span>
      {chosen !== undefined && (
        <p className="text-xs text-quiet">
          {chosen.min === chosen.max ? `${chosen.min}` : `${chosen.min} to ${chosen.max}`}, {chosen.status}:{' '}
          {chosen.sources.map((source) => FRICTION_SOURCES[source].text).join('; ')}.
          {chosen.note !== '' && ` Note: ${chosen.note}.`}
        </p>
      )}
    </div>
  )
}
