/**
 * Coherent SI quantities. A brand costs nothing at run time: the value is a plain number in the
 * unit named here, but a length can no longer be passed where a pressure is wanted. Arithmetic
 * gives a plain number again, and the function that knows what it computed brands the result.
 */
declare const unit: unique symbol

export type Quantity<Unit extends string> = number & { readonly [unit]: Unit }

export type Length = Quantity<'m'>
export type Pressure = Quantity<'Pa'>
export type Force = Quantity<'N'>
/** Torques and bending moments share a unit; the parameter name says which is meant. */
export type Moment = Quantity<'N·m'>
export type Mass = Quantity<'kg'>
export type Density = Quantity<'kg/m³'>
export type MomentOfInertia = Quantity<'kg·m²'>
export type SecondMomentOfArea = Quantity<'m⁴'>
export type Area = Quantity<'m²'>
export type Angle = Quantity<'rad'>
export type AngularSpeed = Quantity<'rad/s'>
export type Frequency = Quantity<'Hz'>
export type Stiffness = Quantity<'N/m'>
/** Thermodynamic temperature. Differences are plain kelvin numbers. */
export type Temperature = Quantity<'K'>
export type ExpansionCoefficient = Quantity<'1/K'>
/** Radial or diametral flexibility of a ring: strain for one pascal of pressure. */
export type RingCompliance = Quantity<'1/Pa'>
