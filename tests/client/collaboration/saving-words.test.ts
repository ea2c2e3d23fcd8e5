import { activityWords, editingWords } from '@/features/collaboration/presence-words'
import { savingWords } from '@/features/collaboration/saving-chip'
import { peopleHere } from '@/features/collaboration/use-others'
import type { ConnectionState } from '@/stores/layout-state'
import type { PresenceState } from '@shared/protocol/realtime'
import { describe, expect, it } from 'vitest'
import { twoHubs } from '../editor/layouts'

const words = (connection: ConnectionState, pendingCount: number, more = {}) =>
  savingWords({ connection, pendingCount, isStuck: false, isStored: true, ...more }).words

describe('the saving chip', () => {
  it('says "saved" only when nothing waits and the line is up', () => {
    for (const connection of ['connecting', 'connected', 'reconnecting', 'refused'] as const) {
      for (const pending of [0, 1, 7]) {
        const isSaved = /\ball edits saved\b/.test(words(connection, pending))
        expect(isSaved).toBe(connection === 'connected' && pending === 0)
      }
    }
  })

  it('says where unsaved edits are while the line is down', () => {
    expect(words('reconnecting', 3)).toBe('no connection, 3 edits not saved, kept in this browser')
    expect(words('reconnecting', 1, { isStored: false })).toBe(
      'no connection, 1 edit not saved, only in this tab',
    )
  })

  it('does not say "saving" for ever', () => {
    expect(words('connected', 2)).toBe('saving 2 edits…')
    expect(words('connected', 2, { isStuck: true })).toBe('not saved yet: 2 edits')
  })
})

describe('what a person is doing', () => {
  it('is read from the field they are in', () => {
    expect(editingWords('hub:A:lengthMm')).toBe('editing length')
    expect(editingWords('hub:A:friction.axial')).toBe('editing friction axial')
    expect(activityWords(twoHubs(), 'hub:A:outerDiameterMm')).toBe('editing outer diameter of A')
    expect(activityWords(twoHubs(), 'load:run:run-A:torqueNm')).toBe('editing torque of load on A')
  })

  it('is nothing where the words cannot be read', () => {
    expect(editingWords(null)).toBeNull()
    expect(editingWords('')).toBeNull()
    expect(editingWords('hub:A')).toBeNull()
    expect(editingWords('spaceship:A:lengthMm')).toBeNull()
  })
})

describe('the people here', () => {
  const window = (connectionId: string, userId: string, name: string): PresenceState => ({
    connectionId,
    userId,
    name,
    role: 'designer',
    colourIndex: 1,
    cursor: null,
    selection: [],
    editing: null,
    ghost: null,
  })

  it('counts a person with two windows once, yourself first', () => {
    const here = peopleHere([window('1', 'z', 'Zoe'), window('2', 'a', 'Ada'), window('3', 'z', 'Zoe')], 'z')
    expect(here.map(({ name, windows, isYou }) => [name, windows.length, isYou])).toEqual([
      ['Zoe', 2, true],
      ['Ada', 1, false],
    ])
  })
})
