/**
 * The layout document: the one thing people edit live, export, import, freeze and calculate.
 * Field names and meaning follow the layout file format, version 1. Stored values keep the
 * engineer's unit in the field name; only shared/recalculation converts to SI.
 */
import { z } from 'zod'

export const LAYOUT_FORMAT = 'hubstead-layout'
export const LAYOUT_VERSION = 1

/** How long each list may get; an operation that would go beyond it is refused. */
export const LIST_LIMITS = {
  sections: 200,
  hubs: 200,
  bearings: 60,
  loadCases: 100,
  loads: 500,
  timing: 200,
} as const

const finite = z.number().finite()
const positive = finite.positive()
const nonNegative = finite.nonnegative()

/** Ids are short and printable; `__proto__` and the like never become keys. */
export const partIdSchema = z
  .string()
  .min(1)
  .max(64)
  .regex(/^[A-Za-z0-9][A-Za-z0-9 _.:-]*$/, 'Use letters, digits, space, dot, colon, dash or underscore')

export const nameSchema = z.string().trim().min(1, 'Give it a name').max(120, 'At most 120 characters')

export const inlineMaterialSchema = z.strictObject({
  name: z.string().max(80).optional(),
  youngsModulusMPa: positive.max(2_000_000),
  poissonRatio: finite.min(0).max(0.499),
  expansionPerK: finite.min(0).max(1e-3),
  densityKgM3: positive.max(30_000),
  yieldMPa: positive.max(10_000),
  tensileMPa: positive.max(10_000),
  brittle: z.boolean().default(false),
  maxJoiningC: finite.min(20).max(1_500).nullish(),
})

/** A library id or the values themselves. */
export const materialSchema = z.union([z.string().min(1).max(80), inlineMaterialSchema])

export const shaftSectionSchema = z.strictObject({
  id: partIdSchema,
  lengthMm: positive.max(20_000),
  outerDiameterMm: positive.max(5_000),
  boreDiameterMm: nonNegative.max(5_000).default(0),
  roughnessRzUm: nonNegative.max(1_000).default(4),
  rightFilletMm: nonNegative.max(500).optional(),
})

export const iso286FitSchema = z.strictObject({
  kind: z.literal('iso286'),
  hole: z
    .string()
    .max(8)
    .regex(/^[A-Z]{1,2}\d{1,2}$/, 'A hole class is a capital letter and a grade, such as H7'),
  shaft: z
    .string()
    .max(8)
    .regex(/^[a-z]{1,2}\d{1,2}$/, 'A shaft class is a small letter and a grade, such as u6'),
})

export const limitsFitSchema = z.strictObject({
  kind: z.literal('limits'),
  minInterferenceUm: finite.min(-5_000).max(5_000),
  maxInterferenceUm: finite.min(-5_000).max(5_000),
})

export const fitSchema = z.discriminatedUnion('kind', [iso286FitSchema, limitsFitSchema])

export const frictionSchema = z.strictObject({
  circumferential: positive.max(1.5),
  axial: positive.max(1.5),
  pressing: positive.max(1.5),
})

export const joiningSchema = z.strictObject({
  method: z.enum(['heat-hub', 'cool-shaft', 'heat-and-cool', 'press']),
  side: z.enum(['left', 'right']),
  ambientC: finite.min(-50).max(80).optional(),
  clearanceUm: nonNegative.max(5_000).optional(),
  handlingAllowanceK: nonNegative.max(500).optional(),
  maxHubC: finite.min(20).max(1_500).optional(),
  shaftC: finite.min(-200).max(80).optional(),
})

export const hubSchema = z.strictObject({
  id: partIdSchema,
  name: nameSchema,
  role: z.enum(['gear', 'cam', 'pulley', 'disc', 'ring', 'other']),
  stationMm: finite.min(-20_000).max(20_000),
  lengthMm: positive.max(5_000),
  chamferLeftMm: nonNegative.max(500).default(0),
  chamferRightMm: nonNegative.max(500).default(0),
  outerDiameterMm: positive.max(10_000),
  boreDiameterMm: positive.max(5_000).nullish(),
  material: materialSchema,
  roughnessRzUm: nonNegative.max(1_000).default(6.3),
  fit: fitSchema,
  friction: frictionSchema,
  joining: joiningSchema,
  abutmentStationMm: finite.min(-20_000).max(20_000).nullish(),
  phaseDeg: finite.min(-3_600).max(3_600).nullish(),
  massKg: nonNegative.max(100_000).nullish(),
  group: z.string().max(80).nullish(),
})

export const bearingSchema = z.strictObject({
  id: partIdSchema,
  name: nameSchema,
  stationMm: finite.min(-20_000).max(20_000),
  widthMm: positive.max(2_000),
  boreDiameterMm: positive.max(5_000).nullish(),
  kind: z.enum(['locating', 'floating']),
  housing: z.enum(['ring', 'split']).default('split'),
  side: z.enum(['left', 'right']).nullish(),
  slopeLimitMrad: positive.max(1_000).nullish(),
  radialStiffnessNPerUm: positive.max(1e9).nullish(),
})

export const criteriaSchema = z.strictObject({
  slipSafety: positive.max(100),
  hubYieldSafety: positive.max(100),
  brittleSafety: positive.max(100),
  shaftYieldSafety: positive.max(100),
  fatigueSafety: positive.max(100),
  meshSlopeMrad: positive.max(1_000),
  meshDeflectionUm: positive.max(1e6).nullish(),
  bearingSlopeMrad: positive.max(1_000),
  minGapMm: nonNegative.max(10_000),
  minLengthToDiameter: nonNegative.max(100),
})

export const loadSchema = z.strictObject({
  /** Files may leave it out; import gives one (`normaliseLayout`). */
  id: partIdSchema,
  hub: partIdSchema,
  stationMm: finite.min(-20_000).max(20_000),
  torqueNm: finite.min(-1e9).max(1e9).default(0),
  forceYN: finite.min(-1e9).max(1e9).default(0),
  forceZN: finite.min(-1e9).max(1e9).default(0),
  axialN: finite.min(-1e9).max(1e9).default(0),
  momentYNm: finite.min(-1e9).max(1e9).default(0),
  momentZNm: finite.min(-1e9).max(1e9).default(0),
})

export const loadCaseSchema = z.strictObject({
  id: partIdSchema,
  name: nameSchema,
  speedRpm: finite.min(0).max(1e6),
  applicationFactor: positive.max(100).default(1),
  shaftC: finite.min(-200).max(1_000).default(20),
  hubC: finite.min(-200).max(1_000).default(20),
  hubTemperaturesC: z.record(partIdSchema, finite.min(-200).max(1_000)).optional(),
  loads: z.array(loadSchema).max(LIST_LIMITS.loads),
  criteria: criteriaSchema.partial().optional(),
})

export const timingEntrySchema = z.strictObject({
  hub: partIdSchema,
  phaseDeg: finite.min(-3_600).max(3_600),
  toleranceDeg: nonNegative.max(180),
})

export const DEFAULT_CRITERIA: Criteria = {
  slipSafety: 1.5,
  hubYieldSafety: 1.2,
  brittleSafety: 2,
  shaftYieldSafety: 1.5,
  fatigueSafety: 1.5,
  meshSlopeMrad: 0.5,
  bearingSlopeMrad: 1,
  minGapMm: 5,
  minLengthToDiameter: 0.5,
}

export const layoutDocumentSchema = z.strictObject({
  format: z.literal(LAYOUT_FORMAT),
  version: z.literal(LAYOUT_VERSION),
  name: nameSchema,
  shaft: z.strictObject({
    material: materialSchema,
    sections: z.array(shaftSectionSchema).max(LIST_LIMITS.sections),
  }),
  hubs: z.array(hubSchema).max(LIST_LIMITS.hubs),
  bearings: z.array(bearingSchema).max(LIST_LIMITS.bearings),
  loadCases: z.array(loadCaseSchema).max(LIST_LIMITS.loadCases),
  timing: z.array(timingEntrySchema).max(LIST_LIMITS.timing),
  criteria: criteriaSchema,
})

export type InlineMaterial = z.infer<typeof inlineMaterialSchema>
export type MaterialReference = z.infer<typeof materialSchema>
export type ShaftSection = z.infer<typeof shaftSectionSchema>
export type InterferenceFit = z.infer<typeof fitSchema>
export type Friction = z.infer<typeof frictionSchema>
export type Joining = z.infer<typeof joiningSchema>
export type Hub = z.infer<typeof hubSchema>
export type Bearing = z.infer<typeof bearingSchema>
export type Criteria = z.infer<typeof criteriaSchema>
export type Load = z.infer<typeof loadSchema>
export type LoadCase = z.infer<typeof loadCaseSchema>
export type TimingEntry = z.infer<typeof timingEntrySchema>
export type LayoutDocument = z.infer<typeof layoutDocumentSchema>
