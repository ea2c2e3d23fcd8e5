/**
 * Unit constructors and readers: `mm(50)` makes a length, `toMm(length)` reads it back. They are
 * the only place in the core where a conversion factor stands.
 */
import type {
  Angle,
  AngularSpeed,
  Area,
  Density,
  ExpansionCoefficient,
  Force,
  Frequency,
  Length,
  Mass,
  Moment,
  MomentOfInertia,
  Pressure,
  RingCompliance,
  SecondMomentOfArea,
  Stiffness,
  Temperature,
} from './quantity'

const ZERO_CELSIUS_K = 273.15
const RAD_S_PER_RPM = Math.PI / 30

// SI values as they are
export const metre = (value: number) => value as Length
export const squareMetre = (value: number) => value as Area
export const metre4 = (value: number) => value as SecondMomentOfArea
export const pascal = (value: number) => value as Pressure
export const newton = (value: number) => value as Force
export const newtonMetre = (value: number) => value as Moment
export const kilogram = (value: number) => value as Mass
export const kilogramPerCubicMetre = (value: number) => value as Density
export const kilogramSquareMetre = (value: number) => value as MomentOfInertia
export const radian = (value: number) => value as Angle
export const radianPerSecond = (value: number) => value as AngularSpeed
export const hertz = (value: number) => value as Frequency
export const newtonPerMetre = (value: number) => value as Stiffness
export const kelvin = (value: number) => value as Temperature
export const perKelvin = (value: number) => value as ExpansionCoefficient
export const perPascal = (value: number) => value as RingCompliance

// the engineer's units
export const mm = (value: number) => (value / 1e3) as Length
export const um = (value: number) => (value / 1e6) as Length
export const inch = (value: number) => (value * 0.0254) as Length
export const mPa = (value: number) => (value * 1e6) as Pressure
export const gPa = (value: number) => (value * 1e9) as Pressure
export const psi = (value: number) => (value * 6894.757293168361) as Pressure
export const kN = (value: number) => (value * 1e3) as Force
export const poundForce = (value: number) => (value * 4.4482216152605) as Force
export const poundForceInch = (value: number) => (value * 0.1129848290276167) as Moment
export const degree = (value: number) => ((value * Math.PI) / 180) as Angle
export const rpm = (value: number) => (value * RAD_S_PER_RPM) as AngularSpeed
export const celsius = (value: number) => (value + ZERO_CELSIUS_K) as Temperature
export const newtonPerMicrometre = (value: number) => (value * 1e6) as Stiffness

export const toMm = (length: Length) => length * 1e3
export const toUm = (length: Length) => length * 1e6
export const toInch = (length: Length) => length / 0.0254
export const toMPa = (pressure: Pressure) => pressure / 1e6
export const toPsi = (pressure: Pressure) => pressure / 6894.757293168361
export const toKN = (force: Force) => force / 1e3
export const toRpm = (speed: AngularSpeed) => speed / RAD_S_PER_RPM
export const toCelsius = (temperature: Temperature) => temperature - ZERO_CELSIUS_K
export const toMrad = (angle: Angle) => angle * 1e3
export const toDegree = (angle: Angle) => (angle * 180) / Math.PI
