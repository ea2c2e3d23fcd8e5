/** Fields of the document as flat lists of plain values, with labels and units. */
import { fieldWords } from '../layout/field-words'
import { fitSchema, inlineMaterialSchema } from '../layout/layout-document'

export type FieldValue = number | string | boolean | null

/** The longer endings first: `NPerUm` ends in `Um` too. */
const UNIT_OF_ENDING: [ending: string, unit: string][] = [
  ['NPerUm', 'N/µm'],
  ['PerK', '1/K'],
  ['KgM3', 'kg/m³'],
  ['Mrad', 'mrad'],
  ['MPa', 'MPa'],
  ['Rpm', '1/min'],
  ['Deg', '°'],
  ['Nm', 'N·m'],
  ['Mm', 'mm'],
  ['Um', 'µm'],
  ['Kg', 'kg'],
  ['N', 'N'],
  ['C', '°C'],
  ['K', 'K'],
]

/** Where the words of the field's name leave a reader in doubt. */
const CLEARER_LABELS: Record<string, string> = {
  shaftC: 'Shaft temperature',
  hubC: 'Hub temperature',
  rightFilletMm: 'Fillet at the right end',
  'joining.shaftC': 'Shaft temperature at joining',
  'joining.maxHubC': 'Highest hub temperature at joining',
  'joining.ambientC': 'Ambient temperature at joining',
  'material.youngsModulusMPa': 'Material, Young’s modulus',
  'material.yieldMPa': 'Material, yield strength',
  'material.tensileMPa': 'Material, tensile strength',
  'material.maxJoiningC': 'Material, highest joining temperature',
}

export function describeField(path: string): { label: string; unit: string } {
  const head = path.split('.')[0] ?? path
  const leaf = path.split('.').at(-1) ?? path
  if (head === 'hubTemperaturesC') return { label: `Own temperature of hub ${leaf}`, unit: '°C' }
  const unit = UNIT_OF_ENDING.find(([ending]) => leaf.endsWith(ending) && leaf !== ending)?.[1] ?? ''
  const words = fieldWords(path)
  return { label: CLEARER_LABELS[path] ?? words.charAt(0).toUpperCase() + words.slice(1), unit }
}

/**
 * Dot paths to plain values. A fit is one value, because its parts mean nothing alone; a material
 * from the library is one value too, and one given by its properties is compared property by property.
 */
export function flattenFields(values: object, leaveOut: readonly string[]): Map<string, FieldValue> {
  const fields = new Map<string, FieldValue>()
  const visit = (value: unknown, path: string) => {
    if (value === undefined || value === null) return
    if (path === 'fit') fields.set(path, fitWords(value))
    else if (path === 'material') visitMaterial(value)
    else if (typeof value === 'object')
      for (const [key, inner] of Object.entries(value)) visit(inner, path === '' ? key : `${path}.${key}`)
    else fields.set(path, value as FieldValue)
  }
  const visitMaterial = (value: unknown) => {
    const inline = inlineMaterialSchema.safeParse(value)
    if (!inline.success) {
      fields.set('material', String(value))
      return
    }
    const { name, ...properties } = inline.data
    fields.set('material', name ?? 'own values')
    for (const [key, property] of Object.entries(properties))
      if (property !== undefined && property !== null) fields.set(`material.${key}`, property)
  }
  for (const [key, value] of Object.entries(values)) if (!leaveOut.includes(key)) visit(value, key)
  return fields
}

/** "H7/u6" or "35 to 60 µm". */
function fitWords(value: unknown): string {
  const fit = fitSchema.parse(value)
  if (fit.kind === 'iso286') return `${fit.hole}/${fit.shaft}`
  return `${fit.minInterferenceUm} to ${fit.maxInterferenceUm} µm`
}
