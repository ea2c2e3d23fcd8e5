/**
 * Imported before anything else: zod otherwise probes `new Function` when a schema is built, which our
 * content security policy reports. The core import keeps schemas out of the entry chunk.
 */
import { config } from 'zod/v4/core'

config({ jitless: true })
