/** Findings of the shaft: balance and support of each load case, stress, fatigue, slopes, critical speed. */
import { torqueBalance } from '../engineering/load-cases/torque-balance'
import { newtonMetre, toMPa } from '../engineering/quantities/units'
import type { Criteria, LayoutDocument, LoadCase } from '../layout/layout-document'
import type { Finding, ShaftLoadCaseResult } from './layout-results'
import { criteriaOf } from './load-case-inputs'
import type { ShaftCalculation } from './shaft-results'
import {
  capitalised,
  inSentence,
  micrometreText,
  millimetreText,
  safetyText,
  significant,
  stressText,
  torqueText,
} from './wording'

/** Common practice: run below 0.7 of the first critical speed or well above it; near it never. */
const APPROACH_SHARE = 0.7
const PASSED_SHARE = 1.4
const RESONANCE_SHARE = 0.1

export function shaftFindings(document: LayoutDocument, shaft: ShaftCalculation): Finding[] {
  return document.loadCases.flatMap((loadCase, index) => {
    const result = shaft.results.loadCases[index]
    if (!result) return []
    const criteria = criteriaOf(document, loadCase)
    return [
      ...balanceFindings(document, loadCase),
      ...strengthFindings(shaft, loadCase, result, criteria),
      ...meshFindings(document, loadCase, result, criteria),
      ...bearingFindings(document, loadCase, result, criteria),
      ...speedFindings(shaft, loadCase),
    ]
  })
}

function balanceFindings(document: LayoutDocument, loadCase: LoadCase): Finding[] {
  const hubIds = new Set(document.hubs.map((hub) => hub.id))
  const torques = loadCase.loads
    .filter((load) => hubIds.has(load.hub))
    .map((load) => newtonMetre(load.torqueNm))
  const { residual, isBalanced } = torqueBalance(torques)
  if (isBalanced) return []
  return [
    {
      code: 'torque-balance',
      severity: 'fails',
      part: '',
      loadCase: loadCase.id,
      value: residual,
      limit: 0,
      unit: 'N·m',
      message: `The torques of ${loadCase.name} do not balance: ${torqueText(Math.abs(residual))} ${residual > 0 ? 'drive the shaft that nothing takes off' : 'are taken off that nothing drives'}.`,
      remedy: `Let one part ${residual > 0 ? 'take off' : 'drive'} the missing ${torqueText(Math.abs(residual))}.`,
    },
  ]
}

function strengthFindings(
  shaft: ShaftCalculation,
  loadCase: LoadCase,
  result: ShaftLoadCaseResult,
  criteria: Criteria,
): Finding[] {
  const found: Finding[] = []
  const { equivalentMaxMPa, yieldSafety, fatigueSafety } = result
  const material = shaft.inputs.material
  if (material && equivalentMaxMPa && yieldSafety !== null && yieldSafety < criteria.shaftYieldSafety) {
    found.push({
      code: 'shaft-yield',
      severity: 'fails',
      part: '',
      loadCase: loadCase.id,
      value: yieldSafety,
      limit: criteria.shaftYieldSafety,
      unit: '',
      message: `The shaft is stressed too high at ${millimetreText(equivalentMaxMPa.stationMm)} in ${loadCase.name}: ${stressText(equivalentMaxMPa.value)} from fit and loads, of ${stressText(toMPa(material.yieldStrength))} yield strength.`,
      remedy: 'A larger section, a looser fit there or a stronger shaft material stands more.',
      stationMm: equivalentMaxMPa.stationMm,
    })
  }
  const notch = fatigueSafety && result.notches.find((one) => one.fatigueSafety === fatigueSafety.value)
  if (fatigueSafety && notch && fatigueSafety.value < criteria.fatigueSafety) {
    found.push({
      code: 'fatigue',
      severity: 'fails',
      part: notch.part,
      loadCase: loadCase.id,
      value: fatigueSafety.value,
      limit: criteria.fatigueSafety,
      unit: '',
      message: `The shaft may break by fatigue at the ${notch.kind === 'seatEdge' ? 'seat edge' : 'shoulder'} at ${millimetreText(notch.stationMm)} in ${loadCase.name}: safety ${safetyText(fatigueSafety.value)} where ${safetyText(criteria.fatigueSafety)} is asked.`,
      remedy:
        notch.kind === 'seatEdge'
          ? 'Raise the seat above the shaft beside it with a generous fillet, enlarge the section, or move the load nearer to a bearing.'
          : 'A larger fillet, a smaller step or a larger section helps.',
      stationMm: notch.stationMm,
    })
  }
  return found
}

/** Slope and deflection matter where teeth mesh. */
function meshFindings(
  document: LayoutDocument,
  loadCase: LoadCase,
  result: ShaftLoadCaseResult,
  criteria: Criteria,
): Finding[] {
  return document.hubs
    .filter((hub) => hub.role === 'gear')
    .flatMap((hub): Finding[] => {
      const slope = result.slopes.find((one) => one.part === hub.id)
      const deflection = result.deflections.find((one) => one.part === hub.id)
      const base = { severity: 'fails' as const, part: hub.id, loadCase: loadCase.id }
      const found: Finding[] = []
      if (slope && slope.mrad > criteria.meshSlopeMrad)
        found.push({
          ...base,
          code: 'mesh-slope',
          value: slope.mrad,
          limit: criteria.meshSlopeMrad,
          unit: 'mrad',
          message: `${capitalised(hub.name)} tilts by ${significant(slope.mrad, 3)} mrad at its mesh in ${loadCase.name}; ${significant(criteria.meshSlopeMrad, 3)} mrad are permitted.`,
          remedy: 'A stiffer shaft, a shorter span or a mesh nearer to mid-span tilts less.',
          stationMm: slope.stationMm,
        })
      const limit = criteria.meshDeflectionUm
      if (deflection && typeof limit === 'number' && deflection.um > limit)
        found.push({
          ...base,
          code: 'mesh-deflection',
          value: deflection.um,
          limit,
          unit: 'µm',
          message: `${capitalised(hub.name)} gives way by ${micrometreText(deflection.um)} at its mesh in ${loadCase.name}; ${micrometreText(limit)} are permitted.`,
          remedy: 'A stiffer shaft, a shorter span or a mesh nearer to a bearing deflects less.',
          stationMm: deflection.stationMm,
        })
      return found
    })
}

function bearingFindings(
  document: LayoutDocument,
  loadCase: LoadCase,
  result: ShaftLoadCaseResult,
  criteria: Criteria,
): Finding[] {
  return document.bearings.flatMap((bearing): Finding[] => {
    const slope = result.slopes.find((one) => one.part === bearing.id)
    const limit = bearing.slopeLimitMrad ?? criteria.bearingSlopeMrad
    if (!slope || slope.mrad <= limit) return []
    return [
      {
        code: 'bearing-slope',
        severity: 'fails',
        part: bearing.id,
        loadCase: loadCase.id,
        value: slope.mrad,
        limit,
        unit: 'mrad',
        message: `The shaft tilts by ${significant(slope.mrad, 3)} mrad in bearing ${inSentence(bearing.name)} in ${loadCase.name}; ${significant(limit, 3)} mrad are permitted.`,
        remedy: 'A stiffer shaft, a shorter span or a bearing that tolerates more tilt helps.',
        stationMm: slope.stationMm,
      },
    ]
  })
}

function speedFindings(shaft: ShaftCalculation, loadCase: LoadCase): Finding[] {
  const first = shaft.results.lateralCriticalRpm[0]
  if (first === undefined || first <= 0) return []
  const share = loadCase.speedRpm / first
  if (share < APPROACH_SHARE || share > PASSED_SHARE) return []
  const isResonant = Math.abs(share - 1) <= RESONANCE_SHARE
  return [
    {
      code: 'critical-speed',
      severity: isResonant ? 'fails' : 'warns',
      part: '',
      loadCase: loadCase.id,
      value: loadCase.speedRpm,
      limit: APPROACH_SHARE * first,
      unit: '1/min',
      message: `${capitalised(loadCase.name)} turns at ${significant(loadCase.speedRpm, 4)} 1/min, ${isResonant ? 'at' : 'near'} the first critical speed of ${significant(first, 4)} 1/min.`,
      remedy: 'Run below 0.7 of it, or stiffen the shaft; elastic bearings lower it further.',
    },
  ]
}
