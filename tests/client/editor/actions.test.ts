import { type ActionContext, chordText, matchesChord } from '@/features/editor/actions/action'
import { actionById, ALL_ACTIONS } from '@/features/editor/actions/all-actions'
import { useSelectionStore } from '@/stores/selection-store'
import { useLayoutStore } from '@/stores/layout-store'
import { beforeEach, describe, expect, it } from 'vitest'
import { type FakeSession, openFakeLayout } from './fake-session'
import { twoHubs } from './layouts'

const press = (key: string, more: Partial<KeyboardEvent> = {}) => ({
  key,
  ctrlKey: false,
  metaKey: false,
  shiftKey: false,
  altKey: false,
  ...more,
})

function contextOf(session: FakeSession, more: Partial<ActionContext> = {}): ActionContext {
  return {
    session,
    driver: {
      takeUp: () => undefined,
      pointer: () => undefined,
      leave: () => undefined,
      cancel: () => false,
      modifiers: () => undefined,
      holdPan: () => undefined,
      dispose: () => undefined,
    },
    document: useLayoutStore.getState().visible!,
    selectedIds: useSelectionStore.getState().selectedIds,
    canEdit: true,
    canUndo: false,
    canRedo: false,
    toolId: 'select',
    showHelp: () => undefined,
    ...more,
  }
}

beforeEach(() => useSelectionStore.getState().clear())

describe('the list of actions', () => {
  it('has one id and one key chord for one thing', () => {
    const ids = ALL_ACTIONS.map(({ id }) => id)
    const chords = ALL_ACTIONS.flatMap((action) => action.chords.map(chordText))
    expect(new Set(ids).size).toBe(ids.length)
    expect(new Set(chords).size).toBe(chords.length)
  })

  it('offers a person who only reads nothing that edits', () => {
    const session = openFakeLayout(twoHubs(), false)
    const context = contextOf(session, { canEdit: false, selectedIds: ['A'], canUndo: true, canRedo: true })
    for (const action of ALL_ACTIONS) if (action.isAvailable(context)) action.perform(context)
    expect(session.committed).toEqual([])
  })
})

describe('key chords', () => {
  it('read redo in both spellings and on both kinds of keyboards', () => {
    const [first, second] = actionById('redo').chords
    expect(matchesChord(press('Z', { ctrlKey: true, shiftKey: true }), first!)).toBe(true)
    expect(matchesChord(press('Z', { metaKey: true, shiftKey: true }), first!)).toBe(true)
    expect(matchesChord(press('y', { ctrlKey: true }), second!)).toBe(true)
    expect(matchesChord(press('z', { ctrlKey: true }), first!)).toBe(false)
  })

  it('take a sign with or without Shift, because keyboards differ', () => {
    const [plus] = actionById('zoom-in').chords
    expect(matchesChord(press('+'), plus!)).toBe(true)
    expect(matchesChord(press('+', { shiftKey: true }), plus!)).toBe(true)
    expect(matchesChord(press('+', { ctrlKey: true }), plus!)).toBe(false)
  })

  it('are written as people know them', () => {
    expect(chordText({ key: 'z', control: true, shift: true })).toBe('Ctrl+Shift+Z')
    expect(chordText({ key: 'delete' })).toBe('Del')
  })
})

describe('delete and duplicate', () => {
  it('delete in one edit and select nothing afterwards', () => {
    const session = openFakeLayout(twoHubs())
    useSelectionStore.getState().select(['A', 'L'])
    actionById('delete').perform(contextOf(session))
    expect(session.committed).toEqual(['Delete 2 parts'])
    expect(useSelectionStore.getState().selectedIds).toEqual([])
    expect(useLayoutStore.getState().visible?.hubs.map(({ id }) => id)).toEqual(['B'])
  })

  it('duplicate selects the copy', () => {
    const session = openFakeLayout(twoHubs())
    useSelectionStore.getState().select(['A'])
    actionById('duplicate').perform(contextOf(session))
    const copy = useLayoutStore.getState().visible?.hubs.at(-1)
    expect(copy?.name).toBe('A 2')
    expect(useSelectionStore.getState().selectedIds).toEqual([copy?.id])
  })

  it('are not offered without a selection', () => {
    const context = contextOf(openFakeLayout(twoHubs()))
    expect(actionById('delete').isAvailable(context)).toBe(false)
    expect(actionById('duplicate').isAvailable(context)).toBe(false)
  })

  it('select all takes hubs and bearings, not the shaft', () => {
    actionById('select-all').perform(contextOf(openFakeLayout(twoHubs())))
    expect(useSelectionStore.getState().selectedIds).toEqual(['A', 'B', 'L', 'R'])
  })
})
