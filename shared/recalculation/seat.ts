/** One hub on its seat, in SI units, or the reasons why it cannot be calculated. */
import { EngineeringInputError } from '../engineering/engineering-input-error'
import type { SeatFriction } from '../engineering/interference-fit/holding-capacity'
import { embeddingLoss } from '../engineering/interference-fit/embedding-loss'
import {
  interferenceOfClasses,
  interferenceOfLimits,
  type InterferenceLimits,
} from '../engineering/interference-fit/interference-limits'
import {
  seatCompliance,
  type SeatCompliance,
  type SeatRings,
} from '../engineering/interference-fit/interface-pressure'
import type { HeatedJoint } from '../engineering/interference-fit/joining-temperature'
import type { Length, Temperature } from '../engineering/quantities/quantity'
import { celsius, kelvin, metre, mm, um } from '../engineering/quantities/units'
import type { Criteria, Hub, InterferenceFit, LayoutDocument } from '../layout/layout-document'
import { seatUnder, type Seat as SeatOfHub } from '../layout/shaft-geometry'
import type { FindingCode } from './layout-results'
import { seatCases, type SeatCase } from './load-case-inputs'
import { attempt } from './attempt'
import { resolveMaterial } from './resolve-material'
import { millimetreText } from './wording'

export interface Joining {
  method: Hub['joining']['method']
  side: 'left' | 'right'
  joint: HeatedJoint
  handlingAllowance: number
  /** Hottest the hub may get: the lower of the material's limit and the person's; null when neither is known. */
  hubLimit: Temperature | null
}

export interface Seat {
  id: string
  name: string
  role: Hub['role']
  sectionId: string
  rings: SeatRings
  compliance: SeatCompliance
  effectiveLength: Length
  hubLength: Length
  hubRoughness: Length
  shaftRoughness: Length
  embedding: Length
  fit: InterferenceFit
  interference: InterferenceLimits
  friction: SeatFriction & { pressing: number }
  joining: Joining
  criteria: Criteria
  cases: SeatCase[]
}

/** Why a hub has no numbers. The code tells which finding it becomes. */
export interface SeatProblem {
  code: Extract<
    FindingCode,
    'no-seat' | 'bore-mismatch' | 'unknown-tolerance' | 'unknown-material' | 'not-computable'
  >
  reason: string
  remedy: string
}

export interface ResolvedSeat {
  seat: Seat | null
  sectionId: string | null
  diameterMm: number | null
  effectiveLengthMm: number | null
  problems: SeatProblem[]
}

/** A bore that differs from its seat by more than this is not a fit any more but another size. */
export const BORE_TOLERANCE_MM = 0.05
/** Customary travel clearance: a thousandth of the diameter. */
const CLEARANCE_SHARE = 0.001
const DEFAULT_AMBIENT_C = 20
const DEFAULT_HANDLING_ALLOWANCE_K = 20

export function resolveSeat(document: LayoutDocument, hub: Hub): ResolvedSeat {
  const under = seatUnder(document, hub)
  if (!under) return unresolved(null, null, null, [noSeat()])
  const section = under.span.section
  const diameterMm = section.outerDiameterMm
  const lengthMm = carryingLengthMm(hub, under)
  const problems: SeatProblem[] = []
  const boreMm = hub.boreDiameterMm ?? diameterMm
  if (Math.abs(boreMm - diameterMm) > BORE_TOLERANCE_MM) problems.push(boreMismatch(boreMm, diameterMm))
  if (section.boreDiameterMm >= diameterMm)
    problems.push(
      notComputable(
        `the shaft bore of ${millimetreText(section.boreDiameterMm)} is not smaller than the seat of ${millimetreText(diameterMm)}`,
        'Make the shaft bore smaller or the seat larger.',
      ),
    )
  if (hub.outerDiameterMm <= boreMm)
    problems.push(
      notComputable(
        `the outer diameter of ${millimetreText(hub.outerDiameterMm)} is not larger than the bore of ${millimetreText(boreMm)}`,
        'Give the hub a larger outer diameter.',
      ),
    )
  if (lengthMm <= 0)
    problems.push(
      notComputable(
        'the chamfers leave no length that carries',
        'Make the hub longer or its chamfers smaller.',
      ),
    )
  const shaft = resolveMaterial(document.shaft.material)
  const material = resolveMaterial(hub.material)
  for (const resolved of [shaft, material])
    if (resolved.reason) problems.push(unknownMaterial(resolved.reason))
  const interference = interferenceOf(hub.fit, mm(boreMm))
  if ('code' in interference) problems.push(interference)
  if (problems.length > 0 || 'code' in interference || !shaft.material || !material.material)
    return unresolved(section.id, diameterMm, Math.max(0, lengthMm), problems)

  const rings: SeatRings = {
    seatDiameter: mm(boreMm),
    shaft: { bore: mm(section.boreDiameterMm), material: shaft.material },
    hub: { outerDiameter: mm(hub.outerDiameterMm), material: material.material },
  }
  const compliance = attempt(() => seatCompliance(rings))
  if (compliance.reason !== null || !Number.isFinite(compliance.value.interferencePerPressure))
    return unresolved(section.id, diameterMm, lengthMm, [
      notComputable(
        'its diameters are too close together or too small',
        'Check bore, seat and outer diameter.',
      ),
    ])
  const seat: Seat = {
    id: hub.id,
    name: hub.name,
    role: hub.role,
    sectionId: section.id,
    rings,
    compliance: compliance.value,
    effectiveLength: mm(lengthMm),
    hubLength: mm(hub.lengthMm),
    hubRoughness: um(hub.roughnessRzUm),
    shaftRoughness: um(section.roughnessRzUm),
    embedding: embeddingLoss(um(hub.roughnessRzUm), um(section.roughnessRzUm)),
    fit: hub.fit,
    interference,
    friction: hub.friction,
    joining: joiningOf(hub, rings),
    criteria: document.criteria,
    cases: seatCases(document, hub),
  }
  return { seat, sectionId: section.id, diameterMm, effectiveLengthMm: lengthMm, problems }
}

/** Stretch of the seat under the hub, without the chamfers at the ends of the bore. */
function carryingLengthMm(hub: Hub, under: SeatOfHub): number {
  const left = Math.max(under.startMm, hub.stationMm + hub.chamferLeftMm)
  const right = Math.min(under.endMm, hub.stationMm + hub.lengthMm - hub.chamferRightMm)
  return right - left
}

/** Limits of the fit at a size, or why the classes do not exist there. */
export function interferenceOf(fit: InterferenceFit, size: Length): InterferenceLimits | SeatProblem {
  if (fit.kind === 'limits') return interferenceOfLimits(um(fit.minInterferenceUm), um(fit.maxInterferenceUm))
  try {
    return interferenceOfClasses(size, fit.hole, fit.shaft)
  } catch (error) {
    if (error instanceof EngineeringInputError)
      return {
        code: 'unknown-tolerance',
        reason: error.message,
        remedy: 'Choose a class from the list, or give the limits of interference instead.',
      }
    throw error
  }
}

function joiningOf(hub: Hub, rings: SeatRings): Joining {
  const given = hub.joining
  const ambient = celsius(given.ambientC ?? DEFAULT_AMBIENT_C)
  const coolsShaft = given.method === 'heat-and-cool' || given.method === 'cool-shaft'
  const limits = [
    rings.hub.material.maxJoiningTemperature,
    given.maxHubC === undefined ? null : celsius(given.maxHubC),
  ]
  const known = limits.filter((limit) => limit !== null)
  return {
    method: given.method,
    side: given.side,
    joint: {
      seatDiameter: rings.seatDiameter,
      clearance:
        given.clearanceUm === undefined ? metre(rings.seatDiameter * CLEARANCE_SHARE) : um(given.clearanceUm),
      ambient,
      shaftTemperature: coolsShaft && given.shaftC !== undefined ? celsius(given.shaftC) : ambient,
      hub: rings.hub.material,
      shaft: rings.shaft.material,
    },
    handlingAllowance: given.handlingAllowanceK ?? DEFAULT_HANDLING_ALLOWANCE_K,
    hubLimit: known.length > 0 ? kelvin(Math.min(...known)) : null,
  }
}

function unresolved(
  sectionId: string | null,
  diameterMm: number | null,
  effectiveLengthMm: number | null,
  problems: SeatProblem[],
): ResolvedSeat {
  return { seat: null, sectionId, diameterMm, effectiveLengthMm, problems }
}

const noSeat = (): SeatProblem => ({
  code: 'no-seat',
  reason: 'no shaft lies under it',
  remedy: 'Move it onto the shaft or make the shaft longer.',
})
const notComputable = (reason: string, remedy: string): SeatProblem => ({
  code: 'not-computable',
  reason,
  remedy,
})
const unknownMaterial = (reason: string): SeatProblem => ({
  code: 'unknown-material',
  reason,
  remedy: 'Choose a material from the library or enter its values.',
})
const boreMismatch = (boreMm: number, diameterMm: number): SeatProblem => ({
  code: 'bore-mismatch',
  reason: `its bore of ${millimetreText(boreMm)} and the seat of ${millimetreText(diameterMm)} are different sizes`,
  remedy: `Give the hub the bore of its seat, ${millimetreText(diameterMm)}, or the seat the diameter of the bore.`,
})
