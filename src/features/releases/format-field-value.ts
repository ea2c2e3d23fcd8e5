/** Entered values of a comparison in the units the person has chosen. */
import { formatGiven } from '@/lib/format-quantity'
import type { QuantityKind, UnitSystem } from '@/lib/quantity-units'
import type { FieldValue } from '@shared/comparison/describe-fields'

const KIND_OF_UNIT: Record<string, QuantityKind> = {
  mm: 'length',
  µm: 'interference',
  'N·m': 'torque',
  N: 'force',
  MPa: 'stress',
  '°C': 'temperature',
  K: 'temperatureDifference',
  kg: 'mass',
  '1/min': 'speed',
  '°': 'angle',
  mrad: 'slope',
  'N/µm': 'stiffness',
  '1/K': 'expansion',
  'kg/m³': 'density',
}

export function formatFieldValue(value: FieldValue, unit: string, system: UnitSystem): string {
  if (value === null) return 'none'
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (typeof value === 'string') return value
  const kind = KIND_OF_UNIT[unit]
  return kind === undefined ? formatGiven(value, 'ratio', system).text : formatGiven(value, kind, system).text
}
