import { type FormEvent, useState } from 'react'
import { Link } from 'react-router'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { TextField } from '@/components/text-field'
import { paths } from '@/config/paths'
import { requestPasswordReset } from '@/features/accounts/api/auth-endpoints'
import { CaughtMailHint } from '@/features/accounts/components/caught-mail-hint'
import { emailProblem } from '@/features/accounts/field-rules'
import { formErrors } from '@/lib/form-errors'
import { useSubmission } from '@/features/accounts/hooks/use-submission'
import { focusFirstInvalid } from '@/lib/focus-first-invalid'
import { usePageTitle } from '../../use-page-title'

export default function ForgottenPasswordRoute() {
  usePageTitle('Forgotten password')
  const [email, setEmail] = useState('')
  const [problem, setProblem] = useState<string | null>(null)
  const [sentTo, setSentTo] = useState<string | null>(null)
  const { isBusy, error, submit } = useSubmission()
  const { fields, form } = formErrors(error, ['email'])

  const onSubmit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const found = emailProblem(email)
    setProblem(found)
    if (found) return focusFirstInvalid(event.currentTarget)
    if (await submit(() => requestPasswordReset(email.trim()))) setSentTo(email.trim())
  }

  return (
    <div className="grid gap-5">
      <h1 className="text-3xl font-extrabold tracking-tight">Forgotten password</h1>
      {sentTo ? (
        <>
          <p>
            If <strong>{sentTo}</strong> has an account, a mail with a link to choose a new password is on its
            way. The link works once and for a short time.
          </p>
          <CaughtMailHint />
        </>
      ) : (
        <form noValidate className="grid gap-5" onSubmit={(event) => void onSubmit(event)}>
          <p className="text-quiet">We send you a link to choose a new one.</p>
          {form && <Banner tone="bad">{form}</Banner>}
          <TextField
            label="E-mail address"
            type="email"
            autoComplete="username"
            value={email}
            error={problem ?? fields.email}
            onChange={(event) => setEmail(event.target.value)}
          />
          <Button type="submit" variant="primary" isBusy={isBusy} className="w-fit">
            Send the link
          </Button>
        </form>
      )}
      <Link to={paths.signIn} className="w-fit text-sm font-semibold text-steel underline">
        Back to sign-in
      </Link>
    </div>
  )
}
