/** The bench on a screen wide enough to work on: drawing in the middle, inspector right, tables below. */
import { useCallback, useRef } from 'react'
import { PresenceOverlay } from '@/features/collaboration/presence-overlay'
import { Diagrams } from '@/features/editor/diagrams/diagrams'
import { Drawing } from '@/features/editor/drawing'
import { EndView } from '@/features/editor/end-view/end-view'
import { Inspector } from '@/features/editor/inspector/inspector'
import { Outline } from '@/features/editor/outline/outline'
import { FindingsAnnouncer } from '@/features/results/findings-announcer'
import { VerdictStrip } from '@/features/results/verdict-strip'
import { useLayoutStore } from '@/stores/layout-store'
import { BenchBar } from './bench-bar'
import { BenchMessages } from './bench-messages'
import { useBenchRegions } from './bench-regions'
import { OpenDerivation } from './open-derivation'
import { BenchTables, TABLE_TABS } from './bench-tables'
import { RegionMenu } from './region-menu'
import { SplitHandle } from './split-handle'

export function BenchPage({ layoutId }: { layoutId: string }) {
  const document = useLayoutStore((state) => state.visible)
  const open = useBenchRegions((state) => state.open)
  const sizePx = useBenchRegions((state) => state.sizePx)
  const inspector = useRef<HTMLElement>(null)

  const openInspector = useCallback(() => {
    useBenchRegions.getState().show('inspector')
    // The region may only now be on its way into the page.
    requestAnimationFrame(() => {
      const field = inspector.current?.querySelector<HTMLElement>('input, select, button, [tabindex="0"]')
      ;(field ?? inspector.current)?.focus()
    })
  }, [])

  if (!document) return null
  return (
    <div className="flex h-dvh flex-col overflow-hidden [body:has([data-offline-banner])_&]:h-[calc(100dvh-2rem)]">
      <BenchBar layoutId={layoutId} />
      <BenchMessages layoutId={layoutId} />
      <main className="flex min-h-0 flex-1 flex-col">
        {/* Where there is little width the verdict runs over the inspector instead of breaking its line. */}
        <div className="grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)_auto_auto] grid-rows-[auto_minmax(0,1fr)]">
          <div className="col-span-3 border-b border-hairline xl:col-span-1">
            <VerdictStrip />
          </div>
          <div className="relative col-start-1 row-start-2 flex min-h-0">
            <Outline isOpen={open.outline} onOpenInspector={openInspector} />
            <div className="flex min-w-0 flex-1 flex-col">
              <Drawing
                document={document}
                viewExtras={<RegionMenu />}
                overlay={(place) => <PresenceOverlay {...place} />}
              />
              {open.diagrams && (
                <>
                  <SplitHandle region="diagrams" direction="row" label="Height of the diagrams" />
                  <div className="flex shrink-0" style={{ height: sizePx.diagrams }}>
                    <Diagrams />
                  </div>
                </>
              )}
            </div>
            {open.endView && (
              <div className="w-62 shrink-0 border-l border-hairline">
                <EndView document={document} />
              </div>
            )}
          </div>
          {open.inspector && (
            <>
              <div className="col-start-2 row-start-2 flex xl:row-span-2 xl:row-start-1">
                <SplitHandle region="inspector" direction="column" label="Width of the inspector" />
              </div>
              <aside
                ref={inspector}
                aria-label="Inspector"
                tabIndex={-1}
                className="relative col-start-3 row-start-2 overflow-y-auto bg-card xl:row-span-2 xl:row-start-1"
                style={{ width: sizePx.inspector }}
              >
                <Inspector />
              </aside>
            </>
          )}
        </div>
        {open.tables && (
          <>
            <SplitHandle region="tables" direction="row" label="Height of the tables" />
            <section
              aria-label="Tables"
              className="flex shrink-0 flex-col border-t-2 border-bar bg-card"
              style={{ height: sizePx.tables }}
            >
              <BenchTables tabs={TABLE_TABS} panelClassName="relative min-h-0 flex-1 overflow-auto" />
            </section>
          </>
        )}
      </main>
      <FindingsAnnouncer />
      <OpenDerivation />
    </div>
  )
}
