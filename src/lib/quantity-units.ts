/**
 * Units a person may type or see, and how they turn into the stored metric value. Factors are the
 * exact definitions (international inch and pound, standard gravity) that NIST SP 811 appendix B
 * rounds to seven digits.
 */
export type UnitSystem = 'metric' | 'inch'

export type QuantityKind =
  | 'length'
  | 'interference'
  | 'roughness'
  | 'torque'
  | 'force'
  | 'stress'
  | 'temperature'
  | 'temperatureDifference'
  | 'mass'
  | 'speed'
  | 'angle'
  | 'slope'
  | 'stiffness'
  | 'expansion'
  | 'density'
  | 'ratio'

export interface Unit {
  symbol: string
  /** Other ways people type it, compared without regard to capitals unless `isCaseSensitive`. */
  aliases: readonly string[]
  /** stored = typed × factor + offset */
  factor: number
  offset?: number
  isCaseSensitive?: boolean
}

interface KindOfQuantity {
  /** For messages: "This field takes a length". */
  noun: string
  /** For messages: how one might type it. */
  example: string
  metric: string
  inch: string
  units: readonly Unit[]
}

const INCH_MM = 25.4
const POUND_KG = 0.45359237
const STANDARD_GRAVITY = 9.80665
const POUND_FORCE_N = POUND_KG * STANDARD_GRAVITY
const FOOT_M = 0.3048
const PSI_MPA = POUND_FORCE_N / INCH_MM ** 2

const unit = (symbol: string, factor: number, ...aliases: string[]): Unit => ({ symbol, factor, aliases })

/** `N·m` also as `Nm`, `N m`, `N*m`, `N.m`, `N-m`. */
const product = (factor: number, a: string, b: string, ...aliases: string[]): Unit => ({
  symbol: `${a}·${b}`,
  factor,
  aliases: [...['', ' ', '*', '.', '-', '⋅'].map((joint) => `${a}${joint}${b}`), ...aliases],
})

const LENGTHS_MM: readonly Unit[] = [
  unit('mm', 1, 'millimetre', 'millimetres'),
  unit('cm', 10),
  unit('m', 1_000, 'metre', 'metres'),
  unit('µm', 1e-3, 'um', 'μm', 'micron', 'microns'),
  unit('in', INCH_MM, '"', '″', 'inch', 'inches'),
  unit('ft', FOOT_M * 1_000, "'", '′', 'foot', 'feet'),
  unit('thou', INCH_MM / 1_000, 'mil', 'mils'),
  unit('µin', INCH_MM / 1e6, 'uin', 'μin', 'microinch'),
]
const LENGTHS_UM = LENGTHS_MM.map((length) => ({ ...length, factor: length.factor * 1_000 }))

export const QUANTITY_KINDS: Record<QuantityKind, KindOfQuantity> = {
  length: { noun: 'a length', example: '50 mm or 2 in', metric: 'mm', inch: 'in', units: LENGTHS_MM },
  interference: {
    noun: 'an interference',
    example: '45 µm, 0.045 mm or 2 thou',
    metric: 'µm',
    inch: 'thou',
    units: LENGTHS_UM,
  },
  roughness: {
    noun: 'a roughness',
    example: '6.3 µm or 250 µin',
    metric: 'µm',
    inch: 'µin',
    units: LENGTHS_UM,
  },
  torque: {
    noun: 'a torque or moment',
    example: '160 N·m or 120 lbf·ft',
    metric: 'N·m',
    inch: 'lbf·ft',
    units: [
      product(1, 'N', 'm'),
      product(1_000, 'kN', 'm'),
      product(1e-3, 'N', 'mm'),
      product(
        POUND_FORCE_N * FOOT_M,
        'lbf',
        'ft',
        'lb ft',
        'lb-ft',
        'lb·ft',
        'ft lb',
        'ft-lb',
        'ft lbf',
        'ft·lbf',
        'ft-lbf',
        'ft·lb',
      ),
      product(
        (POUND_FORCE_N * INCH_MM) / 1_000,
        'lbf',
        'in',
        'lb in',
        'lb-in',
        'lb·in',
        'in lb',
        'in-lb',
        'in lbf',
        'in·lbf',
        'in-lbf',
        'in·lb',
      ),
      product(STANDARD_GRAVITY, 'kgf', 'm', 'kp·m', 'kpm'),
    ],
  },
  force: {
    noun: 'a force',
    example: '1200 N, 1.2 kN or 270 lbf',
    metric: 'N',
    inch: 'lbf',
    units: [
      unit('N', 1, 'newton'),
      unit('kN', 1_000),
      unit('lbf', POUND_FORCE_N, 'lb', 'lbs'),
      unit('kip', POUND_FORCE_N * 1_000, 'kips', 'klbf'),
      unit('kgf', STANDARD_GRAVITY, 'kp'),
    ],
  },
  stress: {
    noun: 'a stress or pressure',
    example: '340 MPa or 50 ksi',
    metric: 'MPa',
    inch: 'ksi',
    units: [
      unit('MPa', 1, 'N/mm²', 'N/mm2', 'N/mm^2'),
      unit('GPa', 1_000),
      unit('kPa', 1e-3),
      unit('Pa', 1e-6),
      unit('bar', 0.1),
      unit('ksi', PSI_MPA * 1_000),
      unit('psi', PSI_MPA, 'lbf/in²', 'lbf/in2'),
    ],
  },
  temperature: {
    noun: 'a temperature',
    example: '60 °C or 140 °F',
    metric: '°C',
    inch: '°F',
    units: [
      unit('°C', 1, 'C', 'degC', 'deg C'),
      { ...unit('°F', 5 / 9, 'F', 'degF', 'deg F'), offset: -160 / 9 },
      { ...unit('K', 1, 'kelvin'), offset: -273.15 },
    ],
  },
  temperatureDifference: {
    noun: 'a temperature difference',
    example: '20 K or 36 °F',
    metric: 'K',
    inch: '°F',
    units: [unit('K', 1, '°C', 'C', 'kelvin'), unit('°F', 5 / 9, 'F', 'degF', 'deg F')],
  },
  mass: {
    noun: 'a mass',
    example: '3.1 kg or 6.8 lb',
    metric: 'kg',
    inch: 'lb',
    units: [
      unit('kg', 1),
      unit('g', 1e-3),
      unit('t', 1_000),
      unit('lb', POUND_KG, 'lbs', 'lbm'),
      unit('oz', POUND_KG / 16),
    ],
  },
  speed: {
    noun: 'a speed',
    example: '1450 rpm or 24 rev/s',
    metric: 'rpm',
    inch: 'rpm',
    units: [
      unit('rpm', 1, '1/min', 'r/min', 'rev/min', 'min-1', 'min⁻¹'),
      unit('rev/s', 60, 'r/s', '1/s', 'Hz'),
      unit('rad/s', 30 / Math.PI),
    ],
  },
  angle: {
    noun: 'an angle',
    example: '36° or 0.63 rad',
    metric: '°',
    inch: '°',
    units: [
      unit('°', 1, 'deg', 'degree', 'degrees'),
      unit('rad', 180 / Math.PI),
      unit('arcmin', 1 / 60, "'", '′'),
    ],
  },
  slope: {
    noun: 'a slope',
    example: '0.5 mrad',
    metric: 'mrad',
    inch: 'mrad',
    units: [
      unit('mrad', 1),
      unit('rad', 1_000),
      unit('arcmin', (Math.PI / 10_800) * 1_000, "'", '′'),
      unit('°', (Math.PI / 180) * 1_000, 'deg'),
    ],
  },
  stiffness: {
    noun: 'a stiffness',
    example: '400 N/µm or 2284 kip/in',
    metric: 'N/µm',
    inch: 'kip/in',
    units: [
      unit('N/µm', 1, 'N/um', 'N/μm', 'kN/mm', 'MN/m'),
      unit('N/mm', 1e-3, 'kN/m'),
      unit('kip/in', (POUND_FORCE_N * 1_000) / (INCH_MM * 1_000), 'klbf/in'),
      unit('lbf/in', POUND_FORCE_N / (INCH_MM * 1_000), 'lb/in'),
    ],
  },
  expansion: {
    noun: 'a coefficient of expansion',
    example: '11.5 10⁻⁶/K',
    metric: '10⁻⁶/K',
    inch: '10⁻⁶/°F',
    units: [
      unit('10⁻⁶/K', 1e-6, 'ppm/K', 'µm/(m·K)', 'um/mK', '10^-6/K', '/MK'),
      unit('10⁻⁶/°F', 1.8e-6, 'ppm/°F', 'ppm/F', 'µin/(in·°F)', '10^-6/°F'),
      unit('1/K', 1, '/K'),
    ],
  },
  density: {
    noun: 'a density',
    example: '7850 kg/m³ or 0.284 lb/in³',
    metric: 'kg/m³',
    inch: 'lb/in³',
    units: [
      unit('kg/m³', 1, 'kg/m3', 'kg/m^3'),
      unit('g/cm³', 1_000, 'g/cm3', 'kg/dm³', 'kg/dm3'),
      unit('lb/in³', POUND_KG / (INCH_MM / 1_000) ** 3, 'lb/in3', 'lb/in^3'),
    ],
  },
  ratio: { noun: 'a plain number', example: '1.5', metric: '', inch: '', units: [] },
}

/** The unit a field shows and a bare number means. */
export function displayUnit(kind: QuantityKind, system: UnitSystem): Unit {
  const { units, [system]: symbol } = QUANTITY_KINDS[kind]
  return units.find((candidate) => candidate.symbol === symbol) ?? { symbol: '', aliases: [], factor: 1 }
}

/** Twelve digits keep every stored value and drop the dust of binary arithmetic: 5 thou is 127 µm. */
const withoutDust = (value: number) => Number(value.toPrecision(12))

export const toStored = (typed: number, { factor, offset = 0 }: Unit) => withoutDust(typed * factor + offset)

export const fromStored = (stored: number, { factor, offset = 0 }: Unit) =>
  withoutDust((stored - offset) / factor)
