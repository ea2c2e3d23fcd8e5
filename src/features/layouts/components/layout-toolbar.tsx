import { Checkbox } from '@/components/checkbox'
import { Icon } from '@/components/icon'
import { SelectField } from '@/components/select-field'
import { TextField } from '@/components/text-field'
import { layoutStatusSchema } from '@shared/protocol/layouts'
import type { LayoutFilter } from '../arrange-layouts'
import { STATUS_NAMES } from '../status-texts'

const statusOptions = [
  { value: 'all', label: 'Any status' },
  ...layoutStatusSchema.options.map((status) => ({ value: status, label: STATUS_NAMES[status] })),
]
const sortOptions = [
  { value: 'edited', label: 'Last edit first' },
  { value: 'name', label: 'By name' },
  { value: 'verdict', label: 'Most failing first' },
]
/** Values of the project list; a colon keeps them apart from any project's own name. */
const ALL_PROJECTS = 'all:'
const NAMED = 'project:'

interface LayoutToolbarProps {
  filter: LayoutFilter
  isArchived: boolean
  projects: string[]
  setParameter: (name: string, value: string | null) => void
}

export function LayoutToolbar({ filter, isArchived, projects, setParameter }: LayoutToolbarProps) {
  const projectOptions = [
    { value: ALL_PROJECTS, label: 'All projects' },
    ...projects.map((project) => ({ value: NAMED + project, label: project })),
    { value: NAMED, label: 'Without project' },
  ]
  return (
    <div role="search" aria-label="Layouts" className="mb-6 flex flex-wrap items-center gap-3">
      <div className="relative min-w-52 flex-1 sm:max-w-72">
        <Icon
          name="search"
          className="pointer-events-none absolute top-1/2 left-3 size-4 -translate-y-1/2 text-quiet"
        />
        <TextField
          label="Search layouts"
          isLabelHidden
          type="search"
          placeholder="Search layouts"
          className="pl-9"
          value={filter.search}
          onChange={(event) => setParameter('search', event.target.value || null)}
        />
      </div>
      <SelectField
        label="Status"
        isLabelHidden
        options={statusOptions}
        value={filter.status}
        onValueChange={(status) => setParameter('status', status === 'all' ? null : status)}
      />
      {projects.length > 0 && (
        <SelectField
          label="Projects shown"
          isLabelHidden
          options={projectOptions}
          value={filter.project === null ? ALL_PROJECTS : NAMED + filter.project}
          onValueChange={(value) =>
            setParameter('project', value === ALL_PROJECTS ? null : value.slice(NAMED.length))
          }
        />
      )}
      <SelectField
        label="Order"
        isLabelHidden
        options={sortOptions}
        value={filter.sorting}
        onValueChange={(sorting) => setParameter('sort', sorting === 'edited' ? null : sorting)}
      />
      <Checkbox
        label="Archived"
        checked={isArchived}
        onCheckedChange={(isChecked) => setParameter('archived', isChecked ? 'true' : null)}
      />
    </div>
  )
}
