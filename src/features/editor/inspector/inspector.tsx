/** Numbers of what is selected, to read and to type. */
import type { ReactNode } from 'react'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useLayoutStore } from '@/stores/layout-store'
import { useSelectionStore } from '@/stores/selection-store'
import { BearingInspector } from './bearing-inspector'
import { HubInspector } from './hub-inspector'
import { LayoutInspector } from './layout-inspector'
import { SectionInspector } from './section-inspector'
import { SeveralInspector } from './several-inspector'

export function Inspector() {
  const layout = useLayoutStore((state) => state.visible)
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const units = usePreferencesStore((state) => state.units)
  if (layout === null) return null

  const isSelected = ({ id }: { id: string }) => selectedIds.includes(id)
  const hubs = layout.hubs.filter(isSelected)
  const bearings = layout.bearings.filter(isSelected)
  const sections = layout.shaft.sections.filter(isSelected)
  const [hub] = hubs
  const [bearing] = bearings
  const [section] = sections

  let content: ReactNode
  if (hubs.length + bearings.length + sections.length > 1) {
    content = (
      <SeveralInspector hubs={hubs} bearings={bearings} sections={sections} layout={layout} units={units} />
    )
  } else if (hub !== undefined)
    content = <HubInspector key={hub.id} hub={hub} layout={layout} units={units} />
  else if (bearing !== undefined)
    content = <BearingInspector key={bearing.id} bearing={bearing} layout={layout} units={units} />
  else if (section !== undefined)
    content = <SectionInspector key={section.id} section={section} layout={layout} units={units} />
  else content = <LayoutInspector layout={layout} units={units} />

  return <div className="px-4 py-3">{content}</div>
}
