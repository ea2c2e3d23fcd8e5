import { type FormEvent, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { TextField } from '@/components/text-field'
import { HttpError, messageOf } from '@/lib/http-client'
import { useCreateWorkspace } from '../api/create-workspace'

export function CreateWorkspaceForm({ onCreated }: { onCreated: (workspaceId: string) => void }) {
  const [name, setName] = useState('')
  const [isEmptyRefused, setIsEmptyRefused] = useState(false)
  const { mutate, isPending, error } = useCreateWorkspace()
  const fieldError =
    isEmptyRefused && !name.trim()
      ? 'Give the workspace a name'
      : error instanceof HttpError
        ? error.fields.name
        : undefined

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
      {error && !fieldError && <Banner tone="bad">{messageOf(error)}</Banner>}
      <Button type="submit" variant="primary" isBusy={isPending} className="w-fit">
        Create workspace
      </Button>
    </form>
  )
}
