import { useEffect, useState } from 'react'
import { Link, useSearchParams } from 'react-router'
import { buttonClasses } from '@/components/button'
import { Spinner } from '@/components/spinner'
import { paths } from '@/config/paths'
import { confirmEmail } from '@/features/accounts/api/auth-endpoints'
import { authErrors } from '@/features/accounts/auth-messages'
import { safeNext, withNext } from '@/features/accounts/next-address'
import { usePageTitle } from '../../use-page-title'

/**
 * The link in the mail ends here: with a token to spend, or after the server has spent it
 * (`error` is set when that failed).
 */
export default function ConfirmEmailRoute() {
  usePageTitle('Confirm e-mail address')
  const [search] = useSearchParams()
  const token = search.get('token')
  const next = safeNext(search.get('next'))
  const [failure, setFailure] = useState<string | null>(
    search.get('error') ? 'This link has expired or was used already. Ask for a new one.' : null,
  )
  const [isBusy, setIsBusy] = useState(token !== null)

  useEffect(() => {
    if (!token) return
    let isCurrent = true
    confirmEmail(token)
      .catch((error: unknown) => {
        if (isCurrent) setFailure(authErrors(error instanceof Error ? error : null).form)
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
      <p>{failure ? `${failure} Signing in offers to send the mail again.` : 'You can go on now.'}</p>
      <Link
        to={failure ? withNext(paths.signIn, next) : (next ?? paths.home)}
        className={`${buttonClasses('primary')} w-fit`}
      >
        {failure ? 'Go to sign-in' : 'Continue'}
      </Link>
    </div>
  )
}
