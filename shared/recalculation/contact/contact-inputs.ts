/** From a layout document to the contact model of its shaft and all hubs that can be calculated. */
import type { ContactModel, ContactSection } from '../../engineering/contact/contact-model'
import { mm } from '../../engineering/quantities/units'
import type { LayoutDocument } from '../../layout/layout-document'
import { sectionSpans } from '../../layout/shaft-geometry'
import { resolveMaterial } from '../resolve-material'
import { resolveSeat, type Seat } from '../seat'

export interface ContactInputs {
  model: ContactModel
  /** In the order of the model's hubs. */
  seats: Seat[]
  /** Hubs that are not part of the model, and why. */
  leftOut: { hub: string; reason: string }[]
}

/**
 * Steps smaller than this share of a seat are levelled to it: relieved necks of a few tenths of a
 * millimetre need elements as thin as themselves and change nothing that the mesh could show.
 */
const LEVELLED_STEP = 0.01

/** Null when there is nothing to solve. */
export function contactInputs(document: LayoutDocument): ContactInputs | null {
  const shaft = resolveMaterial(document.shaft.material)
  if (!shaft.material) return null
  const seats: Seat[] = []
  const leftOut: ContactInputs['leftOut'] = []
  const hubs: ContactModel['hubs'] = []
  for (const hub of document.hubs) {
    const { seat, problems } = resolveSeat(document, hub)
    if (!seat) {
      leftOut.push({ hub: hub.id, reason: problems[0]?.reason ?? 'it cannot be calculated' })
      continue
    }
    // The chamfers do not touch the shaft; the hub is taken as long as what does.
    const start = mm(hub.stationMm + hub.chamferLeftMm)
    const end = mm(hub.stationMm + hub.lengthMm - hub.chamferRightMm)
    seats.push(seat)
    hubs.push({
      id: hub.id,
      start,
      end,
      seatDiameter: seat.rings.seatDiameter,
      rings: [
        {
          start: mm(0),
          end: mm(hub.lengthMm - hub.chamferLeftMm - hub.chamferRightMm),
          outerDiameter: seat.rings.hub.outerDiameter,
        },
      ],
      material: seat.rings.hub.material,
    })
  }
  if (hubs.length === 0) return null
  const sections = sectionSpans(document).map(({ section, startMm, endMm }): ContactSection => {
    const near = hubs.find(
      (hub) => Math.abs(mm(section.outerDiameterMm) - hub.seatDiameter) <= LEVELLED_STEP * hub.seatDiameter,
    )
    return {
      start: mm(startMm),
      end: mm(endMm),
      outerDiameter: near?.seatDiameter ?? mm(section.outerDiameterMm),
      boreDiameter: mm(section.boreDiameterMm),
    }
  })
  return { model: { sections, shaftMaterial: shaft.material, hubs }, seats, leftOut }
}
