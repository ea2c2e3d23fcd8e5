/** The tools at the left of the drawing. Arrow keys move between them; a person who only reads sees only reading tools. */
import { type KeyboardEvent, useRef } from 'react'
import type { Hub } from '@shared/layout/layout-document'
import { useLayoutStore } from '@/stores/layout-store'
import { actionById } from '../actions/all-actions'
import { TOOLS } from '../actions/tool-actions'
import { useBenchActions } from '../bench-actions'
import { useToolStore } from '../tool-store'
import { READING_TOOLS } from '../tools/tool-runner'
import { ToolIcon } from './tool-icon'

const HUB_ROLES: { role: Hub['role']; label: string }[] = [
  { role: 'gear', label: 'Gear' },
  { role: 'cam', label: 'Cam' },
  { role: 'pulley', label: 'Pulley' },
  { role: 'disc', label: 'Disc' },
  { role: 'ring', label: 'Ring' },
  { role: 'other', label: 'Other hub' },
]

export function ToolList() {
  const list = useRef<HTMLDivElement>(null)
  const toolId = useToolStore((state) => state.toolId)
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  const { run } = useBenchActions()
  const tools = TOOLS.filter(({ id }) => canEdit || READING_TOOLS.includes(id))

  const onKeyDown = (event: KeyboardEvent) => {
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0
    if (step === 0) return
    event.preventDefault()
    const index = tools.findIndex(({ id }) => id === toolId)
    const next = (index + step + tools.length) % tools.length
    const tool = tools[next]
    if (!tool) return
    run(actionById(`tool-${tool.id}`))
    list.current?.querySelectorAll<HTMLElement>('[role=radio]')[next]?.focus()
  }

  return (
    <div className="absolute top-9 left-3 z-10 flex flex-col gap-2 max-md:hidden">
      <div
        ref={list}
        role="radiogroup"
        aria-label="Tools"
        className="flex flex-col rounded-lg border border-hairline bg-card p-1"
        onKeyDown={onKeyDown}
      >
        {tools.map(({ id, label, key, help }) => {
          const isChosen = id === toolId
          return (
            <button
              key={id}
              type="button"
              role="radio"
              aria-checked={isChosen}
              tabIndex={isChosen ? 0 : -1}
              title={`${help} (${key.toUpperCase()})`}
              className={`flex items-center gap-2 rounded px-2 py-1.5 text-[13px] font-semibold ${
                isChosen ? 'bg-ink text-paper' : 'text-ink hover:bg-steel-soft'
              }`}
              onClick={() => run(actionById(`tool-${id}`))}
            >
              <ToolIcon id={id} />
              {label}
            </button>
          )
        })}
      </div>
      {toolId === 'hub' && <HubRoleChoice />}
    </div>
  )
}

function HubRoleChoice() {
  const hubRole = useToolStore((state) => state.hubRole)
  const setHubRole = useToolStore((state) => state.setHubRole)
  return (
    <label className="flex flex-col gap-0.5 rounded-lg border border-hairline bg-card px-2 py-1.5 text-xs font-semibold text-quiet">
      Hub is a
      <select
        value={hubRole}
        className="w-full rounded border border-hairline bg-card py-0.5 text-[13px] text-ink"
        onChange={(event) => {
          const chosen = HUB_ROLES.find(({ role }) => role === event.target.value)
          if (chosen) setHubRole(chosen.role)
        }}
      >
        {HUB_ROLES.map(({ role, label }) => (
          <option key={role} value={role}>
            {label}
          </option>
        ))}
      </select>
    </label>
  )
}
