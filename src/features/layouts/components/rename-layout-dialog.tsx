import { type FormEvent, useId, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Dialog } from '@/components/dialog'
import { TextField } from '@/components/text-field'
import { formErrors } from '@/lib/form-errors'
import type { LayoutSummary } from '@shared/protocol/layouts'
import { useUpdateLayout } from '../api/change-layouts'
import { ProjectField } from './project-field'

export function RenameLayoutDialog({ layout, onClose }: { layout: LayoutSummary; onClose: () => void }) {
  const [name, setName] = useState(layout.name)
  const [project, setProject] = useState(layout.project ?? '')
  const { mutate, isPending, error } = useUpdateLayout(layout.workspaceId, layout.id)
  const formId = useId()
  const isFrozen = layout.status === 'released' || layout.status === 'withdrawn'
  const { fields, form } = formErrors(error, ['name', 'project'])

  const submit = (event: FormEvent) => {
    event.preventDefault()
    if (!name.trim()) return
    mutate(
      {
        // The name stands in the document, so that a released one keeps it.
        ...(name.trim() === layout.name ? {} : { name: name.trim() }),
        project: project.trim() || null,
      },
      { onSuccess: onClose },
    )
  }

  return (
    <Dialog
      title="Rename and project"
      size="sm"
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" form={formId} variant="primary" isBusy={isPending}>
            Save
          </Button>
        </>
      }
    >
      <form id={formId} noValidate className="grid gap-4" onSubmit={submit}>
        {form && <Banner tone="bad">{form}</Banner>}
        <TextField
          label="Name"
          value={name}
          maxLength={120}
          disabled={isFrozen}
          hint={isFrozen ? 'A released revision keeps its name.' : undefined}
          error={name.trim() ? fields.name : 'Give the layout a name'}
          onChange={(event) => setName(event.target.value)}
        />
        <ProjectField
          workspaceId={layout.workspaceId}
          value={project}
          error={fields.project}
          onChange={setProject}
        />
      </form>
    </Dialog>
  )
}
