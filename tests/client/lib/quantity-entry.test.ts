/**
 * What people type into quantity fields. Conversion factors: NIST Special Publication 811 (2008),
 * appendix B.8, seven digits as printed there; the inch, the pound and standard gravity are exact.
 */
import { describe, expect, it } from 'vitest'
import { type EntryOptions, parseQuantity } from '@/lib/quantity-entry'
import type { QuantityKind, UnitSystem } from '@/lib/quantity-units'

const read = (
  text: string,
  kind: QuantityKind,
  system: UnitSystem = 'metric',
  options: Partial<EntryOptions> = {},
) => parseQuantity(text, { kind, system, ...options })

const value = (text: string, kind: QuantityKind, system: UnitSystem = 'metric') => {
  const result = read(text, kind, system)
  if (!result.ok) throw new Error(`${text}: ${result.message}`)
  return result.value
}

const message = (text: string, kind: QuantityKind, system: UnitSystem = 'metric') => {
  const result = read(text, kind, system)
  return result.ok ? `read as ${result.value}` : result.message
}

describe('conversion factors of NIST SP 811, B.8', () => {
  it.each<[string, QuantityKind, number]>([
    ['1 in', 'length', 25.4], // inch: 2.54 E-02 m, exact
    ['1 ft', 'length', 304.8], // foot: 3.048 E-01 m, exact
    ['1 mil', 'interference', 25.4], // mil (0.001 in): 2.54 E-05 m, exact
    ['1 µin', 'roughness', 0.0254], // microinch: 2.54 E-08 m, exact
    ['1 lbf', 'force', 4.448222], // pound-force: 4.448 222 E+00 N
    ['1 kip', 'force', 4448.222], // kip: 4.448 222 E+03 N
    ['1 kgf', 'force', 9.80665], // kilogram-force: 9.806 65 E+00 N, exact
    ['1 lbf·ft', 'torque', 1.355818], // pound-force foot: 1.355 818 E+00 N·m
    ['1 lbf·in', 'torque', 0.1129848], // pound-force inch: 1.129 848 E-01 N·m
    ['1 psi', 'stress', 6.894757e-3], // psi: 6.894 757 E+03 Pa
    ['1 ksi', 'stress', 6.894757], // ksi: 6.894 757 E+06 Pa
    ['1 bar', 'stress', 0.1], // bar: 1.0 E+05 Pa, exact
    ['1 lb', 'mass', 0.4535924], // pound: 4.535 924 E-01 kg
    ['1 lb/in³', 'density', 27679.9], // pound per cubic inch: 2.767 990 E+04 kg/m³
    ['1 lbf/in', 'stiffness', 1.751268e-4], // pound-force per inch: 1.751 268 E+02 N/m
  ])('%s as %s is %d in the stored unit', (text, kind, expected) => {
    expect(value(text, kind) / expected).toBeCloseTo(1, 6)
  })

  it('reads Fahrenheit and kelvin as temperatures and as differences', () => {
    expect(value('212 °F', 'temperature')).toBeCloseTo(100, 9)
    expect(value('-40 F', 'temperature')).toBeCloseTo(-40, 9)
    expect(value('293.15 K', 'temperature')).toBeCloseTo(20, 9)
    expect(value('36 °F', 'temperatureDifference')).toBeCloseTo(20, 9)
  })
})

describe('units and fractions', () => {
  it.each<[string, QuantityKind, number]>([
    ['2 in', 'length', 50.8],
    ['2in', 'length', 50.8],
    ['2"', 'length', 50.8],
    ['3/8 in', 'length', 9.525],
    ['1 1/2 in', 'length', 38.1],
    ['1 in + 2 mm', 'length', 27.4],
    ['(1 in + 2 mm) * 2', 'length', 54.8],
    ['⌀50', 'length', 50],
    ['0.05 mm', 'interference', 50],
    ['5 thou', 'interference', 127],
    ['0.002 in', 'interference', 50.8],
    ['120 lbf·ft', 'torque', 162.6981538],
    ['120 ft-lb', 'torque', 162.6981538],
    ['1.2 kNm', 'torque', 1200],
    ['1.2 kN', 'force', 1200],
    ['30 rev/s', 'speed', 1800],
    ['1450 1/min', 'speed', 1450],
    ['36°', 'angle', 36],
    ['11.5', 'expansion', 1.15e-5],
    ['206 GPa', 'stress', 206_000],
    ['60 °C', 'temperature', 60],
    ['1.25', 'ratio', 1.25],
  ])('%s as %s', (text, kind, expected) => {
    expect(value(text, kind)).toBeCloseTo(expected, 6)
  })

  it('takes a bare number in the unit the person has chosen', () => {
    expect(value('2', 'length', 'inch')).toBe(50.8)
    expect(value('2', 'interference', 'inch')).toBe(50.8)
    expect(value('50 mm', 'length', 'inch')).toBe(50)
    expect(value('140', 'temperature', 'inch')).toBeCloseTo(60, 9)
  })

  it('stores what was typed without the dust of binary arithmetic', () => {
    expect(value('25.4*2', 'length')).toBe(50.8)
    expect(value('0.1+0.2', 'length')).toBe(0.3)
    expect(value('5 thou', 'interference')).toBe(127)
  })
})

describe('arithmetic and number formats', () => {
  it.each<[string, number]>([
    ['25.4*2', 50.8],
    ['(60 - 12) / 2', 24],
    ['2 × 30 − 5', 55],
    ['-3 + 5', 2],
    ['12,5', 12.5],
    ['0,125', 0.125],
    ['1 234', 1234],
    ['1\u202f234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['1,234.5', 1234.5],
    ['.5', 0.5],
    ['1e3', 1000],
  ])('%s', (text, expected) => {
    expect(value(text, 'length')).toBeCloseTo(expected, 9)
  })
})

describe('radial interference', () => {
  it('doubles a value marked r where the field allows it', () => {
    const options = { allowsRadial: true }
    expect(read('r 20 µm', 'interference', 'metric', options)).toEqual({ ok: true, value: 40 })
    expect(read('r20', 'interference', 'metric', options)).toEqual({ ok: true, value: 40 })
    expect(read('20 µm radial', 'interference', 'metric', options)).toEqual({ ok: true, value: 40 })
    expect(read('R 1 thou', 'interference', 'metric', options)).toEqual({ ok: true, value: 50.8 })
  })

  it('refuses it elsewhere', () => {
    expect(message('r 20 µm', 'interference')).toBe('This field takes a diametral value; leave out the r')
  })
})

describe('what cannot be read says what to type', () => {
  it.each<[string, QuantityKind, RegExp]>([
    ['', 'length', /^Enter a length, such as 50 mm or 2 in$/],
    ['12 kg', 'length', /"kg" does not belong here; type a length/],
    ['12 parsec', 'length', /"parsec" is not a unit known here/],
    ['12 mm', 'ratio', /"mm" does not belong here; type a plain number/],
    ['5/0', 'length', /divides by zero/],
    ['(5 + 2', 'length', /A bracket is not closed/],
    ['5 +', 'length', /A number is missing at the end/],
    ['abc', 'length', /A number is expected before "abc"/],
    ['2 in * 3 in', 'length', /only one number carries a unit/],
    ['2 in mm', 'length', /only one number carries a unit/],
    ['1,250', 'length', /The comma in "1,250" can mean two things; type 1.250 or 1250/],
    ['1.2.3', 'length', /cannot be read as one number/],
    ['20 °C + 10 °C', 'temperature', /Write the unit once/],
  ])('%s as %s', (text, kind, expected) => {
    expect(message(text, kind)).toMatch(expected)
  })

  it('never gives a value that is not finite', () => {
    expect(read('1e308*1e308', 'length').ok).toBe(false)
  })
})
