/**
 * Two to five people, one layout, a bad network. Every run is repeatable: a failure prints its seed
 * and what was done. FUZZ_SEED runs one seed, FUZZ_ROUNDS another number of rounds.
 */
import { describe, expect, it } from 'vitest'
import type { LayoutRooms } from '@server/realtime/layout-rooms'
import type { EditStorage } from '@server/edits/edit-storage'
import type { SqliteEditTransaction } from '@server/edits/edits.repository'
import { canonicalJson } from '@shared/layout/canonical-json'
import { checkReferences } from '@shared/layout/check-references'
import { layoutDocumentSchema } from '@shared/layout/layout-document'
import { rebase } from '@shared/layout/rebase'
import type { Role } from '@shared/protocol/roles'
import { savingState } from '@/stores/saving-state'
import { seededRandom, type Random } from './support/random'
import { randomOperations } from './support/random-operations'
import { setStatusInSqlite, sqliteFixture } from './support/sqlite-edit-storage'
import {
  changeStatus,
  LAYOUT,
  memoryWorld,
  principalOf,
  settle,
  storedSample,
  SyncWorld,
  type Browser,
} from './support/sync-world'

const ROUNDS = Number(process.env['FUZZ_ROUNDS'] ?? 200)
const SQLITE_ROUNDS = 12
const STEPS = 60
const NAMES = ['Dina', 'Tomas', 'Mira', 'Sam', 'Ada']

type ChangeStatus = (kind: 'freeze' | 'nextRevision') => Promise<void>

class FuzzRun {
  readonly steps: string[] = []
  /** Every edit anybody committed, and by whom. */
  readonly committed = new Map<string, string>()
  readonly lies: string[] = []
  #isFrozen = false

  constructor(
    readonly world: SyncWorld<EditStorage>,
    private readonly changeStatus: ChangeStatus,
    private readonly random: Random,
    /** Makes the next writes fail, where the storage can be told to. */
    private readonly breakStorage: ((count: number) => void) | null = null,
  ) {}

  async run(): Promise<void> {
    const { random, world } = this
    const people = NAMES.slice(0, 2 + random.integer(4))
    for (const name of people) this.#watch(await world.open(name))
    for (let at = 0; at < STEPS; at += 1) await this.#step()
    await this.#comeToRest()
  }

  async #step(): Promise<void> {
    const { random, world } = this
    const browser = random.pick(world.browsers)
    if (!browser) return
    const { line } = browser
    const note = (what: string) => this.steps.push(`${browser.principal.name}: ${what}`)
    const die = random.integer(100)
    if (die < 38) this.#commit(browser)
    else if (die < 45) {
      const side = random.chance(0.7) ? 'undo' : 'redo'
      const result = browser.session[side]()
      note(`${side} ${result.kind}`)
      this.#noteNew(browser)
    } else if (die < 60) {
      const count = 1 + random.integer(3)
      note(`to server ${count}`)
      line.flushToServer(count)
    } else if (die < 72) {
      const count = 1 + random.integer(4)
      note(`to client ${count}`)
      line.flushToClient(count)
    } else if (die < 78) {
      this.steps.push('end of turn')
      world.clock.runDeferred()
    } else if (die < 82) {
      const isCloseLate = random.chance(0.3)
      note(`disconnect${isCloseLate ? ', told late' : ''}`)
      line.disconnect({ isCloseLate })
    } else if (die < 88) {
      note('reconnect')
      line.reconnect()
      if (random.chance(0.5)) line.serverNotices()
      if (random.chance(0.5)) line.deliverLateCloses()
    } else if (die < 91) {
      note('last edit delivered twice')
      line.repeatLastSubmit()
    } else if (die < 93) {
      note('tab closed and opened again')
      const refused = browser.state.refusedEdits.length
      await settle()
      await browser.reopenTab()
      this.#watch(browser)
      if (random.chance(0.5)) line.serverNotices()
      note(`had ${refused} refused`)
    } else if (die < 95) {
      const role: Role = random.chance(0.6) ? 'designer' : 'viewer'
      note(`becomes ${role}`)
      world.changeRole(browser, role)
    } else if (die < 97) {
      const kind = this.#isFrozen ? 'nextRevision' : 'freeze'
      const isDone = await this.changeStatus(kind).then(
        () => true,
        () => false,
      )
      this.steps.push(`${kind}${isDone ? '' : ' failed'}`)
      if (isDone) this.#isFrozen = !this.#isFrozen
    } else if (die < 98) {
      const count = 1 + random.integer(4)
      this.steps.push(`the next ${count} writes fail`)
      this.breakStorage?.(count)
    } else if (random.chance(0.5)) {
      world.lines.tooFastCount = 1 + random.integer(3)
      this.steps.push(`the next ${world.lines.tooFastCount} edits are too fast`)
    } else {
      this.steps.push('time passes')
      world.clock.advance(random.integer(3_000))
    }
    await settle()
  }

  #commit(browser: Browser): void {
    const document = browser.state.visible
    if (!document) return
    const operations = randomOperations(document, this.random)
    if (this.random.chance(0.15)) browser.session.setPreview('Drag', randomOperations(document, this.random))
    const result = browser.session.commit('Edit', operations)
    this.steps.push(`${browser.principal.name}: ${result.kind} ${JSON.stringify(operations)}`)
    this.#noteNew(browser)
  }

  #noteNew(browser: Browser): void {
    for (const { editId } of browser.state.pending) {
      if (!this.committed.has(editId)) this.committed.set(editId, browser.principal.userId)
    }
  }

  /** What must be true at every moment, not only in the end. */
  #watch(browser: Browser): void {
    browser.store.subscribe((state) => {
      const isLying = savingState(state) === 'saved' && state.pending.length > 0
      if (isLying) this.lies.push('said saved while something waits')
      const expected = state.confirmed && rebase(state.confirmed, state.pending)
      if (state.preview === null && canonicalJson(state.visible) !== canonicalJson(expected)) {
        this.lies.push('visible is not confirmed plus pending')
      }
    })
  }

  async #comeToRest(): Promise<void> {
    const { world } = this
    this.breakStorage?.(0)
    if (this.#isFrozen) await this.changeStatus('nextRevision')
    for (const browser of world.browsers) {
      world.changeRole(browser, 'designer')
      browser.line.serverNotices()
      browser.line.deliverLateCloses()
      browser.line.reconnect()
      browser.session.clearPreview()
    }
    for (let wait = 0; wait < 10; wait += 1) {
      await world.flush()
      world.clock.advance(20_000)
      for (const browser of world.browsers) browser.line.reconnect()
    }
    await world.flush()
  }

  async check(): Promise<void> {
    const { world } = this
    const { storage } = world
    const { document, revision } = world.layout
    const text = canonicalJson(document)
    expect(this.lies).toEqual([])
    if (!this.breakStorage) expect(world.errors).toEqual([])

    for (const { state, principal } of world.browsers) {
      expect([principal.name, state.connection, state.pending.length]).toEqual([
        principal.name,
        'connected',
        0,
      ])
      expect([principal.name, state.revision]).toEqual([principal.name, revision])
      expect(canonicalJson(state.confirmed)).toBe(text)
      expect(canonicalJson(state.visible)).toBe(text)
    }

    const base = storage.readBase(LAYOUT)
    const entries = storage.readEntries(LAYOUT, base?.revision ?? 0)
    expect(canonicalJson(rebase(base?.document ?? document, entries))).toBe(text)
    expect(entries.map((entry) => entry.revision)).toEqual(entries.map((_, at) => at + 1))
    expect(layoutDocumentSchema.safeParse(document).error).toBeUndefined()
    expect(checkReferences(document)).toEqual([])

    await this.#checkSnapshotAndTail(text)
    await this.#checkFates(entries)
  }

  /** Somebody who joins somewhere in the middle and catches up sees the same. */
  async #checkSnapshotAndTail(text: string): Promise<void> {
    const observer = await this.world.open('Vera', 'viewer')
    expect(canonicalJson(observer.visible)).toBe(text)
    const base = this.world.storage.readBase(LAYOUT)
    const entries = this.world.storage.readEntries(LAYOUT, 0)
    if (!base) return
    const half = Math.floor(entries.length / 2)
    const snapshot = rebase(base.document, entries.slice(0, half))
    expect(canonicalJson(rebase(snapshot, this.world.storage.readEntries(LAYOUT, half)))).toBe(text)
  }

  /** Every edit that was kept has exactly one fate, and each client's edits stand in its order. */
  async #checkFates(
    entries: { editId: string; clientId: string; clientSeq: number; userId: string }[],
  ): Promise<void> {
    const inLog = entries.map(({ editId }) => editId)
    expect(new Set(inLog).size).toBe(inLog.length)
    for (const clientId of new Set(entries.map((entry) => entry.clientId))) {
      const numbers = entries.filter((entry) => entry.clientId === clientId).map(({ clientSeq }) => clientSeq)
      expect(numbers).toEqual([...numbers].sort((left, right) => left - right))
    }
    for (const { outbox, principal } of this.world.browsers) {
      const left = await outbox.load(LAYOUT)
      expect([principal.name, left.filter(({ state }) => state === 'pending')]).toEqual([principal.name, []])
    }
    const refused = new Set(
      this.world.browsers.flatMap(({ state }) => state.refusedEdits.map(({ editId }) => editId)),
    )
    const logged = new Set(inLog)
    this.world.storage.transaction((transaction) => {
      for (const [editId, userId] of this.committed) {
        const receipt = transaction.findReceipt(LAYOUT, { editId, userId, clientId: '', clientSeq: 0 })
        const fate = receipt?.outcome.outcome ?? (refused.has(editId) ? 'rejected' : 'lost')
        expect([editId, fate]).not.toEqual([editId, 'lost'])
        expect([editId, logged.has(editId)]).toEqual([editId, fate === 'accepted' || fate === 'adjusted'])
        expect([editId, refused.has(editId)]).toEqual([editId, fate === 'rejected'])
        if (receipt) expect(receipt.userId).toBe(userId)
      }
    })
  }
}

async function runSeed(
  seed: number,
  world: SyncWorld<EditStorage>,
  change: ChangeStatus,
  breakStorage: ((count: number) => void) | null = null,
): Promise<void> {
  const run = new FuzzRun(world, change, seededRandom(seed), breakStorage)
  try {
    await run.run()
    await run.check()
  } catch (error) {
    throw new Error(`Seed ${seed}. What was done:\n${run.steps.join('\n')}`, { cause: error })
  }
}

const givenSeed = process.env['FUZZ_SEED']
const seeds =
  givenSeed === undefined ? Array.from({ length: ROUNDS }, (_, at) => at + 1) : [Number(givenSeed)]
const chunks = Array.from({ length: Math.ceil(seeds.length / 25) }, (_, at) =>
  seeds.slice(at * 25, at * 25 + 25),
)

describe('many people on a bad network', () => {
  it.each(chunks.map((chunk) => [chunk[0], chunk.at(-1), chunk] as const))(
    'C3 end with the same layout everywhere, seeds %i to %i',
    async (_from, _to, chunk) => {
      for (const seed of chunk) {
        const world = memoryWorld()
        const { failures } = world.storage
        const breakStorage = (count: number) => {
          failures.splice(0)
          for (let at = 0; at < count; at += 1) failures.push('append')
        }
        await runSeed(seed, world, (kind) => changeStatus(world, kind), breakStorage)
      }
    },
    120_000,
  )

  it('S5 end the same on SQLite', async () => {
    for (let seed = 1; seed <= SQLITE_ROUNDS; seed += 1) {
      const memory = memoryWorld()
      await runSeed(seed, memory, (kind) => changeStatus(memory, kind))
      const fixture = await sqliteFixture(storedSample(), [...NAMES, 'Vera'])
      try {
        const world = new SyncWorld(fixture.storage)
        const rooms = world.rooms as LayoutRooms<SqliteEditTransaction>
        await runSeed(seed, world, async (kind) => {
          const done = rooms.changeStatus({
            layoutId: LAYOUT,
            kind,
            label: kind,
            actor: principalOf('Mira', 'manager'),
            apply: ({ transaction, layout }) =>
              setStatusInSqlite(transaction, LAYOUT, {
                status: kind === 'freeze' ? 'released' : 'draft',
                revisionLetter: kind === 'freeze' ? layout.revisionLetter : 'B',
              }),
          })
          world.clock.runDeferred()
          await done
        })
        expect(canonicalJson(world.layout.document)).toBe(canonicalJson(memory.layout.document))
      } finally {
        fixture.close()
      }
    }
  }, 120_000)

  it('prints nothing that depends on the clock: a seed gives the same run twice', async () => {
    const runs = await Promise.all(
      [1, 2].map(async () => {
        const world = memoryWorld()
        const run = new FuzzRun(world, (kind) => changeStatus(world, kind), seededRandom(7))
        await run.run()
        return run.steps
      }),
    )
    expect(runs[0]).toEqual(runs[1])
  })
})
