/** Runs the calculation off the main thread, so that dragging stays smooth. No logic of its own. */
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import type { RecalculationReply, RecalculationRequest } from '@shared/recalculation/worker-messages'

type DeriveRequest = Extract<RecalculationRequest, { kind: 'derive' }>

const reply = (message: RecalculationReply) => self.postMessage(message)

const words = (error: unknown) => (error instanceof Error ? error.message : String(error))

self.onmessage = (event: MessageEvent<RecalculationRequest>) => {
  const request = event.data
  if (request.kind === 'derive') {
    void derive(request)
    return
  }
  try {
    reply({ kind: 'results', runId: request.runId, results: recalculateLayout(request.document) })
  } catch (error) {
    reply({ kind: 'notCalculated', runId: request.runId, message: words(error) })
  }
}

/** The formula texts are fetched with the first number that somebody opens. */
async function derive({ requestId, document, reference }: DeriveRequest) {
  try {
    const { deriveQuantity } = await import('@shared/recalculation/derive-quantity')
    reply({ kind: 'derivation', requestId, derivation: deriveQuantity(document, reference) })
  } catch (error) {
    reply({ kind: 'notDerived', requestId, message: words(error) })
  }
}
