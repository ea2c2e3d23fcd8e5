import { describe, expect, it } from 'vitest'
import { demoLayouts } from '@server/demo/layout-data'
import { compareLayouts } from '@shared/comparison/compare-layouts'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'

const document = demoLayouts()[0]?.document as LayoutDocument
const changeHub = (id: string, change: Partial<Hub>): LayoutDocument => ({
  ...document,
  hubs: document.hubs.map((hub) => (hub.id === id ? { ...hub, ...change } : hub)),
})

describe('compareLayouts', () => {
  it('finds nothing between a layout and its copy', () => {
    expect(compareLayouts(document, structuredClone(document))).toEqual([])
  })

  it('names the part, the field, both values and the unit', () => {
    const after = changeHub('A', { fit: { kind: 'iso286', hole: 'H7', shaft: 'u6' }, lengthMm: 64 })
    expect(compareLayouts(document, after)).toEqual([
      {
        change: 'changed',
        kind: 'hub',
        id: 'A',
        name: 'wheel, first stage',
        fields: [
          { field: 'lengthMm', label: 'Length', unit: 'mm', before: 60, after: 64 },
          { field: 'fit', label: 'Fit', unit: '', before: 'H7/t6', after: 'H7/u6' },
        ],
      },
    ])
  })

  it('compares limits of interference as one value with their unit', () => {
    const after = changeHub('A', {
      fit: { kind: 'limits', minInterferenceUm: 57, maxInterferenceUm: 106 },
    })
    expect(compareLayouts(document, after)[0]?.fields).toEqual([
      { field: 'fit', label: 'Fit', unit: '', before: 'H7/t6', after: '57 to 106 µm' },
    ])
  })

  it('compares a material by its properties, and one from the library by its name', () => {
    const material = document.hubs[0]?.material
    if (typeof material !== 'object') throw new Error('The demo gives materials by their values')
    const stronger = changeHub('A', { material: { ...material, yieldMPa: material.yieldMPa + 50 } })
    expect(compareLayouts(document, stronger)[0]?.fields).toEqual([
      {
        field: 'material.yieldMPa',
        label: 'Material, yield strength',
        unit: 'MPa',
        before: material.yieldMPa,
        after: material.yieldMPa + 50,
      },
    ])
    const library = changeHub('A', { material: 'C45-N' })
    expect(compareLayouts(document, library)[0]?.fields[0]).toMatchObject({
      field: 'material',
      after: 'C45-N',
    })
  })

  it('lists parts that came and went, with their loads', () => {
    const without: LayoutDocument = {
      ...document,
      hubs: document.hubs.filter((hub) => hub.id !== 'C'),
      loadCases: document.loadCases.map((loadCase) => ({
        ...loadCase,
        loads: loadCase.loads.filter((load) => load.hub !== 'C'),
      })),
    }
    const removed = compareLayouts(document, without)
    expect(removed.map(({ change, kind, name }) => `${change} ${kind} ${name}`)).toEqual([
      'removed hub oil pump drive gear',
      'removed load load on oil pump drive gear in run',
      'removed load load on oil pump drive gear in warm-up under load',
    ])
    expect(compareLayouts(without, document).map(({ change }) => change)).toEqual(['added', 'added', 'added'])
  })

  it('tells a value that was cleared from one that was set', () => {
    const [hub] = document.hubs
    const cleared = changeHub(hub?.id ?? '', { massKg: null })
    const [difference] = compareLayouts(document, cleared)
    expect(difference?.fields).toEqual([
      { field: 'massKg', label: 'Mass', unit: 'kg', before: hub?.massKg, after: null },
    ])
  })

  it('reports a new order of the sections once', () => {
    const [first, second, ...rest] = document.shaft.sections
    if (!first || !second) throw new Error('no sections')
    const after = {
      ...document,
      shaft: { ...document.shaft, sections: [second, first, ...rest] },
    }
    const differences = compareLayouts(document, after)
    expect(differences).toHaveLength(1)
    expect(differences[0]).toMatchObject({ kind: 'section', name: 'shaft sections' })
    expect(differences[0]?.fields[0]?.label).toBe('Order')
  })

  it('covers load cases, criteria, bearings and the name', () => {
    const after: LayoutDocument = {
      ...document,
      name: 'Renamed',
      criteria: { ...document.criteria, slipSafety: 1.8 },
      bearings: document.bearings.map((bearing) =>
        bearing.id === 'L' ? { ...bearing, stationMm: bearing.stationMm + 1 } : bearing,
      ),
      loadCases: document.loadCases.map((loadCase, index) =>
        index === 0 ? { ...loadCase, hubTemperaturesC: { A: 75 } } : loadCase,
      ),
    }
    const changes = compareLayouts(document, after).map(
      ({ kind, fields }) => `${kind}: ${fields.map((field) => `${field.label} ${field.unit}`.trim()).join()}`,
    )
    expect(changes).toEqual([
      'layout: Name',
      'bearing: Station mm',
      'loadCase: Own temperature of hub A °C',
      'criteria: Slip safety',
    ])
  })
})
