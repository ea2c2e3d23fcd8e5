import { type FormEvent, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { TextField } from '@/components/text-field'
import { formErrors } from '@/lib/form-errors'
import { useCreateWorkspace } from '../api/create-workspace'

export function CreateWorkspaceForm({ onCreated }: { onCreated: (workspaceId: string) => void }) {
  const [name, setName] = useState('')
  const [isEmptyRefused, setIsEmptyRefused] = useState(false)
  const { mutate, isPending, error } = useCreateWorkspace()
  const { fields, form } = formErrors(error, ['name'])
  const fieldError = isEmptyRefused && !name.trim() ? 'Give the workspace a name' : fields.name

  const submit = (event: FormEvent) => {
    event.preventDefault()
    if (!name.trim()) return setIsEmptyRefused(true)
    mutate(name.trim(), { onSuccess: ({ id }) => onCreated(id) })
  }

  return (
    <form noValidate className="grid gap-4" onSubmit={submit}>
      <TextField
        label="Name of the workspace"
        hint="Usually the company or the team. Layouts, releases and people belong to it."
        value={name}
        maxLength={80}
        autoComplete="organization"
        error={fieldError}
        onChange={(event) => setName(event.target.value)}
      />
      {form && <Banner tone="bad">{form}</Banner>}
      <Button type="submit" variant="primary" isBusy={isPending} className="w-fit">
        Create workspace
      </Button>
    </form>
  )
}
