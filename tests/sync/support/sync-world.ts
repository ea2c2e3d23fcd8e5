/** A room, its storage and several people with browsers, in one process and without real time. */
import type { Principal } from '@server/accounts/principal'
import type { EditStorage, StoredLayout } from '@server/edits/edit-storage'
import { createLayoutRooms, type LayoutRooms } from '@server/realtime/layout-rooms'
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import type { Role } from '@shared/protocol/roles'
import type { LayoutState } from '@/stores/layout-state'
import { createLayoutStore, type LayoutStore } from '@/stores/layout-store'
import { LayoutSync } from '@/sync/layout-sync'
import { createMemoryOutbox } from '@/sync/memory-outbox'
import type { Outbox } from '@/sync/outbox'
import { ManualClock } from './manual-clock'
import { type BrowserLine, MemoryLines } from './memory-line'
import { MemoryEditStorage, type MemoryEditTransaction } from './memory-edit-storage'
import { sampleLayout } from './sample-layout'

export const WORKSPACE = 'workspace-1'
export const LAYOUT = 'layout-1'

export function storedSample(document: LayoutDocument = sampleLayout()): StoredLayout {
  return {
    layoutId: LAYOUT,
    workspaceId: WORKSPACE,
    document,
    revision: 0,
    epoch: 'epoch-1',
    status: 'draft',
    revisionLetter: 'A',
  }
}

export function principalOf(name: string, role: Role | null, workspaceId = WORKSPACE): Principal {
  const userId = `user-${name.toLowerCase()}`
  return {
    userId,
    name,
    email: `${name.toLowerCase()}@cedar-line.example`,
    sessionId: `session-${name}`,
    roles: new Map(role === null ? [] : [[workspaceId, role]]),
  }
}

/** Lets promises that are settled run their continuations. */
export const settle = () => new Promise<void>((resolve) => setImmediate(resolve))

export class Browser {
  readonly line: BrowserLine
  readonly outbox: Outbox
  store: LayoutStore
  session: LayoutSync
  hasEnded = false

  constructor(
    private readonly world: Pick<SyncWorld, 'lines' | 'clock'>,
    public principal: Principal,
    { outbox = createMemoryOutbox() }: { outbox?: Outbox } = {},
  ) {
    this.outbox = outbox
    this.line = world.lines.forBrowser(() => this.principal)
    this.store = createLayoutStore()
    this.session = this.#newSession()
  }

  get state(): LayoutState {
    return this.store.getState()
  }

  get visible(): LayoutDocument {
    const { visible } = this.state
    if (!visible) throw new Error(`${this.principal.name} sees no layout yet`)
    return visible
  }

  /** A new tab after a crash or a reload; only the outbox is left of the old one. */
  async reopenTab(): Promise<void> {
    this.line.crash()
    this.store = createLayoutStore()
    this.session = this.#newSession()
    await this.session.start()
  }

  set(hub: string, field: string, value: unknown, label = `Set ${field}`) {
    return this.session.commit(label, [{ type: 'set', target: { kind: 'hub', id: hub }, field, value }])
  }

  commit(...operations: Operation[]) {
    return this.session.commit('Edit', operations)
  }

  hub(id: string) {
    const hub = this.visible.hubs.find((each) => each.id === id)
    if (!hub) throw new Error(`No hub ${id}`)
    return hub
  }

  #newSession(): LayoutSync {
    return new LayoutSync({
      layoutId: LAYOUT,
      store: this.store,
      openConnection: this.line.openConnection,
      outbox: this.outbox,
      clock: this.world.clock.forClients,
      onEnd: () => {
        this.hasEnded = true
      },
    })
  }
}

export class SyncWorld<Storage extends EditStorage = MemoryEditStorage> {
  readonly clock = new ManualClock()
  readonly rooms: LayoutRooms
  readonly lines: MemoryLines
  readonly browsers: Browser[] = []
  readonly errors: unknown[] = []

  constructor(readonly storage: Storage) {
    this.rooms = createLayoutRooms({
      storage,
      clock: this.clock.forRooms,
      logger: { error: (details: unknown) => this.errors.push(details) },
    })
    this.lines = new MemoryLines(this.rooms)
  }

  async open(name: string, role: Role = 'designer', options?: { outbox?: Outbox }): Promise<Browser> {
    const browser = new Browser(this, principalOf(name, role), options)
    this.browsers.push(browser)
    await browser.session.start()
    await this.flush()
    return browser
  }

  /** Delivers everything in both directions until nothing moves any more. */
  async flush(): Promise<void> {
    for (let round = 0; round < 200; round += 1) {
      await settle()
      for (const browser of this.browsers) browser.line.flushToServer()
      this.clock.runDeferred()
      for (const browser of this.browsers) browser.line.flushToClient()
      await settle()
      const isQuiet = this.browsers.every(({ line }) => line.queued.toServer + line.queued.toClient === 0)
      if (isQuiet) return
    }
    throw new Error('The line does not come to rest')
  }

  get layout(): StoredLayout {
    const layout = this.storage.readLayout(LAYOUT)
    if (!layout) throw new Error('No layout')
    return layout
  }

  changeRole(browser: Browser, role: Role | null): void {
    browser.principal = principalOf(browser.principal.name, role)
    const { connectionId } = browser.line
    if (connectionId) this.rooms.changePrincipal(connectionId, browser.principal)
  }
}

export function memoryWorld(document?: LayoutDocument): SyncWorld {
  const storage = new MemoryEditStorage()
  storage.addLayout(storedSample(document))
  return new SyncWorld(storage)
}

/** A change of status as the release service would make it, without a release. */
export async function changeStatus(
  world: SyncWorld,
  kind: 'freeze' | 'nextRevision',
  options: { expectedRevision?: number; fails?: boolean } = {},
): Promise<void> {
  const rooms = world.rooms as LayoutRooms<MemoryEditTransaction>
  const done = rooms.changeStatus({
    layoutId: LAYOUT,
    kind,
    label: kind,
    actor: principalOf('Mira', 'manager'),
    expectedRevision: options.expectedRevision,
    apply: ({ transaction, layout }) => {
      const letter = kind === 'freeze' ? layout.revisionLetter : 'B'
      transaction.setStatus(LAYOUT, {
        status: kind === 'freeze' ? 'released' : 'draft',
        revisionLetter: letter,
      })
      if (options.fails) throw new Error('refused by the release service')
    },
  })
  const settled = done.then(
    () => null,
    (error: unknown) => error,
  )
  world.clock.runDeferred()
  const error = await settled
  if (error instanceof Error) throw error
}
