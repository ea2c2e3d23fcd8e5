import { mm, toUm } from '../../engineering/quantities/units'
import { limitsOfClass } from '../../engineering/tolerances/iso286-limits'
import { ISO286_SPOT_VALUES } from '../data/iso286-spot-values'
import type { ValidationCheck } from '../validation-check'

/** Limit deviations as printed in standards, handbooks and catalogues. */
export const TOLERANCE_CHECKS: readonly ValidationCheck[] = ISO286_SPOT_VALUES.map(
  ([size, toleranceClass, upper, lower, source, isFromMemory]) => ({
    id: `iso286-${size}-${toleranceClass}`,
    topic: 'tolerances',
    title: `Limits of ${size} ${toleranceClass}`,
    source,
    place: 'table of limit deviations',
    evidence: 'published',
    isFromMemory,
    unit: 'µm',
    reference: [upper, lower],
    ours: () => {
      const limits = limitsOfClass(mm(size), toleranceClass)
      return [toUm(limits.upperDeviation), toUm(limits.lowerDeviation)]
    },
    // Conversion to metres and back leaves some 1e-12 µm.
    tolerance: { kind: 'absolute', value: 1e-6 },
    reason: 'printed in whole or half micrometres',
  }),
)
