import { type FormEvent, useState } from 'react'
import { Link } from 'react-router'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { PasswordField } from '@/components/password-field'
import { TextField } from '@/components/text-field'
import { paths } from '@/config/paths'
import { HttpError } from '@/lib/http-client'
import { signIn } from '../api/auth-endpoints'
import { emailProblem } from '../field-rules'
import { formErrors } from '@/lib/form-errors'
import { focusFirstInvalid } from '@/lib/focus-first-invalid'
import { useSubmission } from '../hooks/use-submission'
import { ResendConfirmation } from './resend-confirmation'

export function SignInForm({ next, onSignedIn }: { next: string | null; onSignedIn: () => void }) {
  const [email, setEmail] = useState('')
  const [password, setPassword] = useState('')
  const [problems, setProblems] = useState<{ email?: string | null; password?: string | null }>({})
  const { isBusy, error, submit } = useSubmission()
  const { fields, form } = formErrors(error, ['email', 'password'])

  // The server says so only to whoever knows the password.
  const isUnconfirmed = error instanceof HttpError && error.status === 403

  const onSubmit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const found = { email: emailProblem(email), password: password ? null : 'Enter your password' }
    setProblems(found)
    if (found.email || found.password) return focusFirstInvalid(event.currentTarget)
    if (await submit(() => signIn(email.trim(), password))) onSignedIn()
  }

  return (
    <form noValidate className="grid gap-5" onSubmit={(event) => void onSubmit(event)}>
      {isUnconfirmed ? (
        <Banner tone="straw" title="Confirm your e-mail address first">
          <p>The link is in the mail we sent to {email}.</p>
          <ResendConfirmation email={email.trim()} next={next} />
        </Banner>
      ) : (
        form && <Banner tone="bad">{form}</Banner>
      )}
      <TextField
        label="E-mail address"
        type="email"
        name="email"
        autoComplete="username"
        value={email}
        error={problems.email ?? fields.email}
        onChange={(event) => setEmail(event.target.value)}
      />
      <PasswordField
        label="Password"
        name="password"
        autoComplete="current-password"
        value={password}
        error={problems.password ?? fields.password}
        onChange={(event) => setPassword(event.target.value)}
      />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <Button type="submit" variant="primary" isBusy={isBusy}>
          Sign in
        </Button>
        <Link to={paths.forgotPassword} className="text-sm font-semibold text-steel underline">
          Forgotten password
        </Link>
      </div>
    </form>
  )
}
