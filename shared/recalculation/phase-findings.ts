/** Angles against the timing chart, and hubs of one group against each other. */
import { checkPhase } from '../engineering/assembly/phase'
import { degree, toDegree } from '../engineering/quantities/units'
import type { Hub, LayoutDocument } from '../layout/layout-document'
import type { Finding } from './layout-results'
import { capitalised, degreeText, inSentence } from './wording'

/** For groups without a chart: what a person would call the same angle. */
const GROUP_TOLERANCE_DEG = 0.5

export function phaseFindings(document: LayoutDocument): Finding[] {
  const charted = new Set(document.timing.map((entry) => entry.hub))
  return [
    ...document.timing.flatMap((entry) => {
      const hub = document.hubs.find((one) => one.id === entry.hub)
      return hub ? chartFindings(document, hub, entry.phaseDeg, entry.toleranceDeg) : []
    }),
    ...document.hubs.filter((hub) => !charted.has(hub.id)).flatMap((hub) => groupFindings(document, hub)),
  ]
}

function chartFindings(
  document: LayoutDocument,
  hub: Hub,
  targetDeg: number,
  toleranceDeg: number,
): Finding[] {
  const name = capitalised(hub.name)
  const base = { code: 'phase' as const, part: hub.id, loadCase: null, limit: targetDeg, unit: '°' }
  const { phaseDeg } = hub
  if (phaseDeg === null || phaseDeg === undefined) {
    return [
      {
        ...base,
        severity: 'warns',
        value: null,
        message: `${name} has no angle; the timing chart asks for ${degreeText(targetDeg)}.`,
        remedy: `Set its angle to ${degreeText(targetDeg)}.`,
      },
    ]
  }
  const check = checkPhase(degree(phaseDeg), degree(targetDeg), degree(toleranceDeg))
  if (check.isWithin) return []
  const offDeg = Math.abs(toDegree(check.deviation))
  const isOutOfGroup = groupMates(document, hub).some(
    (mate) => !checkPhase(degree(phaseDeg), degree(mate.phaseDeg ?? 0), degree(toleranceDeg)).isWithin,
  )
  return [
    {
      ...base,
      severity: 'fails',
      value: phaseDeg,
      message: `${name} is ${degreeText(offDeg)} from ${isOutOfGroup ? 'its group and from ' : ''}the timing chart: ${degreeText(phaseDeg)} against ${degreeText(targetDeg)}.`,
      remedy: check.mirrorMatches
        ? `The mirrored value ${degreeText(targetDeg)} matches: was this read from the rear end?`
        : `Set its angle to ${degreeText(targetDeg)}, or change the chart.`,
    },
  ]
}

/** Hubs of the same group that have an angle. */
function groupMates(document: LayoutDocument, hub: Hub): Hub[] {
  if (!hub.group) return []
  return document.hubs.filter(
    (other) => other.id !== hub.id && other.group === hub.group && typeof other.phaseDeg === 'number',
  )
}

/** Without a chart the first hub of a group sets its angle; which one is right, only a person can say. */
function groupFindings(document: LayoutDocument, hub: Hub): Finding[] {
  const { phaseDeg } = hub
  const leader = document.hubs.find(
    (other) => other.group === hub.group && typeof other.phaseDeg === 'number',
  )
  if (!hub.group || typeof phaseDeg !== 'number' || !leader || leader.id === hub.id) return []
  const targetDeg = leader.phaseDeg ?? 0
  const check = checkPhase(degree(phaseDeg), degree(targetDeg), degree(GROUP_TOLERANCE_DEG))
  if (check.isWithin) return []
  return [
    {
      code: 'phase',
      severity: 'warns',
      part: hub.id,
      loadCase: null,
      value: phaseDeg,
      limit: targetDeg,
      unit: '°',
      message: `${capitalised(hub.name)} is ${degreeText(Math.abs(toDegree(check.deviation)))} from ${inSentence(leader.name)} of the same group: ${degreeText(phaseDeg)} against ${degreeText(targetDeg)}.`,
      remedy: check.mirrorMatches
        ? `The mirrored value ${degreeText(targetDeg)} matches: was this read from the rear end?`
        : 'Give the group one angle, or take the hub out of it.',
    },
  ]
}
