import { type FormEvent, useId, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Dialog } from '@/components/dialog'
import { SelectField } from '@/components/select-field'
import { TextField } from '@/components/text-field'
import { showToast } from '@/components/toast-store'
import { type Role, roleSchema, ROLES } from '@shared/protocol/roles'
import { useInvite } from '../api/people'
import { emailProblem } from '../field-rules'
import { formErrors } from '@/lib/form-errors'
import { focusFirstInvalid } from '@/lib/focus-first-invalid'
import { ROLE_DESCRIPTIONS, ROLE_NAMES } from '../role-texts'

const options = ROLES.map((role) => ({ value: role, label: ROLE_NAMES[role] }))

export function InviteDialog({ workspaceId, onClose }: { workspaceId: string; onClose: () => void }) {
  const [email, setEmail] = useState('')
  const [role, setRole] = useState<Role>('designer')
  const [problem, setProblem] = useState<string | null>(null)
  const { mutate, isPending, error } = useInvite(workspaceId)
  const { fields, form } = formErrors(error, ['email', 'role'])
  const formId = useId()

  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const found = emailProblem(email)
    setProblem(found)
    if (found) return focusFirstInvalid(event.currentTarget)
    const address = email.trim()
    mutate(
      { email: address, role },
      {
        onSuccess: () => {
          showToast(`Invitation sent to ${address}`)
          onClose()
        },
      },
    )
  }

  return (
    <Dialog
      title="Invite someone"
      description="They get a mail with a link that works for this address only."
      size="sm"
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" form={formId} variant="primary" isBusy={isPending}>
            Send invitation
          </Button>
        </>
      }
    >
      <form id={formId} noValidate className="grid gap-4" onSubmit={submit}>
        {form && <Banner tone="bad">{form}</Banner>}
        <TextField
          label="E-mail address"
          type="email"
          autoComplete="off"
          maxLength={254}
          value={email}
          error={problem ?? fields.email}
          onChange={(event) => setEmail(event.target.value)}
        />
        <SelectField
          label="Role"
          hint={ROLE_DESCRIPTIONS[role]}
          options={options}
          value={role}
          error={fields.role}
          onValueChange={(value) => setRole(roleSchema.parse(value))}
        />
      </form>
    </Dialog>
  )
}
