/**
 * The three invented layouts, flawed and fixed, against figures of a separate script with the same model
 * (data/expected.json). Safeties within 1 %, beam figures within 2 %; a figure printed with few digits gets half a unit
 * of its last digit where that is more. Findings of severity `fails` exactly.
 */
import { describe, expect, it } from 'vitest'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import type { HubResult, LayoutResults, ShaftLoadCaseResult } from '@shared/recalculation/layout-results'
import { expectedScenarios, type ExpectedFit, type ExpectedShaft } from './expected-scenarios'
import { scenario, SCENARIO_FILES, type ScenarioFile } from './scenario-files'

/** Half a unit of the last digit printed in the reference. */
function printedRounding(value: number): number {
  const decimals = /\.(\d+)/.exec(String(value))?.[1]?.length ?? 0
  return 0.5 * 10 ** -decimals * 1.0001
}

function expectWithin(actual: number | null | undefined, expected: number, share: number, name: string) {
  const tolerance = Math.max(share * Math.abs(expected), printedRounding(expected))
  expect(Math.abs((actual ?? NaN) - expected), `${name}: ${actual} against ${expected}`).toBeLessThanOrEqual(
    tolerance,
  )
}

const hubOf = (results: LayoutResults, id: string): HubResult => {
  const hub = results.hubs.find((one) => one.id === id)
  if (!hub) throw new Error(`no hub ${id}`)
  return hub
}

function expectFit(results: LayoutResults, id: string, loadCase: string, expected: ExpectedFit) {
  const hub = hubOf(results, id)
  const inCase = hub.loadCases.find((one) => one.loadCase === loadCase)
  const check = (actual: number | null | undefined, value: number, name: string) =>
    expectWithin(actual, value, 0.01, `${id} ${name}`)
  expect(hub.interference.minUm).toBe(expected.Umin_um)
  expect(hub.interference.maxUm).toBe(expected.Umax_um)
  check(hub.interference.embeddingLossUm, expected.smoothing_loss_um, 'embedding')
  check(hub.seat.effectiveLengthMm, expected.L_eff_mm, 'effective length')
  check(inCase?.thermalChangeUm, expected.thermal_change_um, 'thermal change')
  check(inCase?.pressureMinMPa, expected.p_min_MPa, 'least pressure')
  check(hub.atRest.pressureMaxMPa, expected.p_max_20C_MPa, 'pressure at rest')
  check(inCase?.torqueCapacityNm, expected.T_cap_min_Nm, 'torque capacity')
  check((inCase?.axialCapacityN ?? NaN) / 1e3, expected.F_cap_min_kN, 'axial capacity')
  check(hub.outerDiameterGrowthUm.max, expected.od_growth_um, 'growth')
  check(hub.assembly.joiningC, expected.T_join_C, 'joining temperature')
  check(hub.assembly.ovenC, expected.T_oven_C, 'oven temperature')
  check(hub.assembly.limitC, expected.max_join_C, 'joining limit')
  check((hub.assembly.pressForceMaxN ?? NaN) / 1e3, expected.press_force_max_kN, 'press force')
}

function expectDemand(results: LayoutResults, id: string, loadCase: string, expected: ExpectedFit) {
  const inCase = hubOf(results, id).loadCases.find((one) => one.loadCase === loadCase)
  expectWithin((inCase?.requiredResultantN ?? NaN) / 1e3, expected.req_resultant_kN, 0.01, `${id} resultant`)
  expectWithin(inCase?.slipSafety, expected.S_slip_min, 0.01, `${id} slip safety`)
}

function expectStressAtRest(results: LayoutResults, id: string, expected: ExpectedFit) {
  const { atRest } = hubOf(results, id)
  expectWithin(atRest.hubEquivalentMaxMPa, expected.hub_vonMises_max_MPa, 0.01, `${id} hub stress`)
  expectWithin(atRest.hubHoopMaxMPa, expected.hub_hoop_bore_MPa, 0.01, `${id} hub hoop`)
  expectWithin(atRest.hubYieldSafety, expected.S_hub_yield, 0.01, `${id} hub safety`)
  expectWithin(atRest.shaftYieldSafety, expected.S_shaft_yield, 0.01, `${id} shaft safety`)
}

function expectShaft(result: ShaftLoadCaseResult | undefined, expected: ExpectedShaft, factor: number) {
  expected.reactions_N.forEach((reaction, index) => {
    const found = result?.reactions[index]
    expectWithin(Math.hypot(found?.yN ?? NaN, found?.zN ?? NaN), reaction, 0.02, `reaction ${index}`)
  })
  expected.bearing_slope_mrad.forEach((slope, index) =>
    expectWithin(result?.slopes[index]?.mrad, slope, 0.02, `bearing slope ${index}`),
  )
  for (const mesh of expected.mesh) {
    const slope = result?.slopes.find((one) => one.part === mesh.hub)
    const deflection = result?.deflections.find((one) => one.part === mesh.hub)
    expect(slope?.stationMm).toBe(mesh.x)
    expectWithin(slope?.mrad, mesh.slope_mrad, 0.02, `slope at ${mesh.hub}`)
    expectWithin(deflection?.um, mesh.deflection_um, 0.02, `deflection at ${mesh.hub}`)
  }
  for (const edge of expected.seat_edges) {
    const notch = result?.notches.find(
      (one) =>
        one.kind === 'seatEdge' && Math.abs(one.stationMm - edge.x) < 0.01 && one.diameterMm === edge.d,
    )
    // where a larger seat begins at a step the reference judges the thinner side; our shoulder notch does that
    if (!notch) continue
    expectWithin(notch.bendingNm * factor, edge.M_Nm, 0.02, `bending at ${edge.x}`)
    expectWithin(notch.fatigueSafety, edge.n_fatigue, 0.02, `fatigue at ${edge.x}`)
  }
  expectWithin(result?.fatigueSafety?.value, expected.min_fatigue, 0.02, 'least fatigue safety')
}

const fails = (results: LayoutResults) =>
  results.findings
    .filter((finding) => finding.severity === 'fails')
    .map(({ code, part, loadCase }) => ({ code, part, loadCase }))

describe('findings that fail', () => {
  const expected: Record<ScenarioFile, ReturnType<typeof fails>> = {
    's1-flawed': [
      { code: 'slip', part: 'A', loadCase: 'run' },
      { code: 'slip', part: 'A', loadCase: 'warm-up' },
    ],
    's1-fixed': [],
    's2-flawed': [{ code: 'phase', part: 'L4', loadCase: null }],
    's2-fixed': [],
    's3-flawed': [
      { code: 'passage-blocked', part: 'K3', loadCase: null },
      { code: 'abutment-missing', part: 'G2', loadCase: null },
    ],
    's3-fixed': [],
  }
  it.each(SCENARIO_FILES)('%s', (name) => {
    const results = recalculateLayout(scenario(name))
    expect(fails(results)).toEqual(expected[name])
    expect(results.verdict).toBe(expected[name].length > 0 ? 'fails' : 'passes')
    expect(results.assembly.feasible).toBe(name !== 's3-flawed')
  })
})

describe('S1, reducer shaft', () => {
  const flawed = recalculateLayout(scenario('s1-flawed'))
  const fixed = recalculateLayout(scenario('s1-fixed'))

  it.each([
    ['flawed', flawed, expectedScenarios.S1.expected.flawed.fits],
    ['fixed', fixed, expectedScenarios.S1.expected.fixed.fits],
  ] as const)('fits, %s', (_name, results, fits) => {
    for (const [id, expected] of Object.entries(fits)) {
      expectFit(results, id, 'run', expected)
      expectDemand(results, id, 'run', expected)
      expectStressAtRest(results, id, expected)
    }
  })
  it('slip safety while warming up', () => {
    const safety = (results: LayoutResults, id: string) =>
      hubOf(results, id).loadCases.find((one) => one.loadCase === 'warm-up')?.slipSafety
    expectWithin(safety(flawed, 'A'), expectedScenarios.S1.expected.flawed.transient_S_slip_A, 0.01, 'A')
    for (const [id, expected] of Object.entries(expectedScenarios.S1.expected.fixed.transient_S_slip))
      expectWithin(safety(fixed, id), expected, 0.01, id)
  })
  it('shaft', () => {
    const expected = expectedScenarios.S1.expected.fixed.shaft
    if (!expected) throw new Error('no shaft in the reference')
    expectShaft(fixed.shaft.loadCases[0], expected, 1.5)
  })
  it('says what slips and which fit mends it', () => {
    const finding = flawed.findings.find((one) => one.code === 'slip' && one.loadCase === 'run')
    expect(finding?.message).toBe(
      'Wheel, first stage slips at the lower end of its tolerance: capacity 1436 N·m, required 1522 N·m.',
    )
    expect(finding?.remedy).toBe('H7/u6 on the same seat gives 1.65.')
    expect(hubOf(flawed, 'A').governingLoadCase).toBe('warm-up')
  })
  it('notes growth of the gears and tension at the root of the pinion', () => {
    const notes = fixed.findings.filter((one) => one.severity === 'notes')
    const partsOf = (code: string) => notes.filter((one) => one.code === code).map((one) => one.part)
    expect(partsOf('outer-diameter-growth')).toEqual(['A', 'B'])
    expect(partsOf('root-tension')).toContain('B')
  })
})

describe('S2, camshaft', () => {
  const fixed = recalculateLayout(scenario('s2-fixed'))
  const { lobe_20C, lobe_110C, flange_110C, bending_cases } = expectedScenarios.S2.expected.fixed

  it('a lobe at rest and hot', () => {
    // growth is stated as joined, at 20 °C
    expectFit(fixed, 'L1', 'cylinder-1', { ...lobe_110C, od_growth_um: lobe_20C.od_growth_um })
    expectDemand(fixed, 'L1', 'cylinder-1', lobe_110C)
    // at rest the reference is its 20 °C state; its hot one prints the same pressure but hot stresses
    expectStressAtRest(fixed, 'L1', lobe_20C)
    const hot = hubOf(fixed, 'L1').loadCases[0]
    expectWithin(hot?.hubEquivalentMaxMPa, lobe_110C.hub_vonMises_max_MPa, 0.01, 'hot hub stress')
    expectWithin(hot?.hubYieldSafety, lobe_110C.S_hub_yield, 0.01, 'hot hub safety')
    expectWithin(hot?.shaftYieldSafety, lobe_110C.S_shaft_yield, 0.01, 'hot shaft safety')
  })
  it('the flange, which carries 48 N·m here and 60 N·m in the reference', () => {
    const inCase = hubOf(fixed, 'F').loadCases[0]
    expectFit(fixed, 'F', 'cylinder-1', flange_110C)
    expectStressAtRest(fixed, 'F', flange_110C)
    expectWithin(inCase?.slipSafety, (flange_110C.S_slip_min * 60) / 48, 0.01, 'slip safety')
  })
  it('bending of the four cylinders', () => {
    bending_cases.forEach((expected, index) => {
      const result = fixed.shaft.loadCases[index]
      expected.reactions_N.forEach((reaction, bearing) => {
        const found = result?.reactions[bearing]
        expectWithin(Math.hypot(found?.yN ?? NaN, found?.zN ?? NaN), reaction, 0.02, `reaction ${bearing}`)
      })
      expected.bearing_slope_mrad.forEach((slope, bearing) =>
        expectWithin(result?.slopes[bearing]?.mrad, slope, 0.02, `slope ${bearing}`),
      )
      expected.lobe_deflection_um.forEach((deflection, lobe) =>
        expectWithin(
          result?.deflections.find((one) => one.part === `L${lobe + 1}`)?.um,
          deflection,
          0.02,
          `deflection of L${lobe + 1}`,
        ),
      )
      expectWithin(result?.bendingMaxNm?.value, expected.M_max_Nm, 0.02, 'largest bending moment')
    })
  })
  it('asks whether the angle of L4 was read from the rear end', () => {
    const finding = recalculateLayout(scenario('s2-flawed')).findings.find((one) => one.code === 'phase')
    expect(finding?.message).toBe(
      'Lobe, cylinder 2, rear valve is 30° from its group and from the timing chart: 165° against 195°.',
    )
    expect(finding?.remedy).toBe('The mirrored value 195° matches: was this read from the rear end?')
  })
  it('notes that L8 travels hot over eight seats with 32 µm, and mounts from the far end', () => {
    const finding = fixed.findings.find((one) => one.code === 'passage-tight' && one.part === 'L8')
    expect(finding?.severity).toBe('notes')
    expect(finding?.message).toMatch(/over 8 seats of other hubs with 32 µm/)
    expect(fixed.assembly.order.map(({ part }) => part)).toEqual([
      'L8',
      'L7',
      'L6',
      'L5',
      'L4',
      'L3',
      'L2',
      'L1',
      'F',
    ])
  })
})

describe('S3, line shaft', () => {
  it.each([
    ['s3-flawed', expectedScenarios.S3.expected.flawed],
    ['s3-fixed', expectedScenarios.S3.expected.fixed],
  ] as const)('%s', (name, expected) => {
    const results = recalculateLayout(scenario(name))
    for (const [id, fit] of Object.entries(expected.fits)) {
      expectFit(results, id, 'run', fit)
      expectDemand(results, id, 'run', fit)
      // the pulley expands twice as much as the shaft: the reference states its stresses at rest
      expectStressAtRest(results, id, fit)
    }
    if (!expected.shaft) throw new Error('no shaft in the reference')
    expectShaft(results.shaft.loadCases[0], expected.shaft, 1.5)
  })
  it('names what blocks K3 from both ends and what would let it pass', () => {
    const finding = recalculateLayout(scenario('s3-flawed')).findings.find((one) => one.part === 'K3')
    expect(finding?.message).toBe(
      'Cam, flap closer (bore 66 mm) cannot pass the seat of take-off gear, infeed (70 mm) from the right and is stopped by the collar (84 mm) from the left.',
    )
    expect(finding?.remedy).toBe(
      'Take-off gear, infeed at 62 mm with H7/t6 carries the torque with 2.63 and restores its shoulder.',
    )
  })
  it('mounts the fixed layout from the inside outward, left end first', () => {
    const { order } = recalculateLayout(scenario('s3-fixed')).assembly
    expect(order.map(({ part }) => part)).toEqual(['B2', 'G1', 'K2', 'K1', 'B1', 'K3', 'G2', 'P1', 'B3'])
    expect(order.filter(({ side }) => side === 'right').map(({ part }) => part)).toEqual([
      'K3',
      'G2',
      'P1',
      'B3',
    ])
  })
})
