import { useQueryClient } from '@tanstack/react-query'
import { type FormEvent, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { PasswordField } from '@/components/password-field'
import { showToast } from '@/components/toast-store'
import { queryKeys } from '@/lib/query-keys'
import { changePassword } from '../api/auth-endpoints'
import { MIN_PASSWORD_LENGTH, newPasswordProblem } from '../field-rules'
import { formErrors } from '@/lib/form-errors'
import { focusFirstInvalid } from '@/lib/focus-first-invalid'
import { useSubmission } from '../hooks/use-submission'

export function ChangePasswordForm() {
  const [current, setCurrent] = useState('')
  const [fresh, setFresh] = useState('')
  const [problems, setProblems] = useState<{ current?: string | null; fresh?: string | null }>({})
  const { isBusy, error, submit } = useSubmission()
  const { fields, form } = formErrors(error, ['currentPassword', 'newPassword'])
  const queryClient = useQueryClient()

  const onSubmit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const found = {
      current: current ? null : 'Enter your present password',
      fresh: newPasswordProblem(fresh),
    }
    setProblems(found)
    if (found.current || found.fresh) return focusFirstInvalid(event.currentTarget)
    if (!(await submit(() => changePassword(current, fresh)))) return
    setCurrent('')
    setFresh('')
    showToast('Password changed; other devices were signed out')
    void queryClient.invalidateQueries({ queryKey: queryKeys.sessions })
  }

  return (
    <form noValidate className="grid gap-4" onSubmit={(event) => void onSubmit(event)}>
      {form && <Banner tone="bad">{form}</Banner>}
      <PasswordField
        label="Present password"
        autoComplete="current-password"
        value={current}
        error={problems.current ?? fields.currentPassword}
        onChange={(event) => setCurrent(event.target.value)}
      />
      <PasswordField
        label="New password"
        hint={`At least ${MIN_PASSWORD_LENGTH} characters. Other devices are signed out.`}
        autoComplete="new-password"
        value={fresh}
        error={problems.fresh ?? fields.newPassword}
        onChange={(event) => setFresh(event.target.value)}
      />
      <Button type="submit" isBusy={isBusy} className="w-fit">
        Change password
      </Button>
    </form>
  )
}
