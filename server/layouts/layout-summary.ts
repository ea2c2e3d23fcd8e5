/** What a card shows of a layout beyond its row: verdict, first failure and a small drawing. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { sectionAt } from '@shared/layout/shaft-geometry'
import type { Thumbnail } from '@shared/protocol/layouts'
import type { Finding, LayoutResults } from '@shared/recalculation/layout-results'
import { FINDING_WORDS } from './finding-words'

export interface CalculatedSummary {
  verdict: 'passes' | 'fails'
  failingCount: number
  worstFinding: string
  thumbnail: Thumbnail
}

export function summarise(document: LayoutDocument, results: LayoutResults): CalculatedSummary {
  const failing = results.findings.filter((finding) => finding.severity === 'fails')
  const [worst] = failing
  return {
    verdict: results.verdict,
    failingCount: failing.length,
    worstFinding: worst ? findingWords(document, worst) : '',
    thumbnail: thumbnailOf(document, results),
  }
}

function findingWords(document: LayoutDocument, finding: Finding): string {
  const part = [...document.hubs, ...document.bearings].find((each) => each.id === finding.part)
  const section = document.shaft.sections.findIndex((each) => each.id === finding.part)
  const name = part?.name ?? (section >= 0 ? `shaft section ${section + 1}` : 'the shaft')
  const loadCase = document.loadCases.find((each) => each.id === finding.loadCase)
  return `${name} ${FINDING_WORDS[finding.code]}${loadCase ? ` in ${loadCase.name}` : ''}`
}

export function thumbnailOf(document: LayoutDocument, results: LayoutResults): Thumbnail {
  return {
    sections: document.shaft.sections.map(({ lengthMm, outerDiameterMm, boreDiameterMm }) => ({
      lengthMm,
      outerDiameterMm,
      boreDiameterMm,
    })),
    hubs: document.hubs.map((hub) => {
      const result = results.hubs.find((each) => each.id === hub.id)
      return {
        stationMm: hub.stationMm,
        lengthMm: hub.lengthMm,
        outerDiameterMm: hub.outerDiameterMm,
        boreDiameterMm: hub.boreDiameterMm ?? result?.seat.diameterMm ?? hub.outerDiameterMm / 2,
        verdict: result?.verdict ?? 'notComputable',
      }
    }),
    bearings: document.bearings.map((bearing) => ({
      stationMm: bearing.stationMm,
      widthMm: bearing.widthMm,
      diameterMm:
        bearing.boreDiameterMm ??
        sectionAt(document, bearing.stationMm)?.section.outerDiameterMm ??
        bearing.widthMm,
    })),
  }
}
