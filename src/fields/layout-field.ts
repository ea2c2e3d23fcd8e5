/**
 * Ties one field to one value of the open layout: reads whether it may be edited and who else is
 * typing in it, previews and commits through the session, reports the own focus as presence.
 */
import { type KeyboardEvent, useRef } from 'react'
import { useShallow } from 'zustand/react/shallow'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import type { CommitResult } from '@/sync/layout-session'
import type { Operation, Target } from '@shared/layout/operations'

/** A target and the value its field has on screen. Several when several parts are selected. */
export interface FieldTarget {
  target: Target
  value: unknown
}

export interface FieldAddress {
  /** A name for the undo list and for notices: "Length of Pinion". */
  label: string
  targets: readonly FieldTarget[]
  field: string
  /** One entry of a value that is set whole: `yieldMPa` inside `material`, `hole` inside `fit`. */
  inside?: string
}

export interface LayoutField {
  isReadOnly: boolean
  /** Names of others typing in this field now. */
  editors: string[]
  draftKey: string
  preview: (value: unknown) => void
  /** What is wrong, or null when it was taken. */
  commit: (value: unknown) => string | null
  cancel: () => void
  setFocused: (isFocused: boolean) => void
  /** For keys while nothing is typed: undo and redo then mean the layout, not the text. */
  onIdleKeyDown: (event: KeyboardEvent) => void
}

/** `hub:A:lengthMm`, `load:run:load-1:torqueNm`: how presence names a field. */
export function presenceKey(target: Target, field: string): string {
  switch (target.kind) {
    case 'layout':
    case 'shaft':
    case 'criteria':
      return `${target.kind}:${field}`
    case 'load':
      return `load:${target.loadCaseId}:${target.id}:${field}`
    case 'timing':
      return `timing:${target.hub}:${field}`
    default:
      return `${target.kind}:${target.id}:${field}`
  }
}

/** Sets one field of each target. */
export function setOperations(
  { targets, field, inside }: Omit<FieldAddress, 'label'>,
  value: unknown,
): Operation[] {
  return targets.map(({ target, value: before }) => ({
    type: 'set',
    target,
    field,
    before: before ?? null,
    value: (inside === undefined ? value : withEntry(before, inside, value)) ?? null,
  }))
}

/** What the field shows for each target. */
export function shownValues({ targets, inside }: Pick<FieldAddress, 'targets' | 'inside'>): unknown[] {
  return targets.map(({ value }) =>
    inside === undefined
      ? value
      : typeof value === 'object' && value !== null
        ? entriesOf(value)[inside]
        : undefined,
  )
}

const entriesOf = (value: object): Record<string, unknown> => ({ ...value })

function withEntry(whole: unknown, inside: string, value: unknown): Record<string, unknown> {
  const entries = typeof whole === 'object' && whole !== null ? entriesOf(whole) : {}
  if (value === null || value === undefined) delete entries[inside]
  else entries[inside] = value
  return entries
}

/** Plain words for a commit that did not go through, null for one that did. */
export function commitProblem(result: CommitResult): string | null {
  switch (result.kind) {
    case 'pending':
    case 'noEffect':
      if (result.dropped.some(({ reason }) => reason === 'invalidValue'))
        return 'This value is not possible here'
      if (result.dropped.some(({ reason }) => reason === 'targetMissing'))
        return 'This part was removed meanwhile'
      return null
    case 'readOnly':
    case 'tooLarge':
      return result.message
  }
}

export function useLayoutField(address: FieldAddress): LayoutField {
  const { label, targets, field, inside } = address
  const session = useLayoutSession()
  const layoutId = useLayoutStore((state) => state.layoutId)
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const keys = targets.map(({ target }) =>
    presenceKey(target, inside === undefined ? field : `${field}.${inside}`),
  )
  const editors = useLayoutStore(
    useShallow((state) =>
      state.people
        .filter(
          ({ connectionId, editing }) =>
            connectionId !== state.you?.connectionId && editing !== null && keys.includes(editing),
        )
        .map(({ name }) => name),
    ),
  )
  /** What was on screen before the first preview; afterwards `targets` hold the preview itself. */
  const seen = useRef<readonly FieldTarget[] | null>(null)
  const key = keys[0] ?? field

  return {
    isReadOnly: !canEdit,
    editors,
    draftKey: `${layoutId}:${keys.join('|')}`,
    preview: (value) => {
      seen.current ??= targets
      session.setPreview(label, setOperations({ ...address, targets: seen.current }, value))
    },
    commit: (value) => {
      const operations = setOperations({ ...address, targets: seen.current ?? targets }, value)
      seen.current = null
      return commitProblem(session.commit(label, operations))
    },
    cancel: () => {
      if (seen.current === null) return
      seen.current = null
      session.clearPreview()
    },
    onIdleKeyDown: (event) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return
      const key = event.key.toLowerCase()
      if (key !== 'z' && key !== 'y') return
      event.preventDefault()
      event.stopPropagation()
      if (key === 'y' || event.shiftKey) session.redo()
      else session.undo()
    },
    setFocused: (isFocused) => session.updatePresence({ editing: isFocused && canEdit ? key : null }),
  }
}
