import { BEAM_CHECKS } from './checks/beam-checks'
import { CONTACT_CHECKS } from './checks/contact-checks'
import { FATIGUE_CHECKS } from './checks/fatigue-checks'
import { INTERFERENCE_FIT_CHECKS } from './checks/interference-fit-checks'
import { LOAD_CHECKS } from './checks/load-checks'
import { ROTATION_CHECKS, TEMPERATURE_CHECKS } from './checks/service-checks'
import { STATISTICS_CHECKS } from './checks/statistics-checks'
import { TOLERANCE_CHECKS } from './checks/tolerance-checks'
import { VIBRATION_CHECKS } from './checks/vibration-checks'
import type { ValidationCheck } from './validation-check'

/** Every check against something outside the project, in the order of the table. */
export const ALL_CHECKS: readonly ValidationCheck[] = [
  ...TOLERANCE_CHECKS,
  ...INTERFERENCE_FIT_CHECKS,
  ...ROTATION_CHECKS,
  ...TEMPERATURE_CHECKS,
  ...LOAD_CHECKS,
  ...BEAM_CHECKS,
  ...FATIGUE_CHECKS,
  ...VIBRATION_CHECKS,
  ...STATISTICS_CHECKS,
  ...CONTACT_CHECKS,
]
