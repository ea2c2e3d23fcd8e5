/** The calculated numbers of one hub, grouped the way one judges a fit. */
import { formatResult, formatResultPair } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import type { Hub } from '@shared/layout/layout-document'
import type { HubLoadCaseResult, HubResult } from '@shared/recalculation/layout-results'
import { ResultRow } from './inspector-parts'
import { inCase, ofHub } from './result-references'

interface Shown {
  result: HubResult
  shown: HubLoadCaseResult
  units: UnitSystem
}

export function FitResults({
  result,
  shown,
  units,
}: {
  result: HubResult
  shown: HubLoadCaseResult | null
  units: UnitSystem
}) {
  const { interference, id } = result
  const pair = (min: number | null, max: number | null) =>
    formatResultPair(min, max, 'interference', units, ' … ').text
  const less = (um: number | null) => (um === null ? null : um - (interference.embeddingLossUm ?? 0))
  return (
    <div className="mt-1.5">
      <ResultRow
        label="Interference, diametral"
        value={pair(interference.minUm, interference.maxUm)}
        reference={ofHub(id, 'interferenceMin')}
      />
      <ResultRow
        label={`less ${formatResult(interference.embeddingLossUm, 'interference', units).text} embedding`}
        name="embedding loss"
        value={pair(less(interference.minUm), less(interference.maxUm))}
        reference={ofHub(id, 'embeddingLoss')}
      />
      {shown !== null && (
        <>
          {shown.thermalChangeUm !== null && Math.abs(shown.thermalChangeUm) >= 0.05 && (
            <ResultRow
              label="Change by temperature"
              value={signed(shown.thermalChangeUm, units)}
              reference={inCase(id, shown, 'thermalChange')}
            />
          )}
          {shown.speedLossUm !== null && Math.abs(shown.speedLossUm) >= 0.05 && (
            <ResultRow
              label="Loss by speed"
              value={signed(-Math.abs(shown.speedLossUm), units)}
              reference={inCase(id, shown, 'speedLoss')}
            />
          )}
          <ResultRow
            label="Effective in service"
            value={pair(shown.effectiveMinUm, shown.effectiveMaxUm)}
            reference={inCase(id, shown, 'effectiveMin')}
          />
        </>
      )}
    </div>
  )
}

const signed = (um: number, units: UnitSystem) =>
  (um > 0 ? '+' : '') + formatResult(um, 'interference', units).text

export function GripResults({ result, shown, units }: Shown) {
  const { id } = result
  const limit = shown.slipSafetyLimit
  return (
    <>
      <ResultRow
        label="Interface pressure"
        value={formatResult(shown.pressureMinMPa, 'stress', units).text}
        reference={inCase(id, shown, 'pressureMin')}
      />
      <ResultRow
        label="Torque held / required"
        name="torque capacity"
        value={formatResultPair(shown.torqueCapacityNm, shown.requiredTorqueNm, 'torque', units).text}
        reference={inCase(id, shown, 'torqueCapacity')}
        safety={{ value: shown.torqueSafety, limit, reference: inCase(id, shown, 'torqueSafety') }}
      />
      <ResultRow
        label="Axial held / required"
        name="axial capacity"
        value={formatResultPair(shown.axialCapacityN, shown.requiredAxialN, 'force', units).text}
        reference={inCase(id, shown, 'axialCapacity')}
        safety={{ value: shown.axialSafety, limit, reference: inCase(id, shown, 'axialSafety') }}
      />
      <ResultRow
        label={`Combined slip safety, needs ${limit}`}
        name="combined slip safety"
        value=""
        safety={{ value: shown.slipSafety, limit, reference: inCase(id, shown, 'slipSafety') }}
      />
    </>
  )
}

const ordinal = (place: number) =>
  `${place}${['th', 'st', 'nd', 'rd'][place % 100 > 10 && place % 100 < 14 ? 0 : place % 10] ?? 'th'}`

export function JoiningResults({ hub, result, units }: { hub: Hub; result: HubResult; units: UnitSystem }) {
  const { assembly, id } = result
  const temperature = (value: number | null) => formatResult(value, 'temperature', units).text
  const overLimit =
    assembly.joiningC !== null && assembly.limitC !== null && assembly.joiningC > assembly.limitC
  return (
    <div className="mb-1.5">
      {hub.joining.method === 'press' ? (
        <ResultRow
          label="Press force, at most"
          value={formatResult(assembly.pressForceMaxN, 'force', units).text}
          reference={ofHub(id, 'pressForce')}
        />
      ) : (
        <>
          <ResultRow
            label="Hub joins at"
            value={temperature(assembly.joiningC)}
            reference={ofHub(id, 'joiningTemperature')}
          />
          <ResultRow
            label="Oven at"
            value={temperature(assembly.ovenC)}
            reference={ofHub(id, 'ovenTemperature')}
          />
          <ResultRow
            label="Limit"
            value={`${overLimit ? '✕ exceeded, ' : ''}${temperature(assembly.limitC)}`}
          />
          <ResultRow
            label="Press force if cold"
            value={formatResult(assembly.pressForceMaxN, 'force', units).text}
            reference={ofHub(id, 'pressForce')}
          />
        </>
      )}
      <ResultRow
        label="Order and side"
        value={
          assembly.order === null
            ? '✕ cannot be mounted'
            : `${ordinal(assembly.order)}, from the ${assembly.side}`
        }
      />
    </div>
  )
}
