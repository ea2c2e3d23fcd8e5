import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { PROJECT_ROOT } from './import-rules'
import { projectFiles, sourceFiles } from './source-files'

const MAX_LINES = 400

const TOP_FOLDERS = ['migrations', 'public', 'server', 'shared', 'src', 'tests']
const TOP_FILES = [
  'DEVELOPERS.md',
  'README.md',
  'eslint.config.ts',
  'index.html',
  'package-lock.json',
  'package.json',
  'playwright.config.ts',
  'tsconfig.json',
  'vite.config.ts',
  'vitest.config.ts',
]
/** What a run leaves behind; git ignores it. */
const LEFT_BEHIND = ['data', 'dist', 'node_modules', 'playwright-report', 'test-results']

describe('the tree', () => {
  it('has only the known names at the top', () => {
    const names = readdirSync(PROJECT_ROOT).filter((name) => !name.startsWith('.'))
    expect(names.filter((name) => ![...TOP_FOLDERS, ...TOP_FILES, ...LEFT_BEHIND].includes(name))).toEqual([])
  })

  it('holds one idea a file', () => {
    const long = sourceFiles(['src', 'server', 'shared', 'migrations'])
      .map((file) => ({ path: file.path, lines: file.text.split('\n').length - 1 }))
      .filter(({ lines }) => lines > MAX_LINES)
    expect(long).toEqual([])
  })
})

describe('the text of the project', () => {
  const texts = projectFiles()
    .filter(
      (path) =>
        /\.(tsx?|css|html|md|json|yml|svg)$|^\.|\/run$/.test(path) &&
        // The bytes of a picture are not text and match words by chance.
        !path.endsWith('.png') &&
        path !== 'package-lock.json',
    )
    .map((path) => ({ path, text: readFileSync(join(PROJECT_ROOT, path), 'utf8') }))
  /** Put together from pieces so that this file does not find itself. */
  const word = (...pieces: string[]) => new RegExp(pieces.join(''), 'i')

  it.each([
    ['a package registry', word('registry\\.', '(npmjs|yarnpkg)')],
    ['a home folder', word('(^|[\\s"\'`(])/(home|Users)/', '[a-z]')],
    ['a folder of one machine', word('(^|[\\s"\'`(])/(work', '|root)/')],
    ['unfinished work', word('\\b(TO', 'DO|FIX', 'ME|XX', 'X)\\b|coming', ' soon|lor', 'em ipsum')],
    ['a skipped or focused test', word('\\b(it|test|describe)\\.', '(skip|only|to', 'do|fix', 'me)\\b')],
    ['a silenced type check', word('@ts-', '(ignore|nocheck)')],
  ])('does not name %s', (_what, pattern) => {
    const hits = texts.flatMap(({ path, text }) =>
      text.split('\n').flatMap((line, index) => (pattern.test(line) ? [`${path}:${index + 1}`] : [])),
    )
    expect(hits).toEqual([])
  })

  it('writes nothing to the console from the client or shared code', () => {
    const hits = sourceFiles(['src', 'shared']).filter((file) => /\bconsole\.\w+\(/.test(file.text))
    expect(hits.map((file) => file.path)).toEqual([])
  })
})

describe('the commands of the README', () => {
  const readme = readFileSync(join(PROJECT_ROOT, 'README.md'), 'utf8')
  const scripts = Object.keys(
    (JSON.parse(readFileSync(join(PROJECT_ROOT, 'package.json'), 'utf8')) as { scripts: object }).scripts,
  )

  it('exist in package.json', () => {
    const named = [...readme.matchAll(/(?:^|`|&& )npm (?:run )?(?:--silent )?([a-z:]+)/gm)].map(
      (match) => match[1] ?? '',
    )
    expect(named.length).toBeGreaterThan(3)
    expect(named.filter((name) => !['ci', 'install', ...scripts].includes(name))).toEqual([])
  })

  it('include the one that .ci/run calls', () => {
    const command = /^command='(.+)'$/m.exec(readFileSync(join(PROJECT_ROOT, '.ci/run'), 'utf8'))?.[1]
    expect(command).toBe('npm ci && npm test')
    expect(readme).toContain(`\n${command}\n`)
  })
})
