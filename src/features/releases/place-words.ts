/** Ids of a document turned into the names people know. */
import type { InterferenceFit, LayoutDocument } from '@shared/layout/layout-document'

export function partName(document: LayoutDocument, partId: string): string {
  if (partId === '') return 'Whole layout'
  const part = [...document.hubs, ...document.bearings].find((each) => each.id === partId)
  if (part) return part.name
  const section = document.shaft.sections.findIndex((each) => each.id === partId)
  return section >= 0 ? `Shaft section ${section + 1}` : partId
}

export function loadCaseName(document: LayoutDocument, loadCaseId: string | null): string {
  if (loadCaseId === null) return 'every load case'
  return document.loadCases.find((each) => each.id === loadCaseId)?.name ?? loadCaseId
}

/** "H7/u6", or the limits as entered. */
export function fitWords(fit: InterferenceFit): string {
  return fit.kind === 'iso286'
    ? `${fit.hole}/${fit.shaft}`
    : `${fit.minInterferenceUm} to ${fit.maxInterferenceUm} µm`
}

/** "abutment-missing" read as words. */
export const codeWords = (code: string): string => code.replaceAll('-', ' ')
