import type { Material } from '@shared/engineering/materials/material'
import type { Pressure } from '@shared/engineering/quantities/quantity'
import { celsius, kilogramPerCubicMetre, mPa, perKelvin } from '@shared/engineering/quantities/units'

/** An elastic material for checks in which only stiffness counts; strengths are ample. */
export function elastic(youngsModulus: Pressure, poissonRatio: number, density = 7850): Material {
  return {
    name: 'test material',
    youngsModulus,
    poissonRatio,
    expansion: perKelvin(11.5e-6),
    coolingExpansion: perKelvin(8.5e-6),
    density: kilogramPerCubicMetre(density),
    yieldStrength: mPa(1000),
    tensileStrength: mPa(1200),
    isBrittle: false,
    maxJoiningTemperature: celsius(300),
  }
}
