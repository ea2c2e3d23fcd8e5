import { useQuery } from '@tanstack/react-query'
import { useId } from 'react'
import { TextField } from '@/components/text-field'
import { layoutListQuery } from '../api/layout-list'
import { projectsOf } from '../arrange-layouts'

interface ProjectFieldProps {
  workspaceId: string
  value: string
  error?: string
  onChange: (project: string) => void
}

/** Free text that suggests the projects there are. */
export function ProjectField({ workspaceId, value, error, onChange }: ProjectFieldProps) {
  const { data: layouts = [] } = useQuery(layoutListQuery(workspaceId, false))
  const listId = useId()
  return (
    <>
      <TextField
        label="Project"
        hint="Layouts of one project stand together. Leave empty for none."
        value={value}
        maxLength={80}
        list={listId}
        autoComplete="off"
        error={error}
        onChange={(event) => onChange(event.target.value)}
      />
      <datalist id={listId}>
        {projectsOf(layouts).map((project) => (
          <option key={project} value={project} />
        ))}
      </datalist>
    </>
  )
}
