/** Ids of the stored release turned into the names people know. */
import type { Hub, LayoutDocument, MaterialReference } from '@shared/layout/layout-document'
import type { Severity } from '@shared/recalculation/layout-results'

export function partWords(document: LayoutDocument, partId: string): string {
  if (partId === '') return 'whole layout'
  const hub = document.hubs.find((candidate) => candidate.id === partId)
  if (hub) return hub.name
  const bearing = document.bearings.find((candidate) => candidate.id === partId)
  if (bearing) return `bearing ${bearing.name}`
  const section = document.shaft.sections.findIndex((candidate) => candidate.id === partId)
  return section >= 0 ? `section ${section + 1} (${partId})` : partId
}

export function loadCaseWords(document: LayoutDocument, loadCaseId: string | null): string {
  if (loadCaseId === null) return 'every load case'
  return document.loadCases.find((candidate) => candidate.id === loadCaseId)?.name ?? loadCaseId
}

export function materialWords(material: MaterialReference): string {
  if (typeof material === 'string') return material
  return material.name ?? `own values, E ${material.youngsModulusMPa} MPa, yield ${material.yieldMPa} MPa`
}

export const SEVERITY_WORDS: Record<Severity, string> = { fails: 'Fails', warns: 'Warns', notes: 'Note' }

export const METHOD_WORDS: Record<Hub['joining']['method'], string> = {
  'heat-hub': 'heat the hub',
  'cool-shaft': 'cool the shaft',
  'heat-and-cool': 'heat the hub, cool the shaft',
  press: 'press',
}
