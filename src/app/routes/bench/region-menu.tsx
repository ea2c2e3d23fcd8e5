/** Which regions are on screen. */
import { Menu } from '@/components/menu'
import { type RegionId, useBenchRegions } from './bench-regions'

const REGIONS: { id: RegionId; label: string }[] = [
  { id: 'outline', label: 'Outline' },
  { id: 'endView', label: 'End view' },
  { id: 'diagrams', label: 'Diagrams' },
  { id: 'inspector', label: 'Inspector' },
  { id: 'tables', label: 'Tables' },
]

export function RegionMenu() {
  const open = useBenchRegions((state) => state.open)
  const toggle = useBenchRegions((state) => state.toggle)
  return (
    <Menu
      label="Regions on screen"
      buttonClassName="h-8 rounded px-2 text-[13px] font-semibold hover:bg-steel-soft"
      button="Show"
      items={REGIONS.map(({ id, label }) => ({
        kind: 'choice',
        label,
        isChosen: open[id],
        onSelect: () => toggle(id),
      }))}
    />
  )
}
