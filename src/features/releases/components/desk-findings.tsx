import { Sign } from '@/components/sign'
import type { DeskFinding } from '@shared/protocol/releases'

export function DeskFindings({ findings }: { findings: readonly DeskFinding[] }) {
  return (
    <ul className="divide-y divide-hairline text-sm">
      {findings.map((finding, index) => {
        const fails = finding.severity === 'fails'
        return (
          <li key={index} className="flex items-start gap-2 py-2">
            <Sign
              name={fails ? 'cross' : 'warning'}
              className={`mt-0.5 size-4 shrink-0 ${fails ? 'text-bad' : 'text-straw-ink'}`}
            />
            <div className="min-w-0">
              <p className="font-semibold">
                {fails ? 'Fails' : 'Warns'}: {finding.partName}
                {finding.loadCaseName !== null && `, ${finding.loadCaseName}`}
              </p>
              <p>{finding.message}</p>
            </div>
          </li>
        )
      })}
    </ul>
  )
}
