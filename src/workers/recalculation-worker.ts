/** Runs the calculation off the main thread, so that dragging stays smooth. No logic of its own. */
import { deriveQuantity } from '@shared/recalculation/derive-quantity'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import type { RecalculationReply, RecalculationRequest } from '@shared/recalculation/worker-messages'

const reply = (message: RecalculationReply) => self.postMessage(message)

const words = (error: unknown) => (error instanceof Error ? error.message : String(error))

self.onmessage = (event: MessageEvent<RecalculationRequest>) => {
  const request = event.data
  if (request.kind === 'recalculate') {
    try {
      reply({ kind: 'results', runId: request.runId, results: recalculateLayout(request.document) })
    } catch (error) {
      reply({ kind: 'notCalculated', runId: request.runId, message: words(error) })
    }
    return
  }
  try {
    const derivation = deriveQuantity(request.document, request.reference)
    reply({ kind: 'derivation', requestId: request.requestId, derivation })
  } catch (error) {
    reply({ kind: 'notDerived', requestId: request.requestId, message: words(error) })
  }
}
