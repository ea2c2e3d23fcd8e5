import { useState } from 'react'
import { Link, useSearchParams } from 'react-router'
import { Button } from '@/components/button'
import { paths } from '@/config/paths'
import { CaughtMailHint } from '@/features/accounts/components/caught-mail-hint'
import { ResendConfirmation } from '@/features/accounts/components/resend-confirmation'
import { SignUpForm } from '@/features/accounts/components/sign-up-form'
import { safeNext, withNext } from '@/features/accounts/next-address'
import { usePageTitle } from '../../use-page-title'

export default function SignUpRoute() {
  usePageTitle('Create an account')
  const [search] = useSearchParams()
  const next = safeNext(search.get('next'))
  const [sentTo, setSentTo] = useState<string | null>(null)
  const [email, setEmail] = useState(search.get('email') ?? '')

  if (sentTo)
    return (
      <div className="grid gap-4">
        <h1 className="text-3xl font-extrabold tracking-tight">Look in your mail</h1>
        <p>
          We sent a link to <strong>{sentTo}</strong>. Open it to confirm the address; then you can sign in.
          If there is an account for this address already, the mail says so.
        </p>
        <CaughtMailHint />
        <ResendConfirmation email={sentTo} next={next} />
        <Button variant="quiet" size="sm" className="w-fit" onClick={() => setSentTo(null)}>
          Use another address
        </Button>
      </div>
    )
  return (
    <>
      <h1 className="mb-6 text-3xl font-extrabold tracking-tight">Create an account</h1>
      <SignUpForm
        next={next}
        initialEmail={email}
        onSignedUp={(address) => {
          setEmail(address)
          setSentTo(address)
        }}
      />
      <p className="mt-8 border-t border-hairline pt-5 text-sm text-quiet">
        You have an account?{' '}
        <Link to={withNext(paths.signIn, next)} className="font-semibold text-steel underline">
          Sign in
        </Link>
      </p>
    </>
  )
}
