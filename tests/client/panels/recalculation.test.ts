import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { EMPTY_LAYOUT_STATE, useLayoutStore } from '@/stores/layout-store'
import {
  type Recalculation,
  type RecalculationPort,
  requestDerivation,
  startRecalculation,
} from '@/stores/recalculation'
import { useResultsStore, WORST_CASE } from '@/stores/results-store'
import { blankLayout } from '@shared/layout/blank-layout'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { LayoutResults } from '@shared/recalculation/layout-results'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import type { RecalculationReply, RecalculationRequest } from '@shared/recalculation/worker-messages'

/** A worker whose answers wait until the test sends them. */
class HeldWorker implements RecalculationPort {
  requests: RecalculationRequest[] = []
  isClosed = false
  private listener: (reply: RecalculationReply) => void = () => undefined
  private crashed: () => void = () => undefined
  post = (request: RecalculationRequest) => void this.requests.push(request)
  onReply = (listener: (reply: RecalculationReply) => void) => void (this.listener = listener)
  onCrash = (listener: () => void) => void (this.crashed = listener)
  close = () => void (this.isClosed = true)
  send = (reply: RecalculationReply) => this.listener(reply)
  crash = () => this.crashed()
  answer(index: number) {
    const request = this.requests[index]
    if (request?.kind !== 'recalculate') throw new Error(`request ${index} is not a run`)
    this.send({ kind: 'results', runId: request.runId, results: resultsOf(request.document) })
  }
  documents = () => this.requests.map((request) => request.document.name)
}

const template = recalculateLayout(blankLayout('template'))
const resultsOf = (document: LayoutDocument): LayoutResults => ({ ...template, inputHash: document.name })
const show = (name: string) => useLayoutStore.setState({ visible: blankLayout(name) })
const shownHash = () => useResultsStore.getState().results?.inputHash

let workers: HeldWorker[]
let recalculation: Recalculation
const worker = () => workers.at(-1) as HeldWorker

beforeEach(() => {
  workers = []
  useLayoutStore.setState({ ...EMPTY_LAYOUT_STATE, layoutId: 'layout-1' })
  recalculation = startRecalculation(() => {
    workers.push(new HeldWorker())
    return worker()
  })
})
afterEach(() => recalculation.stop())

describe('recalculation', () => {
  it('calculates what is visible and marks the old numbers until the new ones are there', () => {
    show('one')
    expect(useResultsStore.getState()).toMatchObject({ results: null, isStale: true })
    worker().answer(0)
    expect(shownHash()).toBe('one')
    expect(useResultsStore.getState().isStale).toBe(false)
    show('two')
    expect(shownHash()).toBe('one')
    expect(useResultsStore.getState().isStale).toBe(true)
  })

  it('runs one at a time and skips to the newest', () => {
    show('one')
    show('two')
    show('three')
    expect(worker().documents()).toEqual(['one'])
    worker().answer(0)
    expect(worker().documents()).toEqual(['one', 'three'])
    expect(useResultsStore.getState().isStale).toBe(true)
    worker().answer(1)
    expect(shownHash()).toBe('three')
    expect(useResultsStore.getState().isStale).toBe(false)
  })

  it('lets the numbers of a drag follow twenty times a second, and the drop at once', () => {
    vi.useFakeTimers()
    try {
      const preview = { label: 'Move A', operations: [] }
      useLayoutStore.setState({ visible: blankLayout('drag 1'), preview })
      worker().answer(0)
      useLayoutStore.setState({ visible: blankLayout('drag 2'), preview })
      useLayoutStore.setState({ visible: blankLayout('drag 3'), preview })
      expect(worker().documents()).toEqual(['drag 1'])
      vi.advanceTimersByTime(60)
      expect(worker().documents()).toEqual(['drag 1', 'drag 3'])
      worker().answer(1)
      useLayoutStore.setState({ visible: blankLayout('drag 4'), preview })
      useLayoutStore.setState({ visible: blankLayout('dropped'), preview: null })
      expect(worker().documents()).toEqual(['drag 1', 'drag 3', 'dropped'])
    } finally {
      vi.useRealTimers()
    }
  })

  it('drops a reply that comes twice or for a run it does not wait for', () => {
    show('one')
    worker().answer(0)
    show('two')
    worker().answer(0)
    expect(shownHash()).toBe('one')
    worker().answer(1)
    expect(shownHash()).toBe('two')
    worker().answer(0)
    expect(shownHash()).toBe('two')
  })

  it('drops a reply for a layout that is no longer open', () => {
    show('one')
    useLayoutStore.setState({ layoutId: 'layout-2', visible: blankLayout('other layout') })
    worker().answer(0)
    expect(useResultsStore.getState().results).toBeNull()
    worker().answer(1)
    expect(shownHash()).toBe('other layout')
  })

  it('says why nothing was calculated and keeps the old numbers as old', () => {
    show('one')
    worker().answer(0)
    show('two')
    worker().send({ kind: 'notCalculated', runId: 2, message: 'no shaft' })
    expect(useResultsStore.getState()).toMatchObject({ failure: 'no shaft', isStale: true })
    show('three')
    worker().answer(2)
    expect(useResultsStore.getState()).toMatchObject({ failure: null, isStale: false })
  })

  it('starts a new worker after a crash', () => {
    show('one')
    show('two')
    const first = worker()
    first.crash()
    expect(first.isClosed).toBe(true)
    expect(workers).toHaveLength(2)
    expect(useResultsStore.getState().failure).toContain('stopped')
    worker().answer(0)
    expect(shownHash()).toBe('two')
    expect(useResultsStore.getState().failure).toBeNull()
  })

  it('keeps the identity of results that did not change', () => {
    show('one')
    worker().answer(0)
    const before = useResultsStore.getState().results
    show('two')
    worker().answer(1)
    expect(useResultsStore.getState().results?.shaft).toBe(before?.shaft)
    expect(useResultsStore.getState().results).not.toBe(before)
  })

  it('goes back to the worst case when the chosen one is deleted', () => {
    show('one')
    worker().answer(0)
    useResultsStore.getState().selectLoadCase('gone')
    show('two')
    worker().answer(1)
    expect(useResultsStore.getState().selectedLoadCaseId).toBe(WORST_CASE)
  })

  it('asks for a derivation from the document of the results, and passes on why there is none', async () => {
    await expect(requestDerivation({ kind: 'shaft', quantity: 'lateralCriticalRpm' })).rejects.toThrow(
      'Nothing',
    )
    show('one')
    worker().answer(0)
    show('two')
    const asked = requestDerivation({ kind: 'shaft', quantity: 'lateralCriticalRpm' })
    const request = worker().requests.at(-1)
    expect(request).toMatchObject({ kind: 'derive', document: { name: 'one' } })
    if (request?.kind === 'derive') {
      worker().send({ kind: 'notDerived', requestId: request.requestId, message: 'no such number' })
    }
    await expect(asked).rejects.toThrow('no such number')
  })
})
