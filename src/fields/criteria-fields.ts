import type { QuantityKind } from '@/lib/quantity-units'
import type { Criteria } from '@shared/layout/layout-document'

interface CriterionField {
  field: keyof Criteria
  label: string
  kind: QuantityKind
  isOptional?: boolean
  isZeroAllowed?: boolean
  max: number
}

/** The acceptance criteria in the order one judges them, for the layout and for a load case of its own. */
export const CRITERIA_FIELDS: readonly CriterionField[] = [
  { field: 'slipSafety', label: 'Slip safety', kind: 'ratio', max: 100 },
  { field: 'hubYieldSafety', label: 'Hub yield safety', kind: 'ratio', max: 100 },
  { field: 'brittleSafety', label: 'Brittle hub safety', kind: 'ratio', max: 100 },
  { field: 'shaftYieldSafety', label: 'Shaft yield safety', kind: 'ratio', max: 100 },
  { field: 'fatigueSafety', label: 'Fatigue safety', kind: 'ratio', max: 100 },
  { field: 'meshSlopeMrad', label: 'Slope at gears', kind: 'slope', max: 1_000 },
  { field: 'bearingSlopeMrad', label: 'Slope at bearings', kind: 'slope', max: 1_000 },
  {
    field: 'meshDeflectionUm',
    label: 'Deflection at gears',
    kind: 'interference',
    isOptional: true,
    max: 1e6,
  },
  { field: 'minGapMm', label: 'Gap between parts', kind: 'length', isZeroAllowed: true, max: 10_000 },
  { field: 'minLengthToDiameter', label: 'Length to diameter', kind: 'ratio', isZeroAllowed: true, max: 100 },
]
