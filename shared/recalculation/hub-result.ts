/** The numbers of one hub, in the units and keys of the results. */
import { governingCase } from '../engineering/load-cases/governing-case'
import { outerDiameterGrowth } from '../engineering/interference-fit/hub-stress'
import { interfacePressure } from '../engineering/interference-fit/interface-pressure'
import type { Length } from '../engineering/quantities/quantity'
import { metre, toMm, toMPa, toUm } from '../engineering/quantities/units'
import { attempt, finiteOrNull } from './attempt'
import { hubFindings } from './hub-findings'
import { joiningFigures } from './hub-assembly'
import type { Finding, HubLoadCaseResult, HubResult } from './layout-results'
import { memoise } from './memoise'
import { seatKey } from './seat-key'
import type { Joining, ResolvedSeat, Seat } from './seat'
import { caseState, restState, type SeatCaseState, type TightState } from './seat-state'
import { seatWindow } from './seat-window'
import { windowRemedies } from './window-remedies'

/** What the shaft, the passage and the formula view need beside the printed result. */
export interface HubCalculation {
  result: HubResult
  findings: Finding[]
  seat: Seat | null
  states: SeatCaseState[]
  rest: TightState | null
}

const hubCache = memoise<HubCalculation>(300)

export function calculateHub(id: string, side: Joining['side'], resolved: ResolvedSeat): HubCalculation {
  const { seat } = resolved
  if (!seat) return unresolvedHub(id, side, resolved)
  return hubCache(seatKey(seat), () => {
    const attempted = attempt(() => computeHub(seat, resolved))
    return attempted.reason === null
      ? attempted.value
      : unresolvedHub(id, side, {
          ...resolved,
          seat: null,
          problems: [
            { code: 'not-computable', reason: attempted.reason, remedy: 'Check the dimensions and the fit.' },
          ],
        })
  })
}

function computeHub(seat: Seat, resolved: ResolvedSeat): HubCalculation {
  const rest = restState(seat)
  const states = seat.cases.map((seatCase) => caseState(seat, seatCase))
  const window = seatWindow(seat, states)
  const joining = joiningFigures(seat, rest)
  const findings = hubFindings({ seat, rest, states, window, joining })
  const { hub, seatDiameter } = seat.rings
  const pressureMinAtRest = interfacePressure(metre(seat.interference.min - seat.embedding), seat.compliance)
  const result: HubResult = {
    id: seat.id,
    interference: {
      minUm: wholePicometres(seat.interference.min),
      maxUm: wholePicometres(seat.interference.max),
      embeddingLossUm: wholePicometres(seat.embedding),
    },
    window: {
      requiredUm: window.required && finiteOrNull(toUm(window.required.interference)),
      requiredCause: window.required?.cause.text ?? '',
      permissibleUm: window.permissible && finiteOrNull(toUm(window.permissible.interference)),
      permissibleCause: window.permissible?.cause.text ?? '',
      requiredLoadCase: window.required?.cause.loadCase ?? null,
      permissibleLoadCase: window.permissible?.cause.loadCase ?? null,
      isEmpty: window.isEmpty,
      remedies: windowRemedies(seat, window),
    },
    loadCases: states.map(caseResult),
    atRest: {
      pressureMaxMPa: finiteOrNull(toMPa(rest.pressureMax)),
      hubHoopMaxMPa: finiteOrNull(toMPa(rest.hub.hoopAtBore)),
      hubEquivalentMaxMPa: finiteOrNull(toMPa(rest.hub.equivalent)),
      hubYieldSafety: finiteOrNull(rest.hubSafety),
      shaftYieldSafety: finiteOrNull(rest.shaftSafety),
    },
    outerDiameterGrowthUm: {
      min: finiteOrNull(toUm(outerDiameterGrowth(pressureMinAtRest, seatDiameter, hub))),
      max: finiteOrNull(toUm(outerDiameterGrowth(rest.pressureMax, seatDiameter, hub))),
    },
    assembly: {
      joiningC: joining.joiningC,
      ovenC: joining.ovenC,
      limitC: joining.limitC,
      pressForceMaxN: joining.pressForceMaxN,
      side: seat.joining.side,
      order: null,
    },
    seat: {
      sectionId: resolved.sectionId,
      diameterMm: resolved.diameterMm,
      effectiveLengthMm: finiteOrNull(toMm(seat.effectiveLength)),
    },
    isBrittle: hub.material.isBrittle,
    governingLoadCase: governingCase(
      states.map((state) => ({
        id: state.seatCase.id,
        safety: state.slipSafety,
        limit: state.seatCase.criteria.slipSafety,
      })),
    ),
    verdict: findings.some((finding) => finding.severity === 'fails') ? 'fails' : 'passes',
    notComputable: [],
  }
  return { result, findings, seat, states, rest }
}

/** Table values are tenths of a micrometre; the way through metres must not leave 44.99999999999999. */
function wholePicometres(length: Length): number | null {
  return finiteOrNull(Math.round(toUm(length) * 1e6) / 1e6)
}

function caseResult(state: SeatCaseState): HubLoadCaseResult {
  const { demand, criteria, id } = state.seatCase
  return {
    loadCase: id,
    effectiveMinUm: finiteOrNull(toUm(state.effectiveMin)),
    effectiveMaxUm: finiteOrNull(toUm(state.effectiveMax)),
    thermalChangeUm: finiteOrNull(toUm(state.thermalChange)),
    speedLossUm: finiteOrNull(toUm(state.speedLoss)),
    pressureMinMPa: finiteOrNull(toMPa(state.pressureMin)),
    pressureMaxMPa: finiteOrNull(toMPa(state.pressureMax)),
    torqueCapacityNm: finiteOrNull(state.torqueCapacity),
    axialCapacityN: finiteOrNull(state.axialCapacity),
    torqueSafety: finiteOrNull(state.torqueSafety),
    axialSafety: finiteOrNull(state.axialSafety),
    slipSafety: finiteOrNull(state.slipSafety),
    hubHoopMaxMPa: finiteOrNull(toMPa(state.hub.hoopAtBore)),
    hubEquivalentMaxMPa: finiteOrNull(toMPa(state.hub.equivalent)),
    hubYieldSafety: finiteOrNull(state.hubSafety),
    shaftEquivalentMaxMPa: finiteOrNull(toMPa(state.shaft.equivalent)),
    shaftYieldSafety: finiteOrNull(state.shaftSafety),
    requiredTorqueNm: demand.torque,
    requiredAxialN: demand.axialForce,
    requiredResultantN: state.requiredResultant,
    slipSafetyLimit: criteria.slipSafety,
  }
}

function unresolvedHub(id: string, side: Joining['side'], resolved: ResolvedSeat): HubCalculation {
  return {
    result: {
      id,
      interference: { minUm: null, maxUm: null, embeddingLossUm: null },
      window: {
        requiredUm: null,
        requiredCause: '',
        permissibleUm: null,
        permissibleCause: '',
        requiredLoadCase: null,
        permissibleLoadCase: null,
        isEmpty: false,
        remedies: [],
      },
      loadCases: [],
      atRest: {
        pressureMaxMPa: null,
        hubHoopMaxMPa: null,
        hubEquivalentMaxMPa: null,
        hubYieldSafety: null,
        shaftYieldSafety: null,
      },
      outerDiameterGrowthUm: { min: null, max: null },
      assembly: { joiningC: null, ovenC: null, limitC: null, pressForceMaxN: null, side, order: null },
      seat: {
        sectionId: resolved.sectionId,
        diameterMm: resolved.diameterMm,
        effectiveLengthMm: resolved.effectiveLengthMm,
      },
      isBrittle: false,
      governingLoadCase: null,
      verdict: 'notComputable',
      notComputable: resolved.problems.map((problem) => problem.reason),
    },
    findings: [],
    seat: null,
    states: [],
    rest: null,
  }
}
