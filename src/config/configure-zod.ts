/**
 * zod otherwise probes `new Function` when a schema is built, which our content security policy reports.
 * So this runs before any schema: vite.config.ts puts it into zod's own chunk. The pages before sign-in
 * have no schemas and load neither.
 */
import { config } from 'zod'

config({ jitless: true })
