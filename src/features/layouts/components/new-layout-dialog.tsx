import { type FormEvent, useId, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Dialog } from '@/components/dialog'
import { SegmentedControl } from '@/components/segmented-control'
import { TextField } from '@/components/text-field'
import { formErrors } from '@/lib/form-errors'
import { focusFirstInvalid } from '@/lib/focus-first-invalid'
import type { CreateLayoutBody, LayoutSummary } from '@shared/protocol/layouts'
import { useCreateLayout } from '../api/change-layouts'
import type { ReadLayoutFile } from '../read-layout-file'
import { ExampleChoice } from './example-choice'
import { ImportLayout } from './import-layout'
import { ProjectField } from './project-field'

export type NewLayoutSource = 'blank' | 'example' | 'file'

const SOURCES = [
  { value: 'blank', label: 'Blank' },
  { value: 'example', label: 'From an example' },
  { value: 'file', label: 'From a file' },
] as const

interface NewLayoutDialogProps {
  workspaceId: string
  initialSource: NewLayoutSource
  /** A file dropped on the page. */
  initialFile: ReadLayoutFile | null
  onCreated: (layout: LayoutSummary) => void
  onClose: () => void
}

export function NewLayoutDialog(props: NewLayoutDialogProps) {
  const { workspaceId, initialSource, initialFile, onCreated, onClose } = props
  const [source, setSource] = useState<NewLayoutSource>(initialSource)
  const [name, setName] = useState('')
  const [project, setProject] = useState('')
  const [exampleId, setExampleId] = useState<string | null>(null)
  const [read, setRead] = useState(initialFile)
  const [problem, setProblem] = useState<string | null>(null)
  const { mutate, reset, isPending, error } = useCreateLayout(workspaceId)
  const formId = useId()
  const { fields, form } = formErrors(error, ['name', 'project'])

  const choose = (change: () => void) => {
    change()
    setProblem(null)
    reset()
  }

  const origin = (): CreateLayoutBody['from'] | string => {
    if (source === 'blank') return name.trim() ? { kind: 'blank' } : 'Give the layout a name'
    if (source === 'example') return exampleId ? { kind: 'example', exampleId } : 'Choose one of the examples'
    if (!read) return 'Choose a file first'
    return read.ok ? { kind: 'file', content: read.content } : 'Mend the file, or choose another one'
  }

  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const from = origin()
    if (typeof from === 'string') {
      setProblem(from)
      return focusFirstInvalid(event.currentTarget)
    }
    mutate(
      { name: name.trim() || undefined, project: project.trim() || null, from },
      { onSuccess: onCreated },
    )
  }
  const nameHint =
    source === 'blank'
      ? undefined
      : `Leave empty to take the name ${source === 'file' ? 'in the file' : 'of the example'}.`
  const isNameProblem = source === 'blank' && problem !== null && !name.trim()

  return (
    <Dialog
      title="New layout"
      size={source === 'example' ? 'lg' : 'md'}
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" form={formId} variant="primary" isBusy={isPending}>
            {source === 'file' ? 'Import layout' : 'Create layout'}
          </Button>
        </>
      }
    >
      <form id={formId} noValidate className="grid gap-5" onSubmit={submit}>
        <SegmentedControl
          label="Start"
          isLabelHidden
          options={SOURCES}
          value={source}
          onChange={(value) => choose(() => setSource(value))}
        />
        {source === 'example' && (
          <ExampleChoice value={exampleId} onChange={(id) => choose(() => setExampleId(id))} />
        )}
        {source === 'file' && (
          <ImportLayout read={read} error={error} onRead={(file) => choose(() => setRead(file))} />
        )}
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField
            label="Name"
            hint={nameHint}
            value={name}
            maxLength={120}
            error={isNameProblem ? problem : fields.name}
            onChange={(event) => setName(event.target.value)}
          />
          <ProjectField
            workspaceId={workspaceId}
            value={project}
            error={fields.project}
            onChange={setProject}
          />
        </div>
        {problem && !isNameProblem && <Banner tone="bad">{problem}</Banner>}
        {form && source !== 'file' && <Banner tone="bad">{form}</Banner>}
      </form>
    </Dialog>
  )
}
