/** Failing findings that were accepted in releases still in force. */
import { Link } from 'react-router'
import { paths } from '@/config/paths'
import { formatDate } from '@/lib/format-time'
import type { ReleaseDesk } from '@shared/protocol/releases'
import { codeWords } from '../place-words'

export function DeviationList({
  workspaceId,
  deviations,
}: {
  workspaceId: string
  deviations: ReleaseDesk['deviations']
}) {
  return (
    <ul>
      {deviations.map((deviation) => (
        <li
          key={`${deviation.releaseId} ${deviation.code} ${deviation.part} ${deviation.loadCase ?? ''}`}
          className="grid gap-x-6 gap-y-1 border-b border-hairline py-3 text-sm md:grid-cols-[minmax(0,1.2fr)_minmax(0,2fr)_minmax(0,1fr)]"
        >
          <div className="min-w-0">
            <p className="font-semibold">
              {deviation.partName}: {codeWords(deviation.code)}
              {deviation.loadCaseName !== null && `, ${deviation.loadCaseName}`}
            </p>
            <Link to={paths.release(workspaceId, deviation.releaseId)} className="text-quiet hover:underline">
              {deviation.layoutName}, revision {deviation.revisionLetter}
            </Link>
          </div>
          <p className="wrap-break-word">{deviation.reason}</p>
          <p className="text-quiet md:text-right">
            {deviation.acceptedByName}, {formatDate(deviation.acceptedAt)}
          </p>
        </li>
      ))}
    </ul>
  )
}
