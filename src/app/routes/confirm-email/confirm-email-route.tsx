import { useEffect, useState } from 'react'
import { Link, useSearchParams } from 'react-router'
import { buttonClasses } from '@/components/button'
import { Spinner } from '@/components/spinner'
import { paths } from '@/config/paths'
import { confirmEmail } from '@/features/accounts/api/auth-endpoints'
import { safeNext, withNext } from '@/features/accounts/next-address'
import { messageOf } from '@/lib/http-client'
import { usePageTitle } from '../../use-page-title'

/** The link in the mail leads here; the token it carries is spent at once. */
export default function ConfirmEmailRoute() {
  usePageTitle('Confirm e-mail address')
  const [search] = useSearchParams()
  const token = search.get('token')
  const next = safeNext(search.get('next'))
  const [failure, setFailure] = useState<string | null>(
    token ? null : 'The link is not complete; open it from the mail again.',
  )
  const [isBusy, setIsBusy] = useState(token !== null)

  useEffect(() => {
    if (!token) return
    let isCurrent = true
    confirmEmail(token)
      .catch((error: unknown) => {
        if (isCurrent) setFailure(messageOf(error))
      })
      .finally(() => {
        if (isCurrent) setIsBusy(false)
      })
    return () => {
      isCurrent = false
    }
  }, [token])

  if (isBusy) return <Spinner label="Confirming the address" />
  return (
    <div className="grid gap-5" role="status">
      <h1 className="text-3xl font-extrabold tracking-tight">
        {failure ? 'The address is not confirmed' : 'Your address is confirmed'}
      </h1>
      <p>{failure ? `${failure} Signing in offers to send the mail again.` : 'You can sign in now.'}</p>
      <Link to={withNext(paths.signIn, next)} className={`${buttonClasses('primary')} w-fit`}>
        Sign in
      </Link>
    </div>
  )
}
