import { type FormEvent, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { TextField } from '@/components/text-field'
import { showToast } from '@/components/toast-store'
import { useUpdateName } from '../api/update-name'
import { nameProblem } from '../field-rules'
import { formErrors } from '@/lib/form-errors'

export function NameForm({ name: storedName, email }: { name: string; email: string }) {
  const [name, setName] = useState(storedName)
  const { mutate, isPending, error } = useUpdateName()
  const { fields, form } = formErrors(error, ['name'])
  const problem = nameProblem(name)

  const submit = (event: FormEvent) => {
    event.preventDefault()
    if (!problem) mutate(name.trim(), { onSuccess: () => showToast('Name saved') })
  }

  return (
    <form noValidate className="grid gap-4" onSubmit={submit}>
      {form && <Banner tone="bad">{form}</Banner>}
      <TextField
        label="Name"
        hint="Colleagues see it beside your edits and on release sheets."
        autoComplete="name"
        maxLength={80}
        value={name}
        error={problem ?? fields.name}
        onChange={(event) => setName(event.target.value)}
      />
      <TextField label="E-mail address" value={email} readOnly disabled />
      <Button
        type="submit"
        variant="primary"
        isBusy={isPending}
        disabled={name.trim() === storedName}
        className="w-fit"
      >
        Save name
      </Button>
    </form>
  )
}
