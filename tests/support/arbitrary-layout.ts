/**
 * Layouts that satisfy the schema and otherwise anything: hubs beside the shaft, bores larger than
 * their hub, coincident bearings, sizes at the ends of the permitted range, classes that do not exist.
 */
import fc from 'fast-check'
import {
  DEFAULT_CRITERIA,
  LAYOUT_FORMAT,
  LAYOUT_VERSION,
  type Bearing,
  type Hub,
  type InlineMaterial,
  type LayoutDocument,
  type LoadCase,
  type ShaftSection,
} from '@shared/layout/layout-document'

/** Mostly what people draw, sometimes the very smallest and largest the schema lets through. */
const sized = ([least, most]: [number, number], largest: number) =>
  fc.oneof(
    { weight: 10, arbitrary: fc.double({ min: least, max: most, noNaN: true }) },
    { weight: 1, arbitrary: fc.constantFrom(Number.MIN_VALUE, 1e-300, 1e-9, largest) },
  )
const sizedOrZero = (usual: [number, number], largest: number) =>
  fc.oneof(fc.constant(0), sized(usual, largest))
const station = fc.oneof(
  { weight: 8, arbitrary: fc.double({ min: -20, max: 400, noNaN: true }) },
  { weight: 4, arbitrary: fc.integer({ min: 0, max: 40 }).map((tens) => tens * 10) },
  { weight: 1, arbitrary: fc.constantFrom(-20_000, 20_000, 0) },
)
const force = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: -1e5, max: 1e5, noNaN: true }) },
  { weight: 1, arbitrary: fc.constantFrom(0, -1e9, 1e9, Number.MIN_VALUE) },
)
const name = fc.constantFrom('Pinion', 'cam, inlet', 'Scheibe ß', 'B2', 'x')

const inlineMaterial: fc.Arbitrary<InlineMaterial> = fc.record({
  youngsModulusMPa: sized([1e3, 4e5], 2_000_000),
  poissonRatio: fc.double({ min: 0, max: 0.499, noNaN: true }),
  expansionPerK: fc.oneof(fc.constant(0), fc.double({ min: 0, max: 1e-3, noNaN: true })),
  densityKgM3: sized([500, 9000], 30_000),
  yieldMPa: sized([50, 2000], 10_000),
  tensileMPa: sized([50, 2500], 10_000),
  brittle: fc.boolean(),
  maxJoiningC: fc.option(fc.double({ min: 20, max: 1500, noNaN: true }), { nil: null }),
})
const material = fc.oneof(
  fc.constantFrom('42CrMo4-QT', 'C45E-N', 'EN-GJL-250', '16MnCr5-CH', 'EN-AW-6082-T6', 'unobtainium'),
  inlineMaterial,
)

const section: fc.Arbitrary<Omit<ShaftSection, 'id'>> = fc.record({
  lengthMm: sized([1, 150], 20_000),
  outerDiameterMm: fc.oneof(fc.constantFrom(30, 40, 50, 60), sized([5, 300], 5_000)),
  boreDiameterMm: fc.oneof({ weight: 3, arbitrary: fc.constant(0) }, sizedOrZero([1, 80], 5_000)),
  roughnessRzUm: sizedOrZero([0.5, 25], 1_000),
  rightFilletMm: fc.option(sizedOrZero([0.1, 10], 500), { nil: undefined }),
})

const fit: fc.Arbitrary<Hub['fit']> = fc.oneof(
  fc.record({
    kind: fc.constant('iso286' as const),
    hole: fc.constantFrom('H7', 'H8', 'P7', 'JS7', 'ZC9', 'H99', 'Q7', 'H0'),
    shaft: fc.constantFrom('u6', 's6', 'h6', 't6', 'zc7', 'q6', 'js6', 'k3'),
  }),
  fc.record({
    kind: fc.constant('limits' as const),
    minInterferenceUm: fc.double({ min: -5_000, max: 5_000, noNaN: true }),
    maxInterferenceUm: fc.double({ min: -5_000, max: 5_000, noNaN: true }),
  }),
)

const friction = sized([0.02, 0.5], 1.5).filter((value) => value <= 1.5)

const hub: fc.Arbitrary<Omit<Hub, 'id'>> = fc.record({
  name,
  role: fc.constantFrom('gear', 'cam', 'pulley', 'disc', 'ring', 'other'),
  stationMm: station,
  lengthMm: sized([1, 120], 5_000),
  chamferLeftMm: sizedOrZero([0.5, 5], 500),
  chamferRightMm: sizedOrZero([0.5, 5], 500),
  outerDiameterMm: sized([20, 500], 10_000),
  boreDiameterMm: fc.option(fc.oneof(fc.constantFrom(30, 40, 50, 60), sized([5, 300], 5_000)), { nil: null }),
  material,
  roughnessRzUm: sizedOrZero([0.5, 25], 1_000),
  fit,
  friction: fc.record({ circumferential: friction, axial: friction, pressing: friction }),
  joining: fc.record(
    {
      method: fc.constantFrom('heat-hub', 'cool-shaft', 'heat-and-cool', 'press'),
      side: fc.constantFrom('left', 'right'),
      ambientC: fc.double({ min: -50, max: 80, noNaN: true }),
      clearanceUm: sizedOrZero([1, 200], 5_000),
      handlingAllowanceK: sizedOrZero([1, 100], 500),
      maxHubC: fc.double({ min: 20, max: 1_500, noNaN: true }),
      shaftC: fc.double({ min: -200, max: 80, noNaN: true }),
    },
    { requiredKeys: ['method', 'side'] },
  ),
  abutmentStationMm: fc.option(station, { nil: null }),
  phaseDeg: fc.option(fc.double({ min: -3_600, max: 3_600, noNaN: true }), { nil: null }),
  massKg: fc.option(sizedOrZero([0.1, 50], 100_000), { nil: null }),
  group: fc.option(fc.constantFrom('one', 'two'), { nil: null }),
})

const bearing: fc.Arbitrary<Omit<Bearing, 'id'>> = fc.record({
  name,
  stationMm: station,
  widthMm: sized([5, 60], 2_000),
  boreDiameterMm: fc.option(sized([5, 300], 5_000), { nil: null }),
  kind: fc.constantFrom('locating', 'floating'),
  housing: fc.constantFrom('ring', 'split'),
  side: fc.option(fc.constantFrom('left' as const, 'right' as const), { nil: null }),
  slopeLimitMrad: fc.option(sized([0.1, 10], 1_000), { nil: null }),
  radialStiffnessNPerUm: fc.option(sized([1, 1e4], 1e9), { nil: null }),
})

/** Loads may name hubs that are gone: `h1` to `h6`, while there are at most five. */
const loadHub = fc.integer({ min: 1, max: 6 }).map((number) => `h${number}`)

const loadCase: fc.Arbitrary<Omit<LoadCase, 'id'>> = fc.record({
  name,
  speedRpm: fc.oneof(fc.constant(0), sized([1, 20_000], 1e6)),
  applicationFactor: sized([1, 3], 100),
  shaftC: fc.double({ min: -200, max: 1_000, noNaN: true }),
  hubC: fc.double({ min: -200, max: 1_000, noNaN: true }),
  hubTemperaturesC: fc.option(fc.dictionary(loadHub, fc.double({ min: -200, max: 1_000, noNaN: true })), {
    nil: undefined,
  }),
  loads: fc
    .array(
      fc.record({
        hub: loadHub,
        stationMm: station,
        torqueNm: force,
        forceYN: force,
        forceZN: force,
        axialN: force,
        momentYNm: force,
        momentZNm: force,
      }),
      { maxLength: 5 },
    )
    .map((loads) => loads.map((load, index) => ({ id: `l${index + 1}`, ...load }))),
  criteria: fc.option(fc.record({ slipSafety: sized([0.5, 5], 100) }), { nil: undefined }),
})

const numbered = <Item>(arbitrary: fc.Arbitrary<Item>, prefix: string, maxLength: number) =>
  fc
    .array(arbitrary, { maxLength })
    .map((items) => items.map((item, index) => ({ id: `${prefix}${index + 1}`, ...item })))

export const arbitraryLayout: fc.Arbitrary<LayoutDocument> = fc.record({
  format: fc.constant(LAYOUT_FORMAT),
  version: fc.constant(LAYOUT_VERSION),
  name,
  shaft: fc.record({ material, sections: numbered(section, 's', 5) }),
  hubs: numbered(hub, 'h', 5),
  bearings: numbered(bearing, 'b', 4),
  loadCases: numbered(loadCase, 'c', 3),
  timing: fc.array(
    fc.record({
      hub: loadHub,
      phaseDeg: fc.double({ min: -3_600, max: 3_600, noNaN: true }),
      toleranceDeg: fc.double({ min: 0, max: 180, noNaN: true }),
    }),
    { maxLength: 3 },
  ),
  criteria: fc.record({
    slipSafety: sized([0.5, 5], 100),
    hubYieldSafety: sized([0.5, 5], 100),
    brittleSafety: sized([0.5, 5], 100),
    shaftYieldSafety: sized([0.5, 5], 100),
    fatigueSafety: sized([0.5, 5], 100),
    meshSlopeMrad: fc.constant(DEFAULT_CRITERIA.meshSlopeMrad),
    meshDeflectionUm: fc.option(sized([1, 500], 1e6), { nil: null }),
    bearingSlopeMrad: fc.constant(DEFAULT_CRITERIA.bearingSlopeMrad),
    minGapMm: sizedOrZero([1, 20], 10_000),
    minLengthToDiameter: sizedOrZero([1, 2], 100),
  }),
})
