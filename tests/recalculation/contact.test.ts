import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { COARSE_MESH } from '@shared/engineering/contact/contact-mesh'
import { parseLayoutFile } from '@shared/layout/layout-file'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { calculateContact } from '@shared/recalculation/contact/calculate-contact'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'

function scenario(name: string): LayoutDocument {
  const file = new URL(`./data/${name}.layout.json`, import.meta.url)
  const parsed = parseLayoutFile(JSON.parse(readFileSync(file, 'utf8')))
  if (!parsed.ok) throw new Error(`${name} is not a layout file`)
  return parsed.document
}

describe('contact of a layout', () => {
  it.each(['s1-fixed', 's2-fixed', 's3-fixed'])(
    '%s agrees with the formulas as the finite-element report says it must',
    (name) => {
      const document = scenario(name)
      const contact = calculateContact(document)
      const formulas = recalculateLayout(document)
      expect(contact.notComputable).toBeNull()
      expect(contact.leftOut).toEqual([])
      expect(contact.hubs.map((hub) => hub.id)).toEqual(formulas.hubs.map((hub) => hub.id))
      contact.hubs.forEach((hub, k) => {
        const formula = formulas.hubs[k]!
        // Mean pressure above the two-cylinder formula by up to 12 % for short hubs, 15 % on thin hollow shafts;
        // a little below it only where an end is flush or neighbours are close (project reference data).
        const ratio = hub.atRest.meanPressureMPa / formula.atRest.pressureMaxMPa!
        expect(ratio, hub.id).toBeGreaterThan(0.97)
        expect(ratio, hub.id).toBeLessThan(1.16)
        hub.loadCases.forEach((loadCase, i) => {
          expect(loadCase.hasSettled).toBe(true)
          const slip = formula.loadCases[i]!.slipSafety
          if (slip === null) expect(loadCase.slipSafety).toBeNull()
          else expect(loadCase.slipSafety! / slip).toBeGreaterThan(0.96)
        })
      })
    },
  )

  it('says in words what it cannot solve and leaves the others in', () => {
    const document = scenario('s1-fixed')
    const hubs = document.hubs.map((hub, i) => (i === 0 ? { ...hub, stationMm: 900 } : hub))
    const contact = calculateContact({ ...document, hubs }, COARSE_MESH)
    expect(contact.leftOut.map((left) => left.hub)).toEqual([document.hubs[0]!.id])
    expect(contact.hubs).toHaveLength(document.hubs.length - 1)
    expect(calculateContact({ ...document, hubs: [] }, COARSE_MESH).notComputable).toMatch(/no hub/i)
  })

  it('refuses overlapping hubs by name', () => {
    const document = scenario('s1-fixed')
    const [first, second] = document.hubs
    const hubs = [first!, { ...second!, stationMm: first!.stationMm + 1, lengthMm: 40 }]
    expect(calculateContact({ ...document, hubs }, COARSE_MESH).notComputable).toMatch(/overlaps/)
  })
})
