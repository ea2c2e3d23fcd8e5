/** The bench on a phone: one column to read the layout, its findings and its schedule. */
import { useMemo } from 'react'
import { PresenceOverlay } from '@/features/collaboration/presence-overlay'
import { Diagrams } from '@/features/editor/diagrams/diagrams'
import { Drawing } from '@/features/editor/drawing'
import { EndView } from '@/features/editor/end-view/end-view'
import { Inspector } from '@/features/editor/inspector/inspector'
import { FindingsAnnouncer } from '@/features/results/findings-announcer'
import { VerdictStrip } from '@/features/results/verdict-strip'
import { useLayoutStore } from '@/stores/layout-store'
import { BenchBar } from './bench-bar'
import { BenchMessages } from './bench-messages'
import { OpenDerivation } from './open-derivation'
import { BenchTables, TABLE_TABS, type TableTab } from './bench-tables'

export function NarrowBench({ layoutId }: { layoutId: string }) {
  const document = useLayoutStore((state) => state.visible)

  const tabs = useMemo<TableTab[]>(() => {
    if (!document) return []
    const tables = new Map(TABLE_TABS.map((tab) => [tab.id, tab]))
    const ordered = ['findings', 'schedule', 'load-cases', 'sections', 'assembly'].flatMap(
      (id) => tables.get(id) ?? [],
    )
    return [
      ...ordered.slice(0, 2),
      { id: 'selected', label: 'Selected', content: <Inspector /> },
      {
        id: 'diagrams',
        label: 'Diagrams',
        content: (
          <div className="flex h-72">
            <Diagrams />
          </div>
        ),
      },
      { id: 'end-view', label: 'End view', content: <EndView document={document} /> },
      ...ordered.slice(2),
    ]
  }, [document])

  if (!document) return null
  return (
    <div className="flex min-h-dvh flex-col">
      <div className="sticky top-0 z-30">
        <BenchBar layoutId={layoutId} />
      </div>
      <BenchMessages layoutId={layoutId} />
      <main className="flex flex-col">
        <VerdictStrip />
        <div className="flex h-[42dvh] min-h-64 border-y border-hairline">
          <Drawing document={document} letsPageScroll overlay={(place) => <PresenceOverlay {...place} />} />
        </div>
        <BenchTables tabs={tabs} panelClassName="relative min-h-64 overflow-x-auto" />
      </main>
      <FindingsAnnouncer />
      <OpenDerivation />
    </div>
  )
}
