import { type FormEvent, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { TextField } from '@/components/text-field'
import { showToast } from '@/components/toast-store'
import { formErrors } from '@/lib/form-errors'
import { useRenameWorkspace } from '../api/rename-workspace'

export function WorkspaceNameForm({ workspaceId, name: storedName }: { workspaceId: string; name: string }) {
  const [name, setName] = useState(storedName)
  const { mutate, isPending, error } = useRenameWorkspace(workspaceId)
  const { fields, form } = formErrors(error, ['name'])

  const submit = (event: FormEvent) => {
    event.preventDefault()
    if (name.trim()) mutate(name.trim(), { onSuccess: () => showToast('Workspace renamed') })
  }

  return (
    <section className="mt-10 border-t border-hairline pt-6">
      <h2 className="mb-4 text-lg font-bold">Workspace</h2>
      <form noValidate className="grid max-w-md gap-4" onSubmit={submit}>
        {form && <Banner tone="bad">{form}</Banner>}
        <TextField
          label="Name of the workspace"
          value={name}
          maxLength={80}
          error={name.trim() ? fields.name : 'Give the workspace a name'}
          onChange={(event) => setName(event.target.value)}
        />
        <Button type="submit" isBusy={isPending} disabled={name.trim() === storedName} className="w-fit">
          Save name
        </Button>
      </form>
    </section>
  )
}
