/** What is missing or contradictory for the layout as a whole, so that nothing is silently left out. */
import type { LayoutDocument } from '../layout/layout-document'
import type { Finding } from './layout-results'
import { resolveMaterial } from './resolve-material'
import type { ShaftCalculation } from './shaft-results'
import { capitalised, listed, millimetreText } from './wording'

const none = { value: null, limit: null, unit: '', loadCase: null }

export function inputFindings(document: LayoutDocument, shaft: ShaftCalculation): Finding[] {
  return [
    ...materialFindings(document),
    ...sectionFindings(shaft),
    ...supportFindings(document, shaft),
    ...axialFindings(document, shaft),
    ...loadFindings(document, shaft),
  ]
}

function materialFindings(document: LayoutDocument): Finding[] {
  const { reason } = resolveMaterial(document.shaft.material)
  // with hubs on it each of them says so already
  if (reason === null || document.hubs.length > 0) return []
  return [
    {
      ...none,
      code: 'unknown-material',
      severity: 'fails',
      part: '',
      message: `The shaft cannot be calculated: ${reason}.`,
      remedy: 'Choose a material from the library or enter its values.',
    },
  ]
}

function sectionFindings(shaft: ShaftCalculation): Finding[] {
  return shaft.inputs.hollowedOut.map((id) => ({
    ...none,
    code: 'not-computable',
    severity: 'fails',
    part: id,
    message:
      'The shaft cannot be calculated: the bore of this section is not smaller than its outer diameter.',
    remedy: 'Make the bore smaller or the section larger.',
    stationMm: shaft.inputs.spans.find((span) => span.section.id === id)?.startMm ?? 0,
  }))
}

function supportFindings(document: LayoutDocument, shaft: ShaftCalculation): Finding[] {
  const stations = new Set(shaft.inputs.supporting.map(({ bearing }) => bearing.stationMm))
  const hasLoads = document.loadCases.some((loadCase) => loadCase.loads.length > 0)
  if (stations.size < 2)
    return [
      {
        ...none,
        code: 'unsupported',
        severity: hasLoads ? 'fails' : 'warns',
        part: '',
        value: stations.size,
        limit: 2,
        message: `The shaft rests on ${stations.size === 1 ? 'one bearing' : 'no bearing'}; bending cannot be calculated.`,
        remedy: 'Put two bearings at different places on the shaft.',
      },
    ]
  if (shaft.reason === null || shaft.inputs.model === null) return []
  return [
    {
      ...none,
      code: 'not-computable',
      severity: 'fails',
      part: '',
      message: `Bending of the shaft cannot be calculated: ${shaft.reason}.`,
      remedy: 'Check the lengths and diameters of the sections, the places of the bearings and the loads.',
    },
  ]
}

function axialFindings(document: LayoutDocument, shaft: ShaftCalculation): Finding[] {
  if (shaft.inputs.supporting.length === 0) return []
  const locating = shaft.inputs.supporting.filter(({ bearing }) => bearing.kind === 'locating')
  const axial = document.loadCases.some(
    (loadCase) => Math.abs(loadCase.loads.reduce((sum, load) => sum + load.axialN, 0)) > 0,
  )
  if (locating.length === 1) return []
  if (locating.length === 0)
    return [
      {
        ...none,
        code: 'axial-support',
        severity: axial ? 'fails' : 'warns',
        part: '',
        message: 'No bearing holds the shaft along its axis.',
        remedy: 'Make one bearing the locating one.',
      },
    ]
  return [
    {
      ...none,
      code: 'axial-support',
      severity: 'warns',
      part: locating[1]?.bearing.id ?? '',
      message: `Bearings ${listed(locating.map(({ bearing }) => bearing.name))} both hold the shaft along its axis; they work against each other when it warms up, and the axial force is given to the first.`,
      remedy: 'Make all but one bearing floating.',
    },
  ]
}

function loadFindings(document: LayoutDocument, shaft: ShaftCalculation): Finding[] {
  const hubs = new Map(document.hubs.map((hub) => [hub.id, hub]))
  const { lengthMm } = shaft.inputs
  return document.loadCases.flatMap((loadCase) =>
    loadCase.loads.flatMap((load): Finding[] => {
      const hub = hubs.get(load.hub)
      if (!hub)
        return [
          {
            ...none,
            code: 'not-computable',
            severity: 'warns',
            part: load.hub,
            loadCase: loadCase.id,
            message: `A load of ${loadCase.name} belongs to ${load.hub}, which is not in the layout; it is left out.`,
            remedy: 'Give the load to another hub or delete it.',
          },
        ]
      if (load.stationMm >= 0 && load.stationMm <= lengthMm) return []
      return [
        {
          ...none,
          code: 'outside-validity',
          severity: 'warns',
          part: hub.id,
          loadCase: loadCase.id,
          value: load.stationMm,
          limit: lengthMm,
          unit: 'mm',
          message: `The load of ${capitalised(hub.name)} in ${loadCase.name} acts at ${millimetreText(load.stationMm)}, beside the shaft; it is carried to the end with its moment.`,
          remedy: 'Move the load onto the shaft.',
          stationMm: load.stationMm,
        },
      ]
    }),
  )
}
