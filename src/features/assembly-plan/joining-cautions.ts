import type { Hub } from '@shared/layout/layout-document'

/** Cautions that belong to the joining methods used; the assembly sheet prints the same ones. */
export function joiningCautions(hubs: readonly Hub[], hasBrittleHub: boolean): string[] {
  const uses = (...methods: Hub['joining']['method'][]) =>
    hubs.some(({ joining }) => methods.includes(joining.method))
  return [
    ...(uses('heat-hub', 'heat-and-cool')
      ? [
          'Hot parts burn. Wear gloves and face protection, heat the whole hub evenly, check the bore with a gauge before joining and hold it against its shoulder until it grips.',
        ]
      : []),
    ...(uses('cool-shaft', 'heat-and-cool')
      ? [
          'Cryogenic liquids burn the skin and displace air. Work in a ventilated place, never in a pit, and let no liquid be trapped under the hub.',
        ]
      : []),
    ...(uses('press')
      ? [
          'A loaded press stores energy. Stand clear of the line of force, support the hub directly behind the seat and record force against travel.',
        ]
      : []),
    'Use lifting gear for heavy parts and keep hands out of the gap while joining.',
    ...(hasBrittleHub
      ? ['A brittle hub can burst. Heat it slowly, never hammer it, and shield it while it cools.']
      : []),
    'Never hammer a hub that sticks: take it off, find the cause, measure both parts again.',
  ]
}
