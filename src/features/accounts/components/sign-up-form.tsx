import { type FormEvent, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { PasswordField } from '@/components/password-field'
import { TextField } from '@/components/text-field'
import { signUp } from '../api/auth-endpoints'
import { emailProblem, MIN_PASSWORD_LENGTH, nameProblem, newPasswordProblem } from '../field-rules'
import { formErrors } from '@/lib/form-errors'
import { focusFirstInvalid } from '@/lib/focus-first-invalid'
import { useSubmission } from '../hooks/use-submission'

export function SignUpForm({
  next,
  initialEmail,
  onSignedUp,
}: {
  next: string | null
  initialEmail: string
  onSignedUp: (email: string) => void
}) {
  const [values, setValues] = useState({ name: '', email: initialEmail, password: '' })
  const [problems, setProblems] = useState<Partial<Record<keyof typeof values, string | null>>>({})
  const { isBusy, error, submit } = useSubmission()
  const { fields, form } = formErrors(error, ['name', 'email', 'password'])
  const set = (change: Partial<typeof values>) => setValues({ ...values, ...change })

  const onSubmit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const found = {
      name: nameProblem(values.name),
      email: emailProblem(values.email),
      password: newPasswordProblem(values.password),
    }
    setProblems(found)
    if (found.name || found.email || found.password) return focusFirstInvalid(event.currentTarget)
    const email = values.email.trim()
    if (await submit(() => signUp({ name: values.name.trim(), email, password: values.password }, next)))
      onSignedUp(email)
  }

  return (
    <form noValidate className="grid gap-5" onSubmit={(event) => void onSubmit(event)}>
      {form && <Banner tone="bad">{form}</Banner>}
      <TextField
        label="Your name"
        hint="Colleagues see it beside your edits."
        autoComplete="name"
        maxLength={80}
        value={values.name}
        error={problems.name ?? fields.name}
        onChange={(event) => set({ name: event.target.value })}
      />
      <TextField
        label="E-mail address"
        type="email"
        autoComplete="username"
        maxLength={254}
        value={values.email}
        error={problems.email ?? fields.email}
        onChange={(event) => set({ email: event.target.value })}
      />
      <PasswordField
        label="Password"
        hint={`At least ${MIN_PASSWORD_LENGTH} characters.`}
        autoComplete="new-password"
        value={values.password}
        error={problems.password ?? fields.password}
        onChange={(event) => set({ password: event.target.value })}
      />
      <Button type="submit" variant="primary" isBusy={isBusy} className="w-fit">
        Create account
      </Button>
    </form>
  )
}
