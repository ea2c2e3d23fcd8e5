/** The list of layouts and what is done to a layout from outside its document. */
import { randomUUID } from 'node:crypto'
import { blankLayout } from '@shared/layout/blank-layout'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { parseLayoutFile, serialiseLayoutFile } from '@shared/layout/layout-file'
import type { ErrorCode } from '@shared/protocol/errors'
import type {
  CreateLayoutBody,
  Example,
  LayoutSummary,
  LayoutView,
  UpdateLayoutBody,
} from '@shared/protocol/layouts'
import type { RejectReason } from '@shared/protocol/realtime'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { assertCan } from '../accounts/policy'
import { type Principal, roleIn } from '../accounts/principal'
import type { AppDatabase } from '../database/open-database'
import type { StartingExample } from '../demo/layout-data'
import { HttpError, notFound } from '../http/http-error'
import { safeFileName } from '../http/safe-file-name'
import type { LayoutRooms } from '../realtime/layout-rooms'
import { type CalculatedSummary, summarise, thumbnailOf } from './layout-summary'
import {
  findLayout,
  insertLayout,
  listLayouts,
  type StoredLayoutListing,
  updateListing,
} from './layouts.repository'

/** What is going on in open layouts. */
export type LiveLayouts = Pick<LayoutRooms, 'peopleIn' | 'submitServerEdit' | 'announceWorkspace'>

export interface LayoutsService {
  list(principal: Principal, workspaceId: string, isArchived: boolean): LayoutSummary[]
  create(principal: Principal, workspaceId: string, body: CreateLayoutBody): LayoutSummary
  view(principal: Principal, layoutId: string): LayoutView
  update(principal: Principal, layoutId: string, body: UpdateLayoutBody): Promise<LayoutSummary>
  exportFile(principal: Principal, layoutId: string): { fileName: string; content: string }
  /** For other domains that answer with a summary, after their own check. */
  summary(layoutId: string): LayoutSummary
  people(principal: Principal, layoutId: string): { userId: string; name: string }[]
  examples(): Example[]
}

/** What a route answers when the edit it made was refused. */
const CODE_OF_REJECTION: Record<RejectReason, ErrorCode> = {
  frozen: 'frozen',
  forbidden: 'forbidden',
  invalid: 'bad-request',
  tooLarge: 'payload-too-large',
  rateLimited: 'too-many-requests',
  notJoined: 'conflict',
  signedOut: 'unauthenticated',
  protocolVersion: 'bad-request',
  notFound: 'not-found',
  unavailable: 'unavailable',
}

/** A summary costs one recalculation; nobody looks at more layouts than this at a time. */
const MAX_CACHED_SUMMARIES = 2_000

export function createLayoutsService(
  database: AppDatabase,
  live: LiveLayouts,
  examples: () => StartingExample[],
): LayoutsService {
  const summaries = new Map<string, { version: string; calculated: CalculatedSummary }>()

  function calculatedOf(layout: StoredLayoutListing): CalculatedSummary {
    // The document never changes without a new revision; the epoch tells a restored backup apart.
    const version = `${layout.epoch} ${layout.revision}`
    const cached = summaries.get(layout.id)
    if (cached?.version === version) return cached.calculated
    const calculated = summarise(layout.document, recalculateLayout(layout.document))
    summaries.delete(layout.id)
    if (summaries.size >= MAX_CACHED_SUMMARIES) {
      const [oldest] = summaries.keys()
      if (oldest !== undefined) summaries.delete(oldest)
    }
    summaries.set(layout.id, { version, calculated })
    return calculated
  }

  function summaryOf(layout: StoredLayoutListing): LayoutSummary {
    const { verdict, failingCount, worstFinding, thumbnail } = calculatedOf(layout)
    return {
      id: layout.id,
      workspaceId: layout.workspaceId,
      name: layout.document.name,
      project: layout.project,
      status: layout.status,
      revisionLetter: layout.revisionLetter,
      revision: layout.revision,
      isArchived: layout.isArchived,
      verdict,
      failingCount,
      worstFinding,
      editedAt: layout.editedAt,
      editedByName: layout.editedByName,
      peopleInIt: live.peopleIn(layout.id),
      thumbnail,
    }
  }

  function stored(layoutId: string): StoredLayoutListing {
    const layout = findLayout(database, layoutId)
    if (!layout) throw notFound()
    return layout
  }

  function readable(principal: Principal, layoutId: string): StoredLayoutListing {
    const layout = stored(layoutId)
    assertCan(principal, 'layout:read', layout)
    return layout
  }

  /** An edit of the document like any other, in order with those of the people in it. */
  async function rename(actor: Principal, layout: StoredLayoutListing, name: string): Promise<void> {
    const outcome = await live.submitServerEdit({
      layoutId: layout.id,
      actor,
      label: `Rename to ${name}`.slice(0, 120),
      operations: [
        { type: 'set', target: { kind: 'layout' }, field: 'name', before: layout.document.name, value: name },
      ],
    })
    if (outcome.outcome === 'rejected')
      throw new HttpError(CODE_OF_REJECTION[outcome.reason], outcome.message)
  }

  function startingDocument(principal: Principal, workspaceId: string, body: CreateLayoutBody) {
    const { from } = body
    switch (from.kind) {
      case 'blank':
        return blankLayout(body.name ?? 'New layout')
      case 'example': {
        const example = examples().find(({ id }) => id === from.exampleId)
        if (!example) throw notFound('There is no such example.')
        return example.document
      }
      case 'layout': {
        const source = readable(principal, from.layoutId)
        // Taking a document out of its workspace is an export.
        if (source.workspaceId !== workspaceId) assertCan(principal, 'layout:export', source)
        return { ...source.document, name: `Copy of ${source.document.name}`.slice(0, 120) }
      }
      case 'file':
        return documentFromFile(from.content)
    }
  }

  return {
    list(principal, workspaceId, isArchived) {
      assertCan(principal, 'layout:read', { workspaceId })
      return listLayouts(database, workspaceId, isArchived).map(summaryOf)
    },

    create(principal, workspaceId, body) {
      assertCan(principal, 'layout:create', { workspaceId })
      const started = startingDocument(principal, workspaceId, body)
      const document = body.name ? { ...started, name: body.name } : started
      const id = randomUUID()
      database.writeTransaction((tx) => {
        insertLayout(tx, {
          id,
          workspaceId,
          project: body.project || null,
          epoch: randomUUID(),
          document,
          createdAt: new Date().toISOString(),
          createdBy: principal.userId,
        })
      })
      live.announceWorkspace(workspaceId, 'layouts')
      return summaryOf(stored(id))
    },

    view(principal, layoutId) {
      const layout = readable(principal, layoutId)
      const { thumbnail: _thumbnail, peopleInIt: _peopleInIt, ...summary } = summaryOf(layout)
      const role = roleIn(principal, layout.workspaceId)
      if (!role) throw notFound()
      return { ...summary, role, workspaceName: layout.workspaceName, document: layout.document }
    },

    async update(principal, layoutId, { name, project, isArchived }) {
      const layout = readable(principal, layoutId)
      if (project !== undefined || isArchived !== undefined) assertCan(principal, 'layout:organise', layout)
      if (name !== undefined && name !== layout.document.name) {
        assertCan(principal, 'layout:edit', layout)
        await rename(principal, layout, name)
      }
      database.writeTransaction((tx) => {
        updateListing(tx, layoutId, { project: project === '' ? null : project, isArchived })
      })
      live.announceWorkspace(layout.workspaceId, 'layouts')
      return summaryOf(stored(layoutId))
    },

    exportFile(principal, layoutId) {
      const layout = readable(principal, layoutId)
      assertCan(principal, 'layout:export', layout)
      return {
        fileName: `${safeFileName(layout.document.name)}.layout.json`,
        content: serialiseLayoutFile(layout.document),
      }
    },

    summary: (layoutId) => summaryOf(stored(layoutId)),

    people: (principal, layoutId) => live.peopleIn(readable(principal, layoutId).id),

    examples: () =>
      examples().map(({ id, name, story, document }) => ({
        id,
        name,
        story,
        thumbnail: thumbnailOf(document, recalculateLayout(document)),
      })),
  }
}

export function documentFromFile(content: unknown): LayoutDocument {
  const parsed = parseLayoutFile(content)
  if (parsed.ok) return parsed.document
  const fields: Record<string, string> = {}
  for (const { path, message } of parsed.problems) fields[path] ??= message
  throw new HttpError('bad-request', 'This layout file is not usable.', fields)
}
