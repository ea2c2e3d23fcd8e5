import type { LayoutDocument } from './layout-document'

interface ReferenceProblem {
  path: string
  message: string
}

/** What no schema of one field can say: ids are unique and names of hubs lead somewhere. Empty when all is well. */
export function checkReferences(document: LayoutDocument): ReferenceProblem[] {
  const hubIds = new Set(document.hubs.map((hub) => hub.id))
  const problems: ReferenceProblem[] = []

  const partIds = new Map<string, string>()
  const parts = [
    ...document.shaft.sections.map(({ id }, at) => ({ id, path: `shaft.sections[${at}].id` })),
    ...document.hubs.map(({ id }, at) => ({ id, path: `hubs[${at}].id` })),
    ...document.bearings.map(({ id }, at) => ({ id, path: `bearings[${at}].id` })),
  ]
  for (const { id, path } of parts) reportTwice(partIds, id, path, problems)

  const loadCaseIds = new Map<string, string>()
  document.loadCases.forEach((loadCase, caseAt) => {
    const path = `loadCases[${caseAt}]`
    reportTwice(loadCaseIds, loadCase.id, `${path}.id`, problems)
    const loadIds = new Map<string, string>()
    loadCase.loads.forEach((load, loadAt) => {
      reportTwice(loadIds, load.id, `${path}.loads[${loadAt}].id`, problems)
      if (!hubIds.has(load.hub)) problems.push(noSuchHub(`${path}.loads[${loadAt}].hub`, load.hub))
    })
    for (const hubId of Object.keys(loadCase.hubTemperaturesC ?? {})) {
      if (!hubIds.has(hubId)) problems.push(noSuchHub(`${path}.hubTemperaturesC.${hubId}`, hubId))
    }
  })

  const timedHubs = new Map<string, string>()
  document.timing.forEach((entry, at) => {
    reportTwice(timedHubs, entry.hub, `timing[${at}].hub`, problems)
    if (!hubIds.has(entry.hub)) problems.push(noSuchHub(`timing[${at}].hub`, entry.hub))
  })
  return problems
}

function reportTwice(
  seen: Map<string, string>,
  id: string,
  path: string,
  problems: ReferenceProblem[],
): void {
  const first = seen.get(id)
  if (first === undefined) seen.set(id, path)
  else problems.push({ path, message: `"${id}" is already used at ${first}` })
}

function noSuchHub(path: string, id: string): ReferenceProblem {
  return { path, message: `There is no hub "${id}"` }
}
