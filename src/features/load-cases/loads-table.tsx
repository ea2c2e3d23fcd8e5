import { useState } from 'react'
import { Button } from '@/components/button'
import { Cell, ColumnHead } from '@/components/data-table'
import { Icon } from '@/components/icon'
import { Menu } from '@/components/menu'
import { LayoutChoiceField } from '@/fields/layout-choice-field'
import { commitProblem } from '@/fields/layout-field'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { loadAddress } from '@/fields/part-address'
import { useLayoutSession } from '@/lib/layout-session-context'
import { displayUnit, type QuantityKind } from '@/lib/quantity-units'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { LayoutDocument, Load, LoadCase } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import { addLoad, copyLoad } from './load-case-operations'
import { TorqueBalance } from './torque-balance'

interface LoadsTableProps {
  loadCase: LoadCase
  layout: LayoutDocument
  canEdit: boolean
}

type LoadField = 'stationMm' | 'torqueNm' | 'forceYN' | 'forceZN' | 'axialN' | 'momentYNm' | 'momentZNm'

const COLUMNS: readonly { field: LoadField; label: string; kind: QuantityKind }[] = [
  { field: 'stationMm', label: 'At z', kind: 'length' },
  { field: 'torqueNm', label: 'Torque', kind: 'torque' },
  { field: 'forceYN', label: 'Force y', kind: 'force' },
  { field: 'forceZN', label: 'Force z', kind: 'force' },
  { field: 'axialN', label: 'Axial', kind: 'force' },
  { field: 'momentYNm', label: 'Moment y', kind: 'torque' },
  { field: 'momentZNm', label: 'Moment z', kind: 'torque' },
]
const LIMIT = { length: 20_000, torque: 1e9, force: 1e9 } as const

export function LoadsTable({ loadCase, layout, canEdit }: LoadsTableProps) {
  const session = useLayoutSession()
  const units = usePreferencesStore((state) => state.units)
  const [problem, setProblem] = useState<string | null>(null)
  const commit = (label: string, operations: Operation[]) => {
    if (operations.length > 0) setProblem(commitProblem(session.commit(label.slice(0, 120), operations)))
  }
  const withoutLoad =
    layout.hubs.find((hub) => !loadCase.loads.some((load) => load.hub === hub.id)) ?? layout.hubs[0]

  return (
    <div className="grid gap-2">
      <div className="overflow-x-auto">
        <table className="w-full border-collapse text-sm">
          <caption className="sr-only">Loads of {loadCase.name}</caption>
          <thead>
            <tr>
              <ColumnHead className="pl-0">Hub</ColumnHead>
              {COLUMNS.map(({ field, label, kind }) => (
                <ColumnHead key={field} align="right">
                  {label}, {displayUnit(kind, units).symbol}
                </ColumnHead>
              ))}
              {canEdit && (
                <ColumnHead>
                  <span className="sr-only">What to do with the load</span>
                </ColumnHead>
              )}
            </tr>
          </thead>
          <tbody>
            {loadCase.loads.map((load) => (
              <LoadRow
                key={load.id}
                load={load}
                loadCase={loadCase}
                layout={layout}
                canEdit={canEdit}
                commit={commit}
              />
            ))}
            {loadCase.loads.length === 0 && (
              <tr>
                <Cell colSpan={COLUMNS.length + 2} className="text-quiet">
                  No load in this case yet.
                </Cell>
              </tr>
            )}
          </tbody>
        </table>
      </div>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        {canEdit && withoutLoad !== undefined && (
          <Button
            size="sm"
            icon={<Icon name="add" />}
            onClick={() => commit(`Add load on ${withoutLoad.name}`, [addLoad(loadCase, withoutLoad)])}
          >
            Add load
          </Button>
        )}
        <TorqueBalance loadCase={loadCase} layout={layout} canEdit={canEdit} commit={commit} />
      </div>
      <p className="text-xs text-quiet">
        Torque is positive where the part drives the shaft. y points up, axial force is positive to the right;
        moments bend the shaft at the station.
      </p>
      {problem !== null && (
        <p role="alert" className="text-xs font-medium text-bad">
          {problem}
        </p>
      )}
    </div>
  )
}

function LoadRow({
  load,
  loadCase,
  layout,
  canEdit,
  commit,
}: {
  load: Load
  loadCase: LoadCase
  layout: LayoutDocument
  canEdit: boolean
  commit: (label: string, operations: Operation[]) => void
}) {
  const hubName = layout.hubs.find(({ id }) => id === load.hub)?.name ?? load.hub
  const isSelected = useSelectionStore((state) => state.selectedIds.includes(load.hub))
  const hover = useSelectionStore((state) => state.hover)
  const others = layout.loadCases.filter(({ id }) => id !== loadCase.id)
  return (
    <tr
      className={isSelected ? 'bg-steel-soft' : ''}
      onPointerEnter={() => hover(load.hub)}
      onPointerLeave={() => hover(null)}
    >
      <Cell className="py-1! pl-0!">
        <LayoutChoiceField
          label={`Hub of the load on ${hubName}`}
          arrangement="cell"
          address={loadAddress(loadCase, load, 'hub', hubName)}
          options={layout.hubs.map(({ id, name }) => ({ value: id, label: name }))}
          className="min-w-40"
        />
      </Cell>
      {COLUMNS.map(({ field, label, kind }) => (
        <Cell key={field} align="right" className="py-1! pr-1.5! pl-1!">
          <LayoutQuantityField
            label={`${label} on ${hubName}`}
            kind={kind}
            arrangement="cell"
            address={loadAddress(loadCase, load, field, hubName)}
            min={-LIMIT[kind as keyof typeof LIMIT]}
            max={LIMIT[kind as keyof typeof LIMIT]}
            className="ml-auto w-24"
          />
        </Cell>
      ))}
      {canEdit && (
        <Cell align="right" className="py-1! pr-0!">
          <Menu
            label={`Load on ${hubName}`}
            button={<Icon name="more" />}
            buttonClassName="rounded px-2 py-1 hover:bg-paper"
            items={[
              ...(others.length > 0 ? [{ kind: 'heading', label: 'Copy this load to' } as const] : []),
              ...others.map((other) => ({
                label: other.name,
                icon: 'copy' as const,
                onSelect: () => commit(`Copy load on ${hubName} to ${other.name}`, copyLoad(load, other)),
              })),
              ...(others.length > 1
                ? [
                    {
                      label: 'All other cases',
                      icon: 'copy' as const,
                      onSelect: () =>
                        commit(
                          `Copy load on ${hubName} to all cases`,
                          others.flatMap((other) => copyLoad(load, other)),
                        ),
                    },
                  ]
                : []),
              ...(others.length > 0 ? [{ kind: 'separator' } as const] : []),
              {
                label: 'Delete load',
                icon: 'trash' as const,
                isDangerous: true,
                onSelect: () =>
                  commit(`Delete load on ${hubName}`, [
                    { type: 'remove', target: { kind: 'load', loadCaseId: loadCase.id, id: load.id } },
                  ]),
              },
            ]}
          />
        </Cell>
      )}
    </tr>
  )
}
