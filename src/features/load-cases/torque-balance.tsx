import { useId, useState } from 'react'
import { Button } from '@/components/button'
import { formatResult } from '@/lib/format-quantity'
import { usePreferencesStore } from '@/stores/preferences-store'
import { torqueBalance } from '@shared/engineering/load-cases/torque-balance'
import { newtonMetre } from '@shared/engineering/quantities/units'
import type { LayoutDocument, LoadCase } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import { balanceOnHub } from './load-case-operations'

interface TorqueBalanceProps {
  loadCase: LoadCase
  layout: LayoutDocument
  canEdit: boolean
  commit: (label: string, operations: Operation[]) => void
}

/** Whether what drives equals what is driven, and a way to close the balance. */
export function TorqueBalance({ loadCase, layout, canEdit, commit }: TorqueBalanceProps) {
  const id = useId()
  const units = usePreferencesStore((state) => state.units)
  const { residual, isBalanced } = torqueBalance(loadCase.loads.map(({ torqueNm }) => newtonMetre(torqueNm)))
  const loaded = layout.hubs.filter((hub) => loadCase.loads.some((load) => load.hub === hub.id))
  const choices = loaded.length > 0 ? loaded : layout.hubs
  const [chosenId, setChosenId] = useState<string | null>(null)
  const chosen = choices.find((hub) => hub.id === chosenId) ?? choices.at(-1)
  if (loadCase.loads.length === 0) return null
  const text = formatResult(residual, 'torque', units).text

  return (
    <div className="flex flex-wrap items-center gap-2 text-sm">
      {isBalanced ? (
        <p>
          <span aria-hidden="true" className="font-bold text-good">
            ✓{' '}
          </span>
          Torques balance{Math.abs(residual) > 1e-9 && `, ${text} left`}
        </p>
      ) : (
        <p className="font-semibold text-bad">
          <span aria-hidden="true">✕ </span>
          Torques do not balance: {text} left
        </p>
      )}
      {canEdit && !isBalanced && chosen !== undefined && (
        <>
          <label htmlFor={id} className="sr-only">
            Hub that takes the difference
          </label>
          <select
            id={id}
            value={chosen.id}
            onChange={(event) => setChosenId(event.target.value)}
            className="rounded border border-edge bg-card px-2 py-1 text-sm"
          >
            {choices.map((hub) => (
              <option key={hub.id} value={hub.id}>
                {hub.name}
              </option>
            ))}
          </select>
          <Button
            size="sm"
            onClick={() =>
              commit(`Balance torque on ${chosen.name}`, [balanceOnHub(loadCase, chosen, residual)])
            }
          >
            Put {formatResult(-residual, 'torque', units).text} on it
          </Button>
        </>
      )}
    </div>
  )
}
