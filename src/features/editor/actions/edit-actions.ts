/** Undo, redo, and everything done to selected parts. */
import { bearingSchema, hubSchema } from '@shared/layout/layout-document'
import { newPartId } from '@shared/layout/new-ids'
import { z } from 'zod'
import { showToast } from '@/components/toast-store'
import { useSelectionStore } from '@/stores/selection-store'
import { commitEdit } from '../commit-edit'
import {
  type CopiedParts,
  copyParts,
  duplicateOperations,
  flipSideOperations,
  partsLabel,
  pasteOperations,
  removePartsOperations,
} from '../tools/part-edits'
import { movableIds } from '../tools/move-parts'
import { useViewStore } from '../view-store'
import type { ActionContext, EditorAction } from './action'

/** In the browser's storage, so that parts can be pasted into another layout in another tab. */
const COPIED_PARTS_KEY = 'hubstead.copied-parts'
const copiedSchema = z.strictObject({ hubs: z.array(hubSchema), bearings: z.array(bearingSchema) })

function readCopied(): CopiedParts | null {
  try {
    const parsed = copiedSchema.safeParse(JSON.parse(localStorage.getItem(COPIED_PARTS_KEY) ?? 'null'))
    return parsed.success ? parsed.data : null
  } catch {
    return null
  }
}

const hasEditableSelection = ({ canEdit, selectedIds }: ActionContext) => canEdit && selectedIds.length > 0

function copy({ document, selectedIds }: ActionContext): boolean {
  const parts = copyParts(document, selectedIds)
  if (parts.hubs.length + parts.bearings.length === 0) return false
  try {
    localStorage.setItem(COPIED_PARTS_KEY, JSON.stringify(parts))
    return true
  } catch {
    showToast('The browser keeps nothing for this page, so parts cannot be copied.', 'bad')
    return false
  }
}

function remove({ session, document, selectedIds }: ActionContext): void {
  const label = `Delete ${partsLabel(document, selectedIds)}`
  if (commitEdit(session, label, removePartsOperations(document, selectedIds))) {
    useSelectionStore.getState().clear()
  }
}

export const EDIT_ACTIONS: readonly EditorAction[] = [
  {
    id: 'undo',
    label: 'Undo',
    group: 'Edit',
    chords: [{ key: 'z', control: true }],
    isAvailable: ({ canEdit, canUndo }) => canEdit && canUndo,
    perform: ({ session }) => void session.undo(),
  },
  {
    id: 'redo',
    label: 'Redo',
    group: 'Edit',
    chords: [
      { key: 'z', control: true, shift: true },
      { key: 'y', control: true },
    ],
    isAvailable: ({ canEdit, canRedo }) => canEdit && canRedo,
    perform: ({ session }) => void session.redo(),
  },
  {
    id: 'select-all',
    label: 'Select all hubs and bearings',
    group: 'Edit',
    chords: [{ key: 'a', control: true }],
    isAvailable: () => true,
    perform: ({ document }) =>
      useSelectionStore
        .getState()
        .select([...document.hubs.map(({ id }) => id), ...document.bearings.map(({ id }) => id)]),
  },
  {
    id: 'copy',
    label: 'Copy',
    group: 'Edit',
    chords: [{ key: 'c', control: true }],
    isAvailable: ({ document, selectedIds }) => movableIds(document, selectedIds).length > 0,
    perform: (context) => void copy(context),
  },
  {
    id: 'cut',
    label: 'Cut',
    group: 'Edit',
    chords: [{ key: 'x', control: true }],
    isAvailable: ({ canEdit, document, selectedIds }) =>
      canEdit && movableIds(document, selectedIds).length > 0,
    perform: (context) => {
      if (copy(context)) remove(context)
    },
  },
  {
    id: 'paste',
    label: 'Paste',
    group: 'Edit',
    chords: [{ key: 'v', control: true }],
    isAvailable: ({ canEdit }) => canEdit && readCopied() !== null,
    perform: ({ session, document }) => {
      const copied = readCopied()
      if (!copied) return
      const { hoverStationMm } = useViewStore.getState()
      const leftMm = hoverStationMm === null ? null : Math.round(hoverStationMm)
      const { operations, ids } = pasteOperations(document, copied, leftMm, newPartId)
      if (commitEdit(session, `Paste ${ids.length === 1 ? '1 part' : `${ids.length} parts`}`, operations)) {
        useSelectionStore.getState().select(ids)
      }
    },
  },
  {
    id: 'duplicate',
    label: 'Duplicate',
    group: 'Parts',
    chords: [{ key: 'd', control: true }],
    isAvailable: hasEditableSelection,
    perform: ({ session, document, selectedIds }) => {
      const { operations, ids } = duplicateOperations(document, selectedIds, newPartId)
      if (commitEdit(session, `Duplicate ${partsLabel(document, selectedIds)}`, operations)) {
        useSelectionStore.getState().select(ids)
      }
    },
  },
  {
    id: 'flip-side',
    label: 'Flip joining side',
    group: 'Parts',
    chords: [{ key: 'f' }],
    isAvailable: ({ canEdit, document, selectedIds }) =>
      canEdit && flipSideOperations(document, selectedIds).length > 0,
    perform: ({ session, document, selectedIds }) => {
      const label = `Flip joining side of ${partsLabel(document, selectedIds)}`
      commitEdit(session, label, flipSideOperations(document, selectedIds))
    },
  },
  {
    id: 'delete',
    label: 'Delete',
    group: 'Parts',
    chords: [{ key: 'delete' }, { key: 'backspace' }],
    isAvailable: hasEditableSelection,
    perform: remove,
  },
]
