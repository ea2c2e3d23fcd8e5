import type { LayoutSummary } from '@shared/protocol/layouts'

/** A layout of two sections, one hub and one bearing; it passes unless it is told how many findings fail. */
export function layoutSummary(changes: Partial<LayoutSummary> = {}): LayoutSummary {
  const failingCount = changes.failingCount ?? 0
  const isFailing = failingCount > 0
  return {
    id: 'l1',
    workspaceId: 'w1',
    name: 'Layout',
    project: null,
    status: 'draft',
    revisionLetter: 'A',
    revision: 3,
    isArchived: false,
    verdict: isFailing ? 'fails' : 'passes',
    failingCount,
    worstFinding: isFailing ? 'Pinion slips in Running' : '',
    editedAt: '2026-12-01T08:00:00.000Z',
    editedByName: 'Dina Reyes',
    peopleInIt: [],
    thumbnail: {
      sections: [
        { lengthMm: 60, outerDiameterMm: 50, boreDiameterMm: 0 },
        { lengthMm: 80, outerDiameterMm: 56, boreDiameterMm: 20 },
      ],
      hubs: [
        {
          stationMm: 10,
          lengthMm: 45,
          outerDiameterMm: 96,
          boreDiameterMm: 50,
          verdict: isFailing ? 'fails' : 'passes',
        },
      ],
      bearings: [{ stationMm: 130, widthMm: 10, diameterMm: 56 }],
    },
    ...changes,
  }
}
