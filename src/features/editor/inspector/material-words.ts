import { formatGiven } from '@/lib/format-quantity'
import type { UnitSystem } from '@/lib/quantity-units'
import type { MaterialReference } from '@shared/layout/layout-document'

/** A material in a line, without the library: its name, and the strength where the layout itself has it. */
export function materialWords(material: MaterialReference, units: UnitSystem): string {
  if (typeof material === 'string') return material
  const strength = `yield ${formatGiven(material.yieldMPa, 'stress', units).text}`
  return [material.name ?? 'own values', strength, material.brittle ? 'brittle' : '']
    .filter((part) => part !== '')
    .join(', ')
}
