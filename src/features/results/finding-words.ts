import type { FindingCode, Severity } from '@shared/recalculation/layout-results'

/** Short heads of findings; the sentence on the cause comes from the calculation. */
export const FINDING_WORDS: Record<FindingCode, string> = {
  slip: 'Slips',
  'no-interference': 'No interference left',
  'window-empty': 'Window is empty',
  'hub-yield': 'Hub yields',
  'hub-brittle': 'Brittle hub overstressed',
  'shaft-yield': 'Shaft yields',
  'heat-limit': 'Joining too hot',
  'passage-blocked': 'Cannot reach its seat',
  'passage-side': 'Wrong side',
  'passage-tight': 'Passes over another seat',
  'assembly-order': 'No order of assembly',
  'abutment-missing': 'No shoulder there',
  'no-seat': 'No seat under it',
  'seat-step': 'Lies over a step',
  'bore-mismatch': 'Bore does not match',
  overlap: 'Parts overlap',
  'gap-small': 'Gap too small',
  phase: 'Phase angle differs',
  'short-hub': 'Short hub',
  'temperature-loss': 'Temperature loosens it',
  'speed-loss': 'Speed loosens it',
  'mesh-slope': 'Slope at the mesh',
  'mesh-deflection': 'Deflection at the mesh',
  'bearing-slope': 'Slope at the bearing',
  fatigue: 'Fatigue',
  'critical-speed': 'Critical speed',
  'torque-balance': 'Torques do not balance',
  'axial-support': 'Axial support',
  unsupported: 'Shaft not supported',
  'unknown-tolerance': 'Unknown tolerance class',
  'unknown-material': 'Unknown material',
  'not-computable': 'Not computed',
  'outside-validity': 'Outside validity',
  'outer-diameter-growth': 'Outer diameter grows',
  'root-tension': 'Tension at the root',
}

interface SeverityWords {
  heading: string
  one: string
  many: string
  sign: string
  ink: string
}

/** Sign, word and colour together; none of them alone. */
export const SEVERITY_WORDS: Record<Severity, SeverityWords> = {
  fails: { heading: 'Fails', one: 'fails', many: 'fail', sign: '✕', ink: 'text-bad' },
  warns: { heading: 'Warns', one: 'warns', many: 'warn', sign: '▲', ink: 'text-straw-ink' },
  notes: { heading: 'Notes', one: 'note', many: 'notes', sign: 'i', ink: 'text-steel' },
}

export const SEVERITIES: readonly Severity[] = ['fails', 'warns', 'notes']
