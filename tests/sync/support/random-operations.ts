/** Operations a person might make on a document, and some that no longer fit. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { AddOperation, Operation, Target } from '@shared/layout/operations'
import { removeHubOperations } from '@shared/layout/remove-hub-operations'
import { targetOfAdded } from '@shared/layout/target-of-added'
import { settableFieldNames } from '@shared/layout/settable-fields'
import type { Random } from './random'

type Maker = (document: LayoutDocument, random: Random) => Operation[]

export function randomOperations(document: LayoutDocument, random: Random): Operation[] {
  const count = random.chance(0.2) ? 1 + random.integer(4) : 1
  return Array.from({ length: count }).flatMap(() => random.pick(MAKERS)?.(document, random) ?? [])
}

/** Every target of the document and a few that are not there. */
export function everyTarget(document: LayoutDocument): Target[] {
  return [
    { kind: 'layout' },
    { kind: 'shaft' },
    { kind: 'criteria' },
    ...[...document.shaft.sections.map(({ id }) => id), 'gone'].map(
      (id) => ({ kind: 'section', id }) as const,
    ),
    ...[...document.hubs.map(({ id }) => id), 'gone'].map((id) => ({ kind: 'hub', id }) as const),
    ...[...document.bearings.map(({ id }) => id), 'gone'].map((id) => ({ kind: 'bearing', id }) as const),
    ...[...document.loadCases.map(({ id }) => id), 'gone'].map((id) => ({ kind: 'loadCase', id }) as const),
    ...document.loadCases.flatMap((loadCase) =>
      loadCase.loads.map(({ id }) => ({ kind: 'load', loadCaseId: loadCase.id, id }) as const),
    ),
    ...document.timing.map(({ hub }) => ({ kind: 'timing', hub }) as const),
  ]
}

const round = (value: number) => Math.round(value * 10) / 10
const VALUES: ((random: Random) => unknown)[] = [
  (random) => round(random.next() * 200),
  (random) => round(random.next() * 200 - 100),
  (random) => `Name ${random.integer(20)}`,
  (random) => random.pick(['gear', 'cam', 'left', 'right', 'press', 'heat-hub', 'locating', 'ring', 'split']),
  () => null,
  () => ({ kind: 'iso286', hole: 'H7', shaft: 'u6' }),
  (random) => ({ kind: 'limits', minInterferenceUm: 10, maxInterferenceUm: 20 + random.integer(50) }),
  () => ({ circumferential: 0.12, axial: 0.12, pressing: 0.1 }),
  () => ({ slipSafety: 1.2 }),
  () => ({ A: 60, gone: 40 }),
]

const setAnything: Maker = (document, random) => {
  const target = random.pick(everyTarget(document))
  if (!target) return []
  const field = random
    .pick(settableFieldNames(target.kind))
    ?.replace('*', random.pick(['A', 'B', 'gone']) ?? 'A')
  const value = random.pick(VALUES)?.(random)
  return field === undefined ? [] : [{ type: 'set', target, field, value }]
}

const moveHub: Maker = (document, random) => {
  const hub = random.pick(document.hubs)
  if (!hub) return []
  const field = random.pick(['stationMm', 'lengthMm', 'outerDiameterMm', 'phaseDeg']) ?? 'stationMm'
  const value = round(1 + random.next() * 150)
  return [{ type: 'set', target: { kind: 'hub', id: hub.id }, field, value }]
}

const add: Maker = (document, random) => {
  const id = `n${random.integer(1_000_000)}`
  const hub = random.pick(document.hubs)
  const loadCase = random.pick(document.loadCases)
  const additions: (AddOperation | null)[] = [
    hub
      ? { type: 'add', collection: 'hubs', index: random.integer(6), item: { ...hub, id, name: id } }
      : null,
    {
      type: 'add',
      collection: 'sections',
      index: random.integer(6),
      item: {
        id,
        lengthMm: 20,
        outerDiameterMm: 40 + random.integer(20),
        boreDiameterMm: 0,
        roughnessRzUm: 4,
      },
    },
    {
      type: 'add',
      collection: 'bearings',
      index: random.integer(3),
      item: { id, name: id, stationMm: random.integer(150), widthMm: 10, kind: 'floating', housing: 'split' },
    },
    loadCase ? { type: 'add', collection: 'loadCases', index: 0, item: { ...loadCase, id, name: id } } : null,
    {
      type: 'add',
      collection: 'loads',
      loadCaseId: loadCase?.id ?? 'gone',
      index: random.integer(3),
      item: {
        id,
        hub: random.chance(0.1) ? 'gone' : (hub?.id ?? 'gone'),
        stationMm: 20,
        torqueNm: random.integer(400),
        forceYN: 0,
        forceZN: 0,
        axialN: 0,
        momentYNm: 0,
        momentZNm: 0,
      },
    },
    {
      type: 'add',
      collection: 'timing',
      index: 0,
      item: { hub: hub?.id ?? 'gone', phaseDeg: random.integer(360), toleranceDeg: 1 },
    },
  ]
  const addition = random.pick(additions)
  if (!addition) return []
  // An edit often goes on with what it has just added.
  const target = targetOfAdded(addition)
  return random.chance(0.2) ? [addition, { type: 'remove', target }] : [addition]
}

const remove: Maker = (document, random) => {
  const target = random.pick(everyTarget(document))
  if (!target || target.kind === 'layout' || target.kind === 'shaft' || target.kind === 'criteria') return []
  if (target.kind === 'hub' && random.chance(0.5)) return removeHubOperations(document, target.id)
  return [{ type: 'remove', target }]
}

const reorder: Maker = (document, random) => {
  const target = random.pick(everyTarget(document))
  if (target?.kind !== 'hub' && target?.kind !== 'section' && target?.kind !== 'loadCase') return []
  return [{ type: 'reorder', target, index: random.integer(5) }]
}

/** Moves are what people do most. */
const MAKERS: Maker[] = [moveHub, moveHub, moveHub, setAnything, setAnything, add, add, remove, reorder]
