import type { HubResult } from '@shared/recalculation/layout-results'

/** What happens beyond the right mark, in one word, from what sets it. */
export function aboveWord({ window }: Pick<HubResult, 'window'>): string {
  if (/heat|joining|oven|temperature/i.test(window.permissibleCause)) return 'overheats'
  if (/brittle|crack|tension|tensile/i.test(window.permissibleCause)) return 'cracks'
  return 'yields'
}
