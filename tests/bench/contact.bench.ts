/** Contact of ten hubs on one shaft: mesh, factor and first solution; a change of fit; the coarse mesh; cost by hubs. */
import { COARSE_MESH, FINE_MESH, type MeshQuality } from '@shared/engineering/contact/contact-mesh'
import type { ContactModel } from '@shared/engineering/contact/contact-model'
import { contactHubResults } from '@shared/engineering/contact/contact-results'
import { contactBasis, solveContact, type ContactState } from '@shared/engineering/contact/contact-solution'
import { prepareContact } from '@shared/engineering/contact/contact-system'
import { gPa, kilogramPerCubicMetre, mm, perKelvin, rpm, um } from '@shared/engineering/quantities/units'
import { median, type BenchFigure } from './bench-figure'

const STEEL = {
  youngsModulus: gPa(206),
  poissonRatio: 0.3,
  expansion: perKelvin(11.5e-6),
  density: kilogramPerCubicMetre(7850),
}
const RUNS = 7
const WARM_UP_RUNS = 3

function model(hubs: number): ContactModel {
  const pitch = 60
  return {
    sections: [{ start: mm(0), end: mm(40 + hubs * pitch), outerDiameter: mm(50), boreDiameter: mm(0) }],
    shaftMaterial: STEEL,
    hubs: Array.from({ length: hubs }, (_, k) => ({
      id: `H${k}`,
      start: mm(20 + k * pitch),
      end: mm(20 + k * pitch + 40),
      seatDiameter: mm(50),
      rings: [{ start: mm(0), end: mm(40), outerDiameter: mm(90 + 2 * (k % 4)) }],
      material: STEEL,
    })),
  }
}

const state = (hubs: number, interference: number): ContactState => ({
  interference: Array.from({ length: hubs }, () => um(interference)),
  temperatureRise: new Array<number>(hubs + 1).fill(0),
  speed: rpm(1500),
})

function timed(run: () => void): number {
  const start = performance.now()
  run()
  return performance.now() - start
}

function figure(name: string, run: (index: number) => void, goal: number | null): BenchFigure {
  for (let i = 0; i < WARM_UP_RUNS; i++) run(i)
  const values = Array.from({ length: RUNS }, (_, i) => timed(() => run(i + WARM_UP_RUNS)))
  const round = (value: number) => Number(value.toFixed(2))
  return {
    figure: name,
    value: round(median(values)),
    unit: 'ms',
    goal,
    runs: RUNS,
    min: round(Math.min(...values)),
    max: round(Math.max(...values)),
  }
}

function whole(hubs: number, quality: MeshQuality): void {
  const system = prepareContact(model(hubs), quality)
  contactHubResults(system, solveContact(contactBasis(system), state(hubs, 50)))
}

export function measure(): BenchFigure[] {
  const system = prepareContact(model(10), FINE_MESH)
  const basis = contactBasis(system)
  return [
    figure('contact of 10 hubs, recommended mesh', () => whole(10, FINE_MESH), 150),
    figure(
      'contact of 10 hubs, change of fit only',
      (i) => contactHubResults(system, solveContact(basis, state(10, 40 + i))),
      5,
    ),
    figure('contact of 10 hubs, coarse mesh', () => whole(10, COARSE_MESH), 16),
    ...[2, 5, 20, 40].map((hubs) =>
      figure(`contact of ${hubs} hubs, recommended mesh`, () => whole(hubs, FINE_MESH), null),
    ),
  ]
}
