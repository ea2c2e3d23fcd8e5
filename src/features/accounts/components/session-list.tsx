import { useQuery } from '@tanstack/react-query'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Chip } from '@/components/chip'
import { LoadFailure } from '@/components/load-failure'
import { Spinner } from '@/components/spinner'
import { formatAgo, formatDateTime } from '@/lib/format-time'
import { messageOf } from '@/lib/http-client'
import { sessionsQuery, useRevokeSessions } from '../api/sessions'
import { describeDevice } from '../describe-device'

export function SessionList() {
  const { data: sessions, error, isFetching, refetch } = useQuery(sessionsQuery)
  const revoke = useRevokeSessions()

  if (!sessions)
    return error ? (
      <LoadFailure message={messageOf(error)} isRetrying={isFetching} onRetry={() => void refetch()} />
    ) : (
      <Spinner label="Loading the sessions" />
    )
  const others = sessions.filter((session) => !session.isCurrent)
  return (
    <div className="grid gap-4">
      {revoke.error && <Banner tone="bad">{messageOf(revoke.error)}</Banner>}
      <ul className="divide-y divide-hairline border-y border-hairline">
        {sessions.map((session) => (
          <li key={session.id} className="flex flex-wrap items-center gap-x-4 gap-y-1 py-3">
            <div className="min-w-0 flex-1">
              <p className="flex flex-wrap items-center gap-2 font-semibold">
                {describeDevice(session.userAgent)}
                {session.isCurrent && <Chip tone="steel">This device</Chip>}
              </p>
              <p className="text-[13px] text-quiet">
                Seen {formatAgo(session.lastSeenAt)}
                {session.ipAddress && ` from ${session.ipAddress}`}, signed in{' '}
                {formatDateTime(session.createdAt)}
              </p>
            </div>
            {!session.isCurrent && (
              <Button
                size="sm"
                aria-label={`Sign out ${describeDevice(session.userAgent)}`}
                isBusy={revoke.isPending}
                onClick={() => revoke.mutate({ sessionId: session.id })}
              >
                Sign out
              </Button>
            )}
          </li>
        ))}
      </ul>
      {others.length > 1 && (
        <Button className="w-fit" isBusy={revoke.isPending} onClick={() => revoke.mutate('others')}>
          Sign out all other devices
        </Button>
      )}
    </div>
  )
}
