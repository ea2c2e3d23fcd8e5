import { FINE_MESH } from '../../engineering/contact/contact-mesh'
import type { ContactModel } from '../../engineering/contact/contact-model'
import { contactHubResults, type ContactHubResult } from '../../engineering/contact/contact-results'
import { contactBasis, solveContact } from '../../engineering/contact/contact-solution'
import { prepareContact } from '../../engineering/contact/contact-system'
import {
  kilogramPerCubicMetre,
  mm,
  mPa,
  perKelvin,
  rpm,
  toMPa,
  toMm,
} from '../../engineering/quantities/units'
import { FE_PRESS_FIT_CASES, type FeMaterial, type FePressFitCase } from '../data/press-fit-reference'
import type { ValidationCheck } from '../validation-check'

const materialOf = (given: FeMaterial) => ({
  youngsModulus: mPa(given.youngsModulusMPa),
  poissonRatio: given.poissonRatio,
  expansion: perKelvin(given.expansionPerK),
  density: kilogramPerCubicMetre(given.densityKgM3),
})

function modelOf({ shaft, hubs }: FePressFitCase): ContactModel {
  return {
    sections: [
      {
        start: mm(0),
        end: mm(shaft.lengthMm),
        outerDiameter: mm(shaft.diameterMm),
        boreDiameter: mm(shaft.boreMm),
      },
    ],
    shaftMaterial: materialOf(shaft.material),
    hubs: hubs.map((hub) => ({
      id: hub.id,
      start: mm(hub.startMm),
      end: mm(hub.startMm + hub.lengthMm),
      seatDiameter: mm(shaft.diameterMm),
      rings: hub.rings.map(([start, end, outer]) => ({
        start: mm(start),
        end: mm(end),
        outerDiameter: mm(outer),
      })),
      material: materialOf(hub.material),
    })),
  }
}

// Three checks read each case; a case is solved once.
const solved = new Map<string, ContactHubResult[]>()

function solve(given: FePressFitCase): ContactHubResult[] {
  const known = solved.get(given.id)
  if (known) return known
  const system = prepareContact(modelOf(given), FINE_MESH)
  const solution = solveContact(contactBasis(system), {
    interference: given.hubs.map((hub) => mm(hub.interferenceMm)),
    temperatureRise: [given.shaft.riseK, ...given.hubs.map((hub) => hub.riseK)],
    speed: rpm(given.speedRpm),
  })
  const results = contactHubResults(system, solution)
  solved.set(given.id, results)
  return results
}

function checksOf(given: FePressFitCase): ValidationCheck[] {
  const common = {
    topic: 'contact',
    source: 'fe-press-fit',
    place: `case ${given.id}`,
    evidence: 'solver',
    isFromMemory: false,
    unit: 'MPa',
  } as const
  const isOpen = given.results.some((result) => result.openMm > 0)
  const opening: ValidationCheck = {
    ...common,
    id: `contact-${given.id}-open`,
    title: `Open length, ${given.title}`,
    unit: 'mm',
    reference: given.results.map((result) => result.openMm),
    ours: () => solve(given).map((hub) => toMm(hub.openLength)),
    tolerance: { kind: 'absolute', value: 2 * FINE_MESH.foot * FINE_MESH.largest * given.shaft.diameterMm },
    reason: 'one element at each end of the opening',
  }
  const middle: ValidationCheck = {
    ...common,
    id: `contact-${given.id}-middle`,
    title: `Pressure in the middle, ${given.title}`,
    reference: given.results.map((result) => result.middleMPa),
    ours: () => solve(given).map((hub) => toMPa(hub.middlePressure)),
    tolerance: { kind: 'relative', value: 0.015 },
    reason: 'mesh study of the reference',
  }
  return [
    {
      ...common,
      id: `contact-${given.id}-mean`,
      title: `Mean pressure, ${given.title}`,
      reference: given.results.map((result) => result.meanMPa),
      ours: () => solve(given).map((hub) => toMPa(hub.meanPressure)),
      tolerance: { kind: 'relative', value: 0.005 },
      reason: 'mesh study of the reference',
    },
    isOpen ? opening : middle,
    {
      ...common,
      id: `contact-${given.id}-hoop`,
      title: `Hoop stress at the bore in the middle, ${given.title}`,
      reference: given.results.map((result) => result.boreHoopMPa),
      ours: () => solve(given).map((hub) => toMPa(hub.boreHoopMiddle)),
      tolerance: { kind: 'relative', value: 0.03 },
      reason: 'mesh study of the reference',
    },
  ]
}

export const CONTACT_CHECKS: readonly ValidationCheck[] = FE_PRESS_FIT_CASES.flatMap(checksOf)
