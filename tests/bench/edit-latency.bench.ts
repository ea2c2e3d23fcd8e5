/** From one person's edit to another's screen: twenty clients in one layout over real sockets, each edit stored first. */
import { openClient, until } from '../sync/support/real-client'
import { startTestApp } from '../support/test-app'
import type { BenchFigure } from './bench-figure'

const CLIENTS = 20
const WARM_UP_EDITS = 20
const EDITS = 200
const PAUSE_MS = 15

function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b)
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? NaN
}

export async function measure(): Promise<BenchFigure[]> {
  const app = await startTestApp()
  try {
    const people = [await app.signInAs('designer'), await app.signInAs('tomas')]
    const layoutId = app.layoutIds[0] ?? ''
    const clients = await Promise.all(
      Array.from({ length: CLIENTS }, (_, index) => openClient(app, people[index % 2]!, layoutId)),
    )
    const [author, ...readers] = clients
    if (!author) return []
    const seen: number[] = []
    const sentAt = new Map<string, number>()
    for (const reader of readers) {
      let last = reader.state.visible?.name ?? ''
      reader.store.subscribe(({ visible }) => {
        if (!visible || visible.name === last) return
        last = visible.name
        const sent = sentAt.get(last)
        if (sent !== undefined) seen.push(performance.now() - sent)
      })
    }
    for (let at = 0; at < WARM_UP_EDITS + EDITS; at += 1) {
      const value = `Edit ${at}`
      if (at >= WARM_UP_EDITS) sentAt.set(value, performance.now())
      author.session.commit('Rename', [{ type: 'set', target: { kind: 'layout' }, field: 'name', value }])
      await new Promise((resolve) => setTimeout(resolve, PAUSE_MS))
    }
    await until(() => seen.length >= EDITS * readers.length, 20_000)
    for (const { session } of clients) session.close()
    const round = (value: number) => Number(value.toFixed(2))
    const common = {
      unit: 'ms' as const,
      runs: seen.length,
      min: round(Math.min(...seen)),
      max: round(Math.max(...seen)),
    }
    return [
      {
        figure: 'edit to another of 20 clients, p50',
        value: round(quantile(seen, 0.5)),
        goal: null,
        ...common,
      },
      {
        figure: 'edit to another of 20 clients, p95',
        value: round(quantile(seen, 0.95)),
        goal: 25,
        ...common,
      },
    ]
  } finally {
    await app.close()
  }
}
