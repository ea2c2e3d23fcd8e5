import { describe, expect, it } from 'vitest'
import { exportedNames, sourceFiles } from './source-files'

const names = sourceFiles(['src', 'server', 'shared']).flatMap(exportedNames)

/**
 * Words with two meanings in this project. An exported name must say which one it means:
 * `shaftSection`, `interferenceFit`, `loadCase`, `parallelKey`, `zoomToFit`.
 */
const NEVER_BARE = [
  'component',
  'element',
  'node',
  'section',
  'key',
  'fit',
  'layer',
  'stage',
  'scale',
  'frame',
  'state',
  'release',
]
/** A `Load` on the shaft is a term of the trade; a function called `load` could mean anything. */
const NEVER_BARE_FUNCTION = ['load', 'bearing']
/** One quantity, one name. */
const OTHER_SPELLINGS = /contactPressure|pressPressure|jointPressure|oversize|safetyFactor|utilization/i

describe('exported names', () => {
  it('use no word with two meanings bare', () => {
    const bare = names.filter(
      ({ name, kind }) =>
        NEVER_BARE.includes(name.toLowerCase()) ||
        (kind === 'function' && NEVER_BARE_FUNCTION.includes(name.toLowerCase())),
    )
    expect(bare).toEqual([])
  })

  it('use the spelling of the glossary', () => {
    expect(names.filter(({ name }) => OTHER_SPELLINGS.test(name))).toEqual([])
  })

  it('are PascalCase for types', () => {
    expect(names.filter(({ name, kind }) => kind === 'type' && !/^[A-Z][A-Za-z0-9]*$/.test(name))).toEqual([])
  })

  it('are found at all', () => {
    expect(names).toContainEqual(
      expect.objectContaining({
        name: 'LayoutDocument',
        kind: 'type',
        path: 'shared/layout/layout-document.ts',
      }),
    )
    expect(names.length).toBeGreaterThan(100)
  })
})
