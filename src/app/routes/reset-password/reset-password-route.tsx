import { type FormEvent, useState } from 'react'
import { Link, useSearchParams } from 'react-router'
import { Banner } from '@/components/banner'
import { Button, buttonClasses } from '@/components/button'
import { PasswordField } from '@/components/password-field'
import { paths } from '@/config/paths'
import { resetPassword } from '@/features/accounts/api/auth-endpoints'
import { MIN_PASSWORD_LENGTH, newPasswordProblem } from '@/features/accounts/field-rules'
import { formErrors } from '@/lib/form-errors'
import { useSubmission } from '@/features/accounts/hooks/use-submission'
import { focusFirstInvalid } from '@/lib/focus-first-invalid'
import { usePageTitle } from '../../use-page-title'

export default function ResetPasswordRoute() {
  usePageTitle('New password')
  const [search] = useSearchParams()
  const token = search.get('token')
  const [password, setPassword] = useState('')
  const [problem, setProblem] = useState<string | null>(null)
  const [isDone, setIsDone] = useState(false)
  const { isBusy, error, submit } = useSubmission()
  const { fields, form } = formErrors(error, ['newPassword'])

  const onSubmit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const found = newPasswordProblem(password)
    setProblem(found)
    if (found) return focusFirstInvalid(event.currentTarget)
    if (token) setIsDone(await submit(() => resetPassword(token, password)))
  }

  if (!token)
    return (
      <div className="grid gap-5">
        <h1 className="text-3xl font-extrabold tracking-tight">This link does not work</h1>
        <p>It has expired or was used already. A new one takes a minute.</p>
        <Link to={paths.forgotPassword} className={`${buttonClasses('primary')} w-fit`}>
          Ask for a new link
        </Link>
      </div>
    )
  if (isDone)
    return (
      <div className="grid gap-5">
        <h1 className="text-3xl font-extrabold tracking-tight">New password set</h1>
        <p>All other devices were signed out.</p>
        <Link to={paths.signIn} className={`${buttonClasses('primary')} w-fit`}>
          Sign in
        </Link>
      </div>
    )
  return (
    <form noValidate className="grid gap-5" onSubmit={(event) => void onSubmit(event)}>
      <h1 className="text-3xl font-extrabold tracking-tight">Choose a new password</h1>
      {form && (
        <Banner tone="bad">
          {form}{' '}
          <Link to={paths.forgotPassword} className="font-semibold underline">
            Forgotten password
          </Link>
        </Banner>
      )}
      <PasswordField
        label="New password"
        hint={`At least ${MIN_PASSWORD_LENGTH} characters.`}
        autoComplete="new-password"
        value={password}
        error={problem ?? fields.newPassword}
        onChange={(event) => setPassword(event.target.value)}
      />
      <Button type="submit" variant="primary" isBusy={isBusy} className="w-fit">
        Set the password
      </Button>
    </form>
  )
}
