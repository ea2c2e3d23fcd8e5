/**
 * Keeps the results store in step with the visible layout. At most one run is in the worker; while
 * it runs only the newest document waits, so a fast drag never builds a queue. A reply that is not
 * for the run in the worker is late and dropped.
 */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Derivation, QuantityReference } from '@shared/recalculation/derivation'
import type { RecalculationReply, RecalculationRequest } from '@shared/recalculation/worker-messages'
import { useLayoutStore } from './layout-store'
import { useResultsStore, WORST_CASE } from './results-store'
import { reuseEqual } from './reuse-equal'

/** The worker as this file sees it; tests put a queue they flush by hand in its place. */
export interface RecalculationPort {
  post: (request: RecalculationRequest) => void
  onReply: (listener: (reply: RecalculationReply) => void) => void
  /** The worker itself broke (not a calculation that could not run). */
  onCrash: (listener: () => void) => void
  close: () => void
}

export interface Recalculation {
  derive: (reference: QuantityReference) => Promise<Derivation>
  stop: () => void
}

const CRASHED =
  'The calculation stopped. It starts again with the next change; if it does not, reload the page.'

/**
 * While something is dragged the numbers follow twenty times a second: fast enough to steer by, and
 * the frames between stay free for the drawing itself.
 */
const PREVIEW_INTERVAL_MS = 50

let running: Recalculation | null = null

export function startRecalculation(createPort: () => RecalculationPort = createWorkerPort): Recalculation {
  running?.stop()

  let port: RecalculationPort | null = null
  let lastRunId = 0
  let inWorker: { runId: number; document: LayoutDocument } | null = null
  let waiting: LayoutDocument | null = null
  let lastPostedAt = -Infinity
  let timer: ReturnType<typeof setTimeout> | undefined
  let lastRequestId = 0
  const asked = new Map<
    number,
    { resolve: (derivation: Derivation) => void; reject: (error: Error) => void }
  >()

  const openPort = () => {
    const opened = createPort()
    opened.onReply((reply) => port === opened && receive(reply))
    opened.onCrash(() => port === opened && crash())
    port = opened
    return opened
  }

  const dropAsked = (message: string) => {
    for (const { reject } of asked.values()) reject(new Error(message))
    asked.clear()
  }

  const crash = () => {
    port?.close()
    port = null
    inWorker = null
    dropAsked(CRASHED)
    useResultsStore.setState({ failure: CRASHED, isStale: true })
    runNext()
  }

  const runNext = () => {
    clearTimeout(timer)
    if (inWorker !== null || waiting === null) return
    const restMs = lastPostedAt + PREVIEW_INTERVAL_MS - performance.now()
    if (useLayoutStore.getState().preview !== null && restMs > 0) {
      timer = setTimeout(runNext, restMs)
      return
    }
    lastPostedAt = performance.now()
    inWorker = { runId: ++lastRunId, document: waiting }
    waiting = null
    ;(port ?? openPort()).post({ kind: 'recalculate', ...inWorker })
  }

  const receive = (reply: RecalculationReply) => {
    if (reply.kind === 'derivation' || reply.kind === 'notDerived') {
      const answer = asked.get(reply.requestId)
      asked.delete(reply.requestId)
      if (reply.kind === 'derivation') answer?.resolve(reply.derivation)
      else answer?.reject(new Error(reply.message))
      return
    }
    if (inWorker === null || reply.runId !== inWorker.runId) return
    const { document } = inWorker
    inWorker = null
    if (reply.kind === 'results') {
      useResultsStore.setState((state) => ({
        results: state.results === null ? reply.results : reuseEqual(state.results, reply.results),
        document,
        isStale: waiting !== null,
        failure: null,
        selectedLoadCaseId: document.loadCases.some(({ id }) => id === state.selectedLoadCaseId)
          ? state.selectedLoadCaseId
          : WORST_CASE,
      }))
    } else {
      useResultsStore.setState({ failure: reply.message, isStale: true })
    }
    runNext()
  }

  const follow = (document: LayoutDocument | null) => {
    if (document === null) return
    waiting = document
    useResultsStore.setState({ isStale: true })
    runNext()
  }

  /** Another layout: what is in the worker belongs to the old one, and so do the numbers on screen. */
  const forget = () => {
    clearTimeout(timer)
    inWorker = null
    waiting = null
    dropAsked('Another layout was opened.')
    useResultsStore.setState({
      results: null,
      document: null,
      isStale: false,
      failure: null,
      selectedLoadCaseId: WORST_CASE,
    })
  }

  forget()
  follow(useLayoutStore.getState().visible)
  const unsubscribe = useLayoutStore.subscribe((state, previous) => {
    if (state.layoutId !== previous.layoutId) forget()
    if (state.visible !== previous.visible) follow(state.visible)
  })

  const recalculation: Recalculation = {
    derive: (reference) =>
      new Promise((resolve, reject) => {
        const { document } = useResultsStore.getState()
        if (document === null) {
          reject(new Error('Nothing has been calculated yet.'))
          return
        }
        const requestId = ++lastRequestId
        asked.set(requestId, { resolve, reject })
        ;(port ?? openPort()).post({ kind: 'derive', requestId, document, reference })
      }),
    stop: () => {
      unsubscribe()
      forget()
      port?.close()
      port = null
      if (running === recalculation) running = null
    },
  }
  running = recalculation
  return recalculation
}

/** Formula, inputs and source of one number, from the document its results were calculated from. */
export function requestDerivation(reference: QuantityReference): Promise<Derivation> {
  return running === null ? Promise.reject(new Error('No layout is open.')) : running.derive(reference)
}

function createWorkerPort(): RecalculationPort {
  const worker = new Worker(new URL('../workers/recalculation-worker.ts', import.meta.url), {
    type: 'module',
    name: 'recalculation',
  })
  return {
    post: (request) => worker.postMessage(request),
    onReply: (listener) =>
      worker.addEventListener('message', (event: MessageEvent<RecalculationReply>) => listener(event.data)),
    onCrash: (listener) => {
      worker.addEventListener('error', listener)
      worker.addEventListener('messageerror', listener)
    },
    close: () => worker.terminate(),
  }
}
