import { useQuery } from '@tanstack/react-query'
import { EmptyState } from '@/components/empty-state'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { formatAgo, formatDateTime } from '@/lib/format-time'
import { HttpError, messageOf } from '@/lib/http-client'
import type { CaughtMail as Mail } from '@shared/protocol/accounts'
import { caughtMailQuery } from '../api/caught-mail'

export function CaughtMail() {
  const { data: mails, error, isFetching, refetch } = useQuery(caughtMailQuery)
  if (!mails) {
    if (error instanceof HttpError && error.status === 404)
      return (
        <EmptyState title="No mail is caught here">
          This installation hands its mail to a real mail server.
        </EmptyState>
      )
    return error ? (
      <LoadFailure message={messageOf(error)} isRetrying={isFetching} onRetry={() => void refetch()} />
    ) : (
      <Spinner label="Loading the mail" />
    )
  }
  if (mails.length === 0)
    return (
      <EmptyState title="No mail yet">
        Sign up, ask for a new password or invite someone, and the mail appears here.
      </EmptyState>
    )
  return (
    <ul className="border-t border-hairline">
      {mails.map((mail) => (
        <MailItem key={mail.id} mail={mail} />
      ))}
    </ul>
  )
}

function MailItem({ mail }: { mail: Mail }) {
  return (
    <li className="border-b border-hairline py-5">
      <article>
        <div className="flex flex-wrap items-baseline justify-between gap-x-4">
          <h2 className="font-bold">{mail.subject}</h2>
          <time dateTime={mail.at} title={formatDateTime(mail.at)} className="text-[13px] text-quiet">
            {formatAgo(mail.at)}
          </time>
        </div>
        <p className="text-[13px] text-quiet">To {mail.to}</p>
        <p className="mt-3 text-sm break-words whitespace-pre-wrap">
          <LinkedText text={mail.text} links={mail.links} />
        </p>
      </article>
    </li>
  )
}

/** The text with its web addresses made into links, and nothing else of it interpreted. */
function LinkedText({ text, links }: { text: string; links: string[] }) {
  const addresses = links.filter((link) => /^https?:\/\//.test(link)).sort((a, b) => b.length - a.length)
  const pieces: (string | { link: string })[] = []
  let rest = text
  while (rest) {
    const first = addresses
      .map((link) => ({ link, at: rest.indexOf(link) }))
      .filter(({ at }) => at >= 0)
      // At the same place the longest address is the whole one.
      .sort((a, b) => a.at - b.at || b.link.length - a.link.length)[0]
    if (!first) break
    pieces.push(rest.slice(0, first.at), { link: first.link })
    rest = rest.slice(first.at + first.link.length)
  }
  pieces.push(rest)
  return pieces.map((piece, index) =>
    typeof piece === 'string' ? (
      piece
    ) : (
      <a key={index} href={piece.link} className="font-semibold break-all text-steel underline">
        {piece.link}
      </a>
    ),
  )
}
