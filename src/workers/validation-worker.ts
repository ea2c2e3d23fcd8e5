/** Runs the checks off the main thread. No logic of its own. */
import { validationRows } from '@shared/validation/validation-rows'
import type { ValidationReply } from '@shared/validation/worker-messages'

const reply = (message: ValidationReply) => self.postMessage(message)

self.onmessage = () => {
  try {
    reply({ kind: 'rows', rows: validationRows() })
  } catch (error) {
    reply({ kind: 'failed', message: error instanceof Error ? error.message : String(error) })
  }
}
