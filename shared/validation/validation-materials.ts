import type { Material } from '../engineering/materials/material'
import { celsius, kilogramPerCubicMetre, mPa, pascal, perKelvin } from '../engineering/quantities/units'

/** A material for checks whose sources give only elastic constants; strengths are never reached in them. */
export function elasticMaterial(
  youngsModulusMPa: number,
  poissonRatio: number,
  densityKgM3 = 7850,
  expansionPerK = 11.5e-6,
): Material {
  return {
    name: 'elastic constants of the source',
    youngsModulus: mPa(youngsModulusMPa),
    poissonRatio,
    expansion: perKelvin(expansionPerK),
    coolingExpansion: perKelvin(expansionPerK),
    density: kilogramPerCubicMetre(densityKgM3),
    yieldStrength: pascal(1e12),
    tensileStrength: pascal(1e12),
    isBrittle: false,
    maxJoiningTemperature: celsius(300),
  }
}
