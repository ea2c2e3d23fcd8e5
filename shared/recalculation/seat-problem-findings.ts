/** A hub without numbers says why, as findings beside the reasons in its result. */
import type { Hub } from '../layout/layout-document'
import type { Finding } from './layout-results'
import type { SeatProblem } from './seat'
import { capitalised } from './wording'

export function seatProblemFindings(hub: Hub, problems: readonly SeatProblem[]): Finding[] {
  return problems.map((problem) => ({
    code: problem.code,
    severity: 'fails',
    part: hub.id,
    loadCase: null,
    value: null,
    limit: null,
    unit: '',
    message: `${capitalised(hub.name)} cannot be calculated: ${problem.reason}.`,
    remedy: problem.remedy,
    stationMm: hub.stationMm,
  }))
}
