/** The built-in friction pairs. */
import type { FrictionPair } from './friction-pair'
import { PRESSED_FRICTION } from './pressed-friction'
import { SHRUNK_FRICTION } from './shrunk-friction'

export const FRICTION_PAIRS: readonly FrictionPair[] = [...SHRUNK_FRICTION, ...PRESSED_FRICTION]
