/** Small drawings for the tools, on the 16 px grid of the icons. */
import type { ToolId } from '../tools/tool'

const PATHS: Record<ToolId, string> = {
  select: 'M3.5 2.5 12 8l-3.8.9L6.4 12.8z',
  section: 'M1.5 10.5V5.5h4v-2h5v2h4v5h-4v2h-5v-2z',
  hub: 'M4 2h8v4H4zM4 10h8v4H4zM1.5 8h13M6 6l4-4M8.5 6 12 2.8',
  bearing: 'M2.5 2.5h11v11h-11zM8 10.8a2.8 2.8 0 1 0 0-5.6 2.8 2.8 0 0 0 0 5.6z',
  load: 'M8 2v9M5 8.2 8 11.5l3-3.3M2.5 14h11',
  measure: 'M2 4.5v7M14 4.5v7M2 8h12M4.5 6 2 8l2.5 2M11.5 6 14 8l-2.5 2',
  pan: 'M8 1.8v12.4M1.8 8h12.4M6 3.6 8 1.6l2 2M6 12.4l2 2 2-2M3.6 6l-2 2 2 2M12.4 6l2 2-2 2',
}

export function ToolIcon({ id }: { id: ToolId }) {
  return (
    <svg viewBox="0 0 16 16" className="size-4 shrink-0" aria-hidden="true" focusable="false">
      <path
        d={PATHS[id]}
        fill="none"
        stroke="currentColor"
        strokeWidth="1.4"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  )
}
