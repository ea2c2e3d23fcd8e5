/** How the numbers of the shaft came about. */
import { mm, toMPa } from '../../engineering/quantities/units'
import { enduranceLimit } from '../../engineering/shaft/endurance-limit'
import type { LayoutDocument } from '../../layout/layout-document'
import type { Derivation, DerivationInput, ShaftCaseQuantity } from '../derivation'
import type { NotchResult, ShaftLoadCaseResult } from '../layout-results'
import type { LayoutCalculation } from '../recalculate-layout'
import { cite, derivation, input, missing } from './derivation-parts'

const BEAM_MODEL =
  'Stepped beam by finite elements (Euler-Bernoulli), bearings as points at their centres, rigid or elastic, two planes; hubs add no stiffness, the weight of the shaft is not included.'
const BEAM_VALIDITY =
  'Slender shafts; below span/diameter of about 5 shear adds deflection that is not counted.'

export interface ShaftReference {
  loadCase: string
  quantity: ShaftCaseQuantity
  part?: string
  stationMm?: number
}

export function deriveShaftCaseQuantity(
  document: LayoutDocument,
  calculation: LayoutCalculation,
  reference: ShaftReference,
): Derivation {
  const loadCase = document.loadCases.find((one) => one.id === reference.loadCase)
  const result = calculation.shaft.results.loadCases.find((one) => one.loadCase === reference.loadCase)
  if (!loadCase || !result) return missing('No result', '', 'This load case does not exist any more.')
  const context = {
    document,
    calculation,
    result,
    factor: loadCase.applicationFactor,
    caseName: loadCase.name,
  }
  switch (reference.quantity) {
    case 'reaction':
      return reactionDerivation(context, reference.part ?? '')
    case 'slope':
      return slopeDerivation(context, reference.part ?? '')
    case 'fatigueSafety':
      return fatigueDerivation(context, reference)
    case 'torqueMax':
    case 'torqueResidual':
      return torqueDerivation(context, reference.quantity)
    case 'bendingMax':
    case 'deflectionMax':
      return curveDerivation(context, reference.quantity)
    case 'equivalentMax':
    case 'yieldSafety':
      return stressDerivation(context, reference.quantity)
  }
}

interface Context {
  document: LayoutDocument
  calculation: LayoutCalculation
  result: ShaftLoadCaseResult
  factor: number
  caseName: string
}

const noBeam = (context: Context) => context.calculation.shaft.reason ?? 'There is nothing to calculate.'

/** Every load of the case, as it enters the beam. */
function loadInputs({ document, result }: Context): DerivationInput[] {
  const loadCase = document.loadCases.find((one) => one.id === result.loadCase)
  const names = new Map(document.hubs.map((hub) => [hub.id, hub.name]))
  return (loadCase?.loads ?? [])
    .filter((load) => names.has(load.hub))
    .flatMap((load) => [
      input(
        `F_y,${load.hub}`,
        `force up of ${names.get(load.hub) ?? ''} at ${load.stationMm} mm`,
        load.forceYN,
        'N',
        'entered',
      ),
      input(`F_z,${load.hub}`, `force across of ${names.get(load.hub) ?? ''}`, load.forceZN, 'N', 'entered'),
    ])
}

function reactionDerivation(context: Context, part: string): Derivation {
  const reaction = context.result.reactions.find((one) => one.bearing === part)
  const name = context.document.bearings.find((bearing) => bearing.id === part)?.name ?? part
  return derivation({
    title: `Reaction of bearing ${name} in ${context.caseName}`,
    formula: ['K u = f,  R = (K u − f) at the bearing', 'R = √(R_y^2 + R_z^2)'],
    inputs: [
      ...(reaction
        ? [
            input('R_y', 'upward', reaction.yN, 'N', 'calculated'),
            input('R_z', 'across', reaction.zN, 'N', 'calculated'),
            input('R_x', 'along the shaft', reaction.axialN, 'N', 'calculated'),
          ]
        : []),
      ...loadInputs(context),
    ],
    symbol: 'R',
    value: reaction ? Math.hypot(reaction.yN, reaction.zN) : null,
    unit: 'N',
    model: `${BEAM_MODEL} Nominal loads, without application factor.`,
    validity: BEAM_VALIDITY,
    sources: [cite('beam-theory'), cite('statics')],
    notComputable: noBeam(context),
  })
}

function slopeDerivation(context: Context, part: string): Derivation {
  const slope = context.result.slopes.find((one) => one.part === part)
  return derivation({
    title: `Slope of the shaft at ${part} in ${context.caseName}`,
    formula: ['θ = √(y′^2 + z′^2)', 'E I y″ = M_z,  E I z″ = −M_y'],
    inputs: [
      ...(slope ? [input('x', 'station', slope.stationMm, 'mm', 'bearing centre or place of the load')] : []),
      ...loadInputs(context),
    ],
    symbol: 'θ',
    value: slope?.mrad ?? null,
    unit: 'mrad',
    model: `${BEAM_MODEL} Nominal loads, without application factor.`,
    validity: BEAM_VALIDITY,
    sources: [cite('beam-theory'), cite('shigley-9', 'Table 7-2 (guide values)')],
    notComputable: noBeam(context),
  })
}

function torqueDerivation(context: Context, quantity: 'torqueMax' | 'torqueResidual'): Derivation {
  const { document, result } = context
  const loadCase = document.loadCases.find((one) => one.id === result.loadCase)
  const names = new Map(document.hubs.map((hub) => [hub.id, hub.name]))
  const isMax = quantity === 'torqueMax'
  return derivation({
    title: `${isMax ? 'Largest torque in the shaft' : 'Torque left over'} in ${context.caseName}`,
    formula: [isMax ? 'T(x) = Σ T_i left of x,  T_max = largest |T(x)|' : 'ΔT = Σ T_i'],
    inputs: (loadCase?.loads ?? [])
      .filter((load) => names.has(load.hub))
      .map((load) =>
        input(
          `T_${load.hub}`,
          `torque of ${names.get(load.hub) ?? ''} at ${load.stationMm} mm`,
          load.torqueNm,
          'N·m',
          'entered',
        ),
      ),
    symbol: isMax ? 'T_max' : 'ΔT',
    value: isMax ? result.torqueMaxNm : result.torqueResidualNm,
    unit: 'N·m',
    model:
      'Equilibrium round the axis; positive torques drive the shaft; bearing friction is left out. Nominal, without application factor.',
    validity: 'Steady running.',
    sources: [cite('statics')],
  })
}

function curveDerivation(context: Context, quantity: 'bendingMax' | 'deflectionMax'): Derivation {
  const isBending = quantity === 'bendingMax'
  const found = isBending ? context.result.bendingMaxNm : context.result.deflectionMaxUm
  return derivation({
    title: `${isBending ? 'Largest bending moment' : 'Largest deflection'} in ${context.caseName}`,
    formula: isBending
      ? ['M(x) = √(M_y^2 + M_z^2)', 'M_z(x) = Σ F_y,i (x − x_i) − Σ M_z,i left of x']
      : ['w = √(y^2 + z^2)', 'E I y″ = M_z,  E I z″ = −M_y'],
    inputs: [
      ...(found ? [input('x', 'station', found.stationMm, 'mm', 'calculated')] : []),
      ...context.result.reactions.flatMap((reaction) => [
        input(
          `R_y,${reaction.bearing}`,
          `reaction up of ${reaction.bearing}`,
          reaction.yN,
          'N',
          'calculated',
        ),
        input(
          `R_z,${reaction.bearing}`,
          `reaction across of ${reaction.bearing}`,
          reaction.zN,
          'N',
          'calculated',
        ),
      ]),
      ...loadInputs(context),
    ],
    symbol: isBending ? 'M' : 'w',
    value: found?.value ?? null,
    unit: isBending ? 'N·m' : 'µm',
    model: `${BEAM_MODEL} Nominal loads, without application factor.`,
    validity: BEAM_VALIDITY,
    sources: [cite('beam-theory'), cite('statics')],
    notComputable: noBeam(context),
  })
}

function stressDerivation(context: Context, quantity: 'equivalentMax' | 'yieldSafety'): Derivation {
  const { result, calculation } = context
  const { material } = calculation.shaft.inputs
  const found = result.equivalentMaxMPa
  const isStress = quantity === 'equivalentMax'
  const strength = material
    ? [input('R_e', 'yield strength', toMPa(material.yieldStrength), 'MPa', material.name)]
    : []
  return derivation({
    title: `${isStress ? 'Largest equivalent stress of the shaft' : 'Safety of the shaft against yield'} in ${context.caseName}`,
    formula: isStress
      ? [
          'σ_v = √(((σ_x − σ_t)^2 + (σ_t − σ_r)^2 + (σ_r − σ_x)^2)/2 + 3 τ^2)',
          'σ_x = σ_a ± σ_b,  σ_b = 32 M D/(π (D^4 − D_i^4)),  τ = 16 T D/(π (D^4 − D_i^4))',
          'under a seat σ_t = −p (1 + Q_I^2)/(1 − Q_I^2), σ_r = −p; at its bore σ_t = −2 p/(1 − Q_I^2)',
        ]
      : ['S = R_e / σ_v'],
    inputs: [
      ...(found
        ? [
            input('x', 'station', found.stationMm, 'mm', 'calculated'),
            input('σ_v', 'equivalent stress', found.value, 'MPa', 'calculated'),
          ]
        : []),
      input('K', 'application factor on the loads', context.factor, '', context.caseName),
      ...(isStress ? [] : strength),
    ],
    symbol: isStress ? 'σ_v' : 'S',
    value: isStress ? (found?.value ?? null) : result.yieldSafety,
    unit: isStress ? 'MPa' : '',
    model:
      'Nominal bending, axial and torsion stress with the application factor, together with the stress of the fit at its most interference; von Mises.',
    validity: 'Ductile shafts, peak loads; notches enter the fatigue check.',
    sources: [cite('shigley-9', 'Eqs. 7-5, 7-6, 7-15'), cite('lame')],
    notComputable: noBeam(context),
  })
}

function fatigueDerivation(context: Context, reference: ShaftReference): Derivation {
  const notch = chosenNotch(context.result, reference)
  const { material } = context.calculation.shaft.inputs
  const title = `Fatigue safety in ${context.caseName}`
  if (!notch || !material) return missing(title, '', noBeam(context))
  const limit = enduranceLimit(material.tensileStrength, mm(notch.diameterMm), 'ground', 1)
  const isSeat = notch.kind === 'seatEdge'
  return derivation({
    title: `${title}, ${isSeat ? 'seat edge' : 'shoulder'} at ${notch.stationMm} mm`,
    formula: [
      isSeat
        ? '1/S = K_f σ_b/S_e + √((K_f σ_a)^2 + 3 (K_fs τ)^2)/R_m'
        : '1/S = K_f σ_b/S_e + √(σ_a^2 + 3 τ^2)/R_m',
      'S_e = k_a k_b · 0.5 R_m',
      isSeat ? 'K_f = 2.7 (R_m/1000 MPa)^0.43,  K_fs = 0.65 K_f' : 'K_f = 1 + q (K_t − 1)',
    ],
    inputs: [
      input('M', 'bending moment', notch.bendingNm, 'N·m', 'calculated'),
      input('T', 'torque', notch.torqueNm, 'N·m', 'calculated'),
      input('K', 'application factor on both', context.factor, '', context.caseName),
      input('d', 'diameter', notch.diameterMm, 'mm', 'entered'),
      input(
        'K_f',
        'fatigue notch factor, bending',
        notch.fatigueNotchFactor,
        '',
        isSeat ? 'tested seats' : 'fillet',
      ),
      input(
        'K_fs',
        'fatigue notch factor, torsion',
        notch.fatigueNotchFactorTorsion,
        '',
        isSeat ? 'tested seats' : 'fillet',
      ),
      input('k_a', 'surface factor, ground', limit.surfaceFactor, '', 'calculated'),
      input('k_b', 'size factor', limit.sizeFactor, '', 'calculated'),
      input('S_e', 'endurance limit', toMPa(limit.value), 'MPa', 'calculated'),
      input('R_m', 'tensile strength', toMPa(material.tensileStrength), 'MPa', material.name),
    ],
    symbol: 'S',
    value: notch.fatigueSafety,
    unit: '',
    model: 'Bending fully reversed by rotation, torque steady; Goodman line with distortion energy.',
    validity: 'Steels, room temperature, unlimited life; seat factors tested at 40 mm.',
    sources: isSeat
      ? [
          cite('shigley-9', 'Eqs. 6-18, 7-7'),
          cite('din-743', 'part 2, interference-fit seats'),
          cite('horger-maulbetsch'),
        ]
      : [
          cite('shigley-9', 'Eqs. 6-32, 7-7'),
          cite('norton', 'Figs. E-2, E-3'),
          cite('din-743', 'mean stress taken nominal'),
        ],
    notComputable: 'No stress at this place.',
  })
}

/** The notch asked for by part or station, else the weakest. */
function chosenNotch(result: ShaftLoadCaseResult, reference: ShaftReference): NotchResult | undefined {
  const { part, stationMm } = reference
  const named = result.notches.filter(
    (notch) =>
      (part === undefined || notch.part === part) &&
      (stationMm === undefined || Math.abs(notch.stationMm - stationMm) < 1e-6),
  )
  return named.reduce<NotchResult | undefined>((weakest, notch) => {
    if (!weakest) return notch
    return (notch.fatigueSafety ?? Infinity) < (weakest.fatigueSafety ?? Infinity) ? notch : weakest
  }, undefined)
}

export function deriveCriticalSpeed(document: LayoutDocument, calculation: LayoutCalculation): Derivation {
  const { results, inputs, reason } = calculation.shaft
  const named = inputs.masses.map((carried, index) =>
    input(
      `m_${index + 1}`,
      `hub mass at ${Math.round(carried.station * 1e6) / 1e3} mm`,
      carried.mass,
      'kg',
      'entered or ring',
    ),
  )
  return derivation({
    title: 'First lateral critical speed',
    formula: ['det(K − ω^2 M) = 0', 'n = 60 ω/(2π)'],
    inputs: [
      input('L', 'length of the shaft', inputs.lengthMm, 'mm', 'entered'),
      input('', 'bearings', document.bearings.length, '', 'entered'),
      ...named,
    ],
    symbol: 'n_1',
    value: results.lateralCriticalRpm[0] ?? null,
    unit: '1/min',
    model: `Cubic beam elements with consistent mass, hubs as masses with the diametral inertia of their rings, bearings rigid or elastic; gyroscopic effect left out.`,
    validity: 'Slender shafts; bearing and housing flexibility lowers it, often by 10 to 30 %.',
    sources: [cite('vibration-theory'), cite('shigley-9', 'section 7-6')],
    notComputable: reason ?? 'The shaft has no two bearings.',
  })
}
