/**
 * Who may import whom. This table is the only statement of the rule: the lint rule `local/import-zones`
 * and the architecture test both read it, and the zones of features are made from the folders, so a new
 * feature is covered the day it appears. Type-only imports obey it too.
 *
 * Patterns: `*` is any run of characters without `/`, `**` is anything. Paths have no extension.
 */
import { readdirSync } from 'node:fs'
import { builtinModules } from 'node:module'
import { dirname, join, posix } from 'node:path'
import { fileURLToPath } from 'node:url'

export const PROJECT_ROOT = fileURLToPath(new URL('../..', import.meta.url))

export interface Zone {
  name: string
  files: string[]
  mayImport: string[]
  /** Wins over `mayImport`. */
  never?: string[]
  /** npm packages by name; `*` allows every package that is not in `neverPackages`. */
  packages: string[]
  neverPackages?: string[]
  mayUseNode: boolean
  why: string
}

const ALIASES: Record<string, string> = { '@/': 'src/', '@shared/': 'shared/', '@server/': 'server/' }
const NODE_MODULES = new Set(builtinModules)
const CANVAS_PACKAGES = ['konva', 'react-konva']
const REACT_PACKAGES = ['react', 'react-dom']
const SQL_PACKAGES = ['kysely', 'better-sqlite3']

function foldersIn(path: string): string[] {
  return readdirSync(join(PROJECT_ROOT, path), { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => entry.name)
}

const SHARED_ZONES: Zone[] = [
  {
    name: 'shared/engineering',
    files: ['shared/engineering/**'],
    mayImport: ['shared/engineering/**'],
    packages: [],
    mayUseNode: false,
    why: 'the calculation core is pure and depends on nothing',
  },
  {
    name: 'shared/layout',
    files: ['shared/layout/**'],
    mayImport: ['shared/layout/**'],
    packages: ['zod'],
    mayUseNode: false,
    why: 'the document model knows neither formulas nor where it runs',
  },
  {
    name: 'shared/protocol',
    files: ['shared/protocol/**'],
    mayImport: ['shared/protocol/**', 'shared/layout/**'],
    packages: ['zod'],
    mayUseNode: false,
    why: 'the protocol is messages only',
  },
  {
    name: 'shared/recalculation',
    files: ['shared/recalculation/**'],
    mayImport: ['shared/recalculation/**', 'shared/layout/**', 'shared/engineering/**'],
    packages: [],
    mayUseNode: false,
    why: 'recalculation joins the document to the core and runs in browser, worker and server alike',
  },
  {
    name: 'shared/validation',
    files: ['shared/validation/**'],
    mayImport: ['shared/validation/**', 'shared/engineering/**'],
    packages: [],
    mayUseNode: false,
    why: 'checks against published values run in the browser, on the command line and in the tests alike',
  },
  {
    name: 'shared/drawing',
    files: ['shared/drawing/**'],
    mayImport: ['shared/drawing/**', 'shared/layout/**', 'shared/recalculation/**'],
    packages: [],
    mayUseNode: false,
    why: 'drawing geometry serves screen and sheet and knows neither',
  },
  {
    name: 'shared/comparison',
    files: ['shared/comparison/**'],
    mayImport: ['shared/comparison/**', 'shared/layout/**', 'shared/recalculation/**'],
    packages: [],
    mayUseNode: false,
    why: 'comparing two documents needs the document model only',
  },
]

const CLIENT_ZONES: Zone[] = [
  {
    name: 'src/config',
    files: ['src/config/**'],
    mayImport: ['src/config/**'],
    packages: ['zod'],
    mayUseNode: false,
    why: 'addresses and environment come before everything else',
  },
  {
    name: 'src/lib',
    files: ['src/lib/**'],
    // The session's interface only: the context that hands an open layout down lives here.
    mayImport: [
      'src/lib/**',
      'src/config/**',
      'src/stores/preferences-store',
      'src/sync/layout-session',
      'shared/**',
    ],
    packages: ['*'],
    neverPackages: [...CANVAS_PACKAGES, 'socket.io-client'],
    mayUseNode: false,
    why: 'configured libraries know neither components nor features',
  },
  {
    name: 'src/components',
    files: ['src/components/**'],
    mayImport: ['src/components/**', 'src/lib/**', 'src/config/**', 'src/stores/preferences-store'],
    packages: ['*'],
    neverPackages: [...CANVAS_PACKAGES, 'socket.io-client'],
    mayUseNode: false,
    why: 'the UI kit does not know the domain',
  },
  {
    name: 'src/drawings',
    files: ['src/drawings/**'],
    mayImport: ['src/drawings/**', 'src/components/**', 'src/lib/**', 'shared/**'],
    packages: REACT_PACKAGES,
    mayUseNode: false,
    why: 'drawings are given what they draw; they hold no store, session or feature',
  },
  {
    name: 'src/stores',
    files: ['src/stores/**'],
    mayImport: ['src/stores/**', 'shared/**'],
    packages: ['zustand', 'zod'],
    mayUseNode: false,
    why: 'stores are plain data: no React, fetch or socket',
  },
  {
    name: 'src/sync',
    files: ['src/sync/**'],
    mayImport: ['src/sync/**', 'src/stores/**', 'src/config/**', 'shared/**'],
    packages: ['socket.io-client', 'zustand', 'zod'],
    mayUseNode: false,
    why: 'the sync engine runs without React and without a canvas',
  },
  {
    name: 'src/fields',
    files: ['src/fields/**'],
    mayImport: [
      'src/fields/**',
      'src/components/**',
      'src/lib/**',
      'src/stores/**',
      'src/sync/layout-session',
      'shared/**',
    ],
    packages: [...REACT_PACKAGES, 'zustand'],
    mayUseNode: false,
    why: 'fields tie the UI kit to the open layout for every panel that edits it; they know no feature',
  },
  {
    name: 'src/workers',
    files: ['src/workers/**'],
    mayImport: ['src/workers/**', 'shared/**'],
    packages: [],
    mayUseNode: false,
    why: 'a worker only carries shared code',
  },
  {
    name: 'src/app',
    files: ['src/app/**', 'src/main', 'src/*.d'],
    mayImport: ['src/**', 'shared/**'],
    packages: ['*'],
    neverPackages: CANVAS_PACKAGES,
    mayUseNode: false,
    why: 'the app composes features; it draws nothing itself',
  },
]

const FEATURE_MAY_IMPORT = [
  'src/components/**',
  'src/drawings/**',
  'src/fields/**',
  'src/lib/**',
  'src/stores/**',
  'src/config/**',
  'src/sync/layout-session',
  'shared/**',
]
// Features see a live layout through the interface of the sync engine and results through the results store.
const FEATURE_NEVER = ['shared/engineering/interference-fit/**', 'shared/engineering/shaft/**']

function featureZones(feature: string): Zone[] {
  const folder = `src/features/${feature}`
  const own = `${folder}/**`
  const base = {
    mayImport: [own, ...FEATURE_MAY_IMPORT],
    never: FEATURE_NEVER,
    mayUseNode: false,
  }
  const zones: Zone[] = []
  if (foldersIn(folder).includes('tools')) {
    zones.push({
      ...base,
      name: `${folder}/tools`,
      files: [`${folder}/tools/**`],
      packages: [],
      never: [...FEATURE_NEVER, `${folder}/canvas/**`, 'src/components/**', 'src/drawings/**'],
      why: 'a tool turns plain pointer records into edits: no React, no konva',
    })
  }
  if (foldersIn(folder).includes('canvas')) {
    zones.push({
      ...base,
      name: `${folder}/canvas`,
      files: [`${folder}/canvas/**`],
      packages: [...REACT_PACKAGES, ...CANVAS_PACKAGES, 'zustand'],
      why: 'only the canvas draws with konva',
    })
  }
  zones.push({
    ...base,
    name: folder,
    files: [own],
    packages: ['*'],
    neverPackages: [...CANVAS_PACKAGES, 'socket.io-client'],
    why: 'a feature never imports another feature or the app; a route composes them',
  })
  return zones
}

const EVERYTHING_ON_THE_SERVER = ['server/**', 'shared/**']

const SERVER_ZONES: Zone[] = [
  {
    name: 'server routers',
    files: ['server/**/*.router'],
    mayImport: EVERYTHING_ON_THE_SERVER,
    never: ['server/**/*.repository', 'server/**/*.table', 'server/database/**'],
    packages: ['*'],
    neverPackages: [...SQL_PACKAGES, 'socket.io'],
    mayUseNode: true,
    why: 'a router checks input and calls services; it never sees a row',
  },
  {
    name: 'server services',
    files: ['server/**/*.service'],
    mayImport: EVERYTHING_ON_THE_SERVER,
    never: ['server/**/*.router', 'server/app', 'server/index', 'server/commands/**'],
    packages: ['*'],
    neverPackages: ['express', 'socket.io'],
    mayUseNode: true,
    why: 'a service speaks domain objects and works without HTTP and sockets',
  },
  {
    name: 'server repositories',
    files: ['server/**/*.repository'],
    // `x-storage` is the interface that a repository implements for its service.
    mayImport: [
      'server/database/**',
      'server/**/*.table',
      'server/**/*.repository',
      'server/**/*-storage',
      'shared/**',
    ],
    never: ['shared/engineering/**'],
    packages: SQL_PACKAGES,
    mayUseNode: true,
    why: 'a repository holds SQL and nothing else',
  },
  {
    name: 'server tables',
    files: ['server/**/*.table'],
    mayImport: ['server/**/*.table', 'shared/layout/**', 'shared/protocol/**'],
    packages: ['kysely'],
    mayUseNode: false,
    why: 'a table file is types only',
  },
  {
    name: 'server/database',
    files: ['server/database/**'],
    mayImport: ['server/database/**', 'server/**/*.table', 'server/config'],
    packages: [...SQL_PACKAGES, 'zod', 'pino'],
    mayUseNode: true,
    why: 'the database folder opens, migrates and encodes; queries of a domain live in its repository',
  },
  {
    name: 'server/realtime',
    files: ['server/realtime/**'],
    mayImport: EVERYTHING_ON_THE_SERVER,
    never: ['server/**/*.repository', 'server/**/*.table', 'server/**/*.router', 'server/commands/**'],
    packages: ['*'],
    neverPackages: [...SQL_PACKAGES, 'express'],
    mayUseNode: true,
    why: 'realtime wires sockets to services and never writes SQL',
  },
  {
    name: 'server/http',
    files: ['server/http/**'],
    mayImport: ['server/http/**', 'server/config', 'server/accounts/**', 'shared/protocol/**'],
    never: ['server/**/*.repository', 'server/**/*.table', 'server/**/*.router'],
    packages: ['*'],
    neverPackages: [...SQL_PACKAGES, 'socket.io'],
    mayUseNode: true,
    why: 'shared middleware has no resource logic',
  },
  {
    name: 'server',
    files: ['server/**'],
    mayImport: [...EVERYTHING_ON_THE_SERVER, 'migrations/**'],
    packages: ['*'],
    neverPackages: [...REACT_PACKAGES, ...CANVAS_PACKAGES, 'socket.io-client'],
    mayUseNode: true,
    why: 'the server never imports the browser client',
  },
  {
    name: 'migrations',
    files: ['migrations/**'],
    mayImport: [],
    packages: ['kysely'],
    mayUseNode: false,
    why: 'a migration is frozen in time and imports nothing of the app',
  },
]

/** Every zone, most particular first: the first whose pattern matches a file rules it. */
export function allZones(): Zone[] {
  return [
    ...SHARED_ZONES,
    ...CLIENT_ZONES,
    ...foldersIn('src/features').flatMap(featureZones),
    ...SERVER_ZONES,
  ]
}

export function matches(pattern: string, path: string): boolean {
  const expression = pattern
    .replace(/[.+?^${}()|[\]\\]/g, '\\$&')
    .replace(/\*\*|\*/g, (star) => (star === '**' ? '.*' : '[^/]*'))
  return new RegExp(`^${expression}$`).test(path)
}

export function withoutExtension(path: string): string {
  return path.replace(/\.(d\.ts|tsx?|json|css)$/, (extension) => (extension === '.d.ts' ? '.d' : ''))
}

/** Folders the rules speak about; everything else (tests, config files) may import what it likes. */
export function isRuled(path: string): boolean {
  return /^(src|server|shared|migrations)\//.test(path)
}

export function zoneOf(path: string, zones: Zone[]): Zone | undefined {
  const bare = withoutExtension(path)
  return zones.find((zone) => zone.files.some((pattern) => matches(pattern, bare)))
}

export type Resolved =
  { kind: 'project'; path: string } | { kind: 'package'; name: string } | { kind: 'node'; name: string }

/** `fromPath` is relative to the project root. */
export function resolveSpecifier(fromPath: string, specifier: string): Resolved {
  const bare = specifier.replace(/\?.*$/, '')
  for (const [alias, folder] of Object.entries(ALIASES)) {
    if (bare.startsWith(alias)) return { kind: 'project', path: folder + bare.slice(alias.length) }
  }
  if (bare.startsWith('.')) return { kind: 'project', path: posix.join(dirname(fromPath), bare) }
  const name = bare.startsWith('@') ? bare.split('/').slice(0, 2).join('/') : (bare.split('/')[0] ?? bare)
  if (bare.startsWith('node:') || NODE_MODULES.has(name)) return { kind: 'node', name: bare }
  return { kind: 'package', name }
}

/** Why this import is not allowed, or null when it is. */
export function importProblem(fromPath: string, specifier: string, zones: Zone[]): string | null {
  if (!isRuled(fromPath)) return null
  const zone = zoneOf(fromPath, zones)
  if (!zone) return `No import rule covers ${fromPath}: add its folder to tests/architecture/import-rules.ts.`
  const refuse = (target: string) => `${zone.name} may not import ${target}: ${zone.why}.`

  const resolved = resolveSpecifier(fromPath, specifier)
  if (resolved.kind === 'node') return zone.mayUseNode ? null : refuse(resolved.name)
  if (resolved.kind === 'package') {
    const isAllowed = zone.packages.includes('*') || zone.packages.includes(resolved.name)
    return isAllowed && !zone.neverPackages?.includes(resolved.name) ? null : refuse(resolved.name)
  }
  const path = withoutExtension(resolved.path)
  const isAllowed = zone.mayImport.some((pattern) => matches(pattern, path))
  const isForbidden = zone.never?.some((pattern) => matches(pattern, path)) ?? false
  return isAllowed && !isForbidden ? null : refuse(path)
}
