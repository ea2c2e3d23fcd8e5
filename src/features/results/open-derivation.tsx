/** Where a number comes from: formula, inputs with their origin, result, model, validity, sources. */
import { Button } from '@/components/button'
import { Chip } from '@/components/chip'
import { Dialog } from '@/components/dialog'
import { Spinner } from '@/components/spinner'
import { Cautions } from '@/drawings/cautions'
import { formatNumber, NOT_COMPUTED } from '@/lib/format-quantity'
import { useDerivationStore } from '@/stores/derivation-store'
import { useResultsStore } from '@/stores/results-store'
import type { Derivation, QuantityReference } from '@shared/recalculation/derivation'
import { partName } from './announcement'
import { DerivationInputs } from './derivation-inputs'
import { Formula } from './formula'
import { useDerivation } from './use-derivation'

export function OpenDerivation() {
  const trail = useDerivationStore((state) => state.trail)
  const close = useDerivationStore((state) => state.close)
  const back = useDerivationStore((state) => state.back)
  const place = useResultsStore((state) =>
    trail.length === 0 ? '' : placeWords(trail.at(-1), state.document),
  )
  const state = useDerivation(trail.at(-1))

  return (
    <Dialog
      title={state?.derivation?.title ?? 'Where this number comes from'}
      description={place}
      size="lg"
      onClose={close}
      footer={
        <>
          {trail.length > 1 && (
            <Button onClick={back} className="mr-auto">
              Back
            </Button>
          )}
          <Button variant="primary" onClick={close}>
            Close
          </Button>
        </>
      }
    >
      {state === null ? (
        <Spinner label="Deriving" />
      ) : state.derivation === null ? (
        <p role="alert" className="text-sm text-bad">
          This number could not be derived: {state.failure}
        </p>
      ) : (
        <DerivationContent derivation={state.derivation} />
      )}
    </Dialog>
  )
}

function DerivationContent({ derivation }: { derivation: Derivation }) {
  const { formula, inputs, result, model, validity, sources, notComputable } = derivation
  return (
    <div className="grid gap-4 text-sm">
      <div className="overflow-x-auto rounded-md border border-hairline bg-paper px-4 py-3 text-lg">
        {formula.map((line, index) => (
          <div key={index} className="py-1.5">
            <Formula text={line} />
          </div>
        ))}
      </div>
      {notComputable !== undefined && notComputable !== '' && (
        <p className="rounded-md bg-straw-soft px-3 py-2">
          <strong className="font-semibold">Not computed.</strong> {notComputable}
        </p>
      )}
      <DerivationInputs inputs={inputs} />
      <p className="flex flex-wrap items-center gap-2 text-lg font-bold tabular-nums">
        <Formula text={result.symbol} />
        <span>
          = {result.value === null ? NOT_COMPUTED : formatNumber(result.value, fourDigits(result.value))}
          {result.value !== null && result.unit !== '' && ` ${result.unit}`}
        </span>
      </p>
      <dl className="grid gap-x-4 gap-y-2 sm:grid-cols-[6rem_1fr]">
        <dt className="text-quiet">Model</dt>
        <dd>{model}</dd>
        <dt className="text-quiet">Validity</dt>
        <dd>{validity}</dd>
        <dt className="text-quiet">{sources.length === 1 ? 'Source' : 'Sources'}</dt>
        <dd>
          <ul className="grid gap-1">
            {sources.map(({ id, citation, clause, isFromMemory }) => (
              <li key={`${id} ${clause}`}>
                {citation}
                {clause !== '' && <span className="text-quiet">, {clause}</span>}{' '}
                {isFromMemory && <Chip tone="straw">from memory</Chip>}
              </li>
            ))}
          </ul>
        </dd>
      </dl>
      <Cautions />
    </div>
  )
}

const fourDigits = (value: number) => {
  const size = Math.abs(value)
  if (size === 0 || size >= 1000) return 0
  return Math.min(8, Math.max(0, 3 - Math.floor(Math.log10(size))))
}

function placeWords(
  reference: QuantityReference | undefined,
  document: ReturnType<typeof useResultsStore.getState>['document'],
): string {
  if (reference === undefined || document === null) return ''
  const caseName = (id: string) =>
    `case “${document.loadCases.find((loadCase) => loadCase.id === id)?.name ?? id}”`
  switch (reference.kind) {
    case 'hub':
      return partName(document, reference.hub)
    case 'hubCase':
      return `${partName(document, reference.hub)}, ${caseName(reference.loadCase)}`
    case 'shaftCase':
      return [
        reference.part === undefined ? 'Shaft' : partName(document, reference.part),
        caseName(reference.loadCase),
        reference.stationMm === undefined ? '' : `at z ${formatNumber(reference.stationMm, 1)} mm`,
      ]
        .filter((words) => words !== '')
        .join(', ')
    case 'shaft':
      return 'Shaft'
  }
}
