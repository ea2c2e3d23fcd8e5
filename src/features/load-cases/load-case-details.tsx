import type { ReactNode } from 'react'
import { Button } from '@/components/button'
import { IconButton } from '@/components/icon-button'
import { CRITERIA_FIELDS } from '@/fields/criteria-fields'
import { LayoutQuantityField } from '@/fields/layout-quantity-field'
import { LayoutTextField } from '@/fields/layout-text-field'
import { loadCaseAddress } from '@/fields/part-address'
import { formatEntered } from '@/lib/format-quantity'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore, WORST_CASE } from '@/stores/results-store'
import type { LayoutDocument, LoadCase } from '@shared/layout/layout-document'
import { duplicateLoadCase, type LoadCaseEdit, moveLoadCase, removeLoadCase } from './load-case-operations'
import { LoadsTable } from './loads-table'

interface LoadCaseDetailsProps {
  loadCase: LoadCase
  layout: LayoutDocument
  canEdit: boolean
  run: (edit: LoadCaseEdit) => void
}

export function LoadCaseDetails({ loadCase, layout, canEdit, run }: LoadCaseDetailsProps) {
  const units = usePreferencesStore((state) => state.units)
  const selected = useResultsStore((state) => state.selectedLoadCaseId)
  const selectForResults = useResultsStore((state) => state.selectLoadCase)
  const index = layout.loadCases.indexOf(loadCase)
  const isInResults = selected === loadCase.id
  const overridden = CRITERIA_FIELDS.filter(({ field }) => loadCase.criteria?.[field] != null).length
  const ownTemperatures = Object.keys(loadCase.hubTemperaturesC ?? {}).length

  return (
    <div className="grid min-w-0 gap-3">
      <div className="flex flex-wrap items-center gap-2">
        <LayoutTextField
          label="Name of the load case"
          arrangement="title"
          address={loadCaseAddress(loadCase, 'name')}
          className="w-64"
        />
        <Button
          size="sm"
          aria-pressed={isInResults}
          onClick={() => selectForResults(isInResults ? WORST_CASE : loadCase.id)}
        >
          {isInResults ? 'Back to the worst case' : 'Show its results'}
        </Button>
        {canEdit && (
          <div className="ml-auto flex items-center gap-1">
            <IconButton
              icon="arrowUp"
              label="Move up"
              disabled={index === 0}
              onClick={() => run(moveLoadCase(layout, loadCase, -1))}
            />
            <IconButton
              icon="arrowDown"
              label="Move down"
              disabled={index === layout.loadCases.length - 1}
              onClick={() => run(moveLoadCase(layout, loadCase, 1))}
            />
            <IconButton
              icon="copy"
              label="Duplicate"
              onClick={() => run(duplicateLoadCase(layout, loadCase))}
            />
            <IconButton icon="trash" label="Delete" onClick={() => run(removeLoadCase(layout, loadCase))} />
          </div>
        )}
      </div>
      <div className="grid max-w-3xl grid-cols-2 gap-2 sm:grid-cols-4">
        <LayoutQuantityField
          label="Speed"
          kind="speed"
          address={loadCaseAddress(loadCase, 'speedRpm')}
          min={0}
          max={1e6}
        />
        <LayoutQuantityField
          label="Application factor"
          kind="ratio"
          address={loadCaseAddress(loadCase, 'applicationFactor')}
          min={0}
          isMinExclusive
          max={100}
        />
        <LayoutQuantityField
          label="Shaft at"
          kind="temperature"
          address={loadCaseAddress(loadCase, 'shaftC')}
          min={-200}
          max={1_000}
        />
        <LayoutQuantityField
          label="Hubs at"
          kind="temperature"
          address={loadCaseAddress(loadCase, 'hubC')}
          min={-200}
          max={1_000}
        />
      </div>
      <LoadsTable loadCase={loadCase} layout={layout} canEdit={canEdit} />
      <Folded
        title="Temperatures of single hubs"
        note={ownTemperatures === 0 ? 'none of their own' : `${ownTemperatures} of their own`}
      >
        {layout.hubs.map((hub) => (
          <LayoutQuantityField
            key={hub.id}
            label={hub.name}
            kind="temperature"
            address={loadCaseAddress(loadCase, 'hubTemperaturesC', hub.id)}
            isOptional
            placeholder={`${formatEntered(loadCase.hubC, 'temperature', units)} as the others`}
            min={-200}
            max={1_000}
          />
        ))}
      </Folded>
      <Folded
        title="Acceptance criteria of this case"
        note={overridden === 0 ? 'those of the layout hold' : `${overridden} of its own`}
      >
        {CRITERIA_FIELDS.map(({ field, label, kind, isZeroAllowed, max }) => (
          <LayoutQuantityField
            key={field}
            label={label}
            kind={kind}
            address={loadCaseAddress(loadCase, 'criteria', field)}
            isOptional
            placeholder={
              layout.criteria[field] == null
                ? 'not judged'
                : `${formatEntered(layout.criteria[field], kind, units)} as the layout`
            }
            min={0}
            isMinExclusive={isZeroAllowed !== true}
            max={max}
          />
        ))}
      </Folded>
    </div>
  )
}

function Folded({ title, note, children }: { title: string; note: string; children: ReactNode }) {
  return (
    <details className="max-w-4xl">
      <summary className="text-sm font-semibold">
        {title} <span className="font-normal text-quiet">({note})</span>
      </summary>
      <div className="mt-2 grid grid-cols-2 gap-2 sm:grid-cols-3 xl:grid-cols-5">{children}</div>
    </details>
  )
}
