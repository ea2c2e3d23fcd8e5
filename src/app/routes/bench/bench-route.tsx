/** The bench: opens the live layout, hands its session down, and composes the features on one page. */
import { useParams } from 'react-router'
import { EditorProvider } from '@/features/editor/editor-provider'
import { LayoutSessionProvider } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'
import { NotFound } from '../../not-found'
import { useIsNarrow } from '../../use-is-narrow'
import { usePageTitle } from '../../use-page-title'
import { BenchClosed, BenchOpening } from './bench-opening'
import { BenchPage } from './bench-page'
import { NarrowBench } from './narrow-bench'
import { useOpenLayout } from './use-open-layout'

export default function BenchRoute() {
  const { layoutId } = useParams()
  return layoutId === undefined ? <NotFound /> : <OpenBench key={layoutId} layoutId={layoutId} />
}

function OpenBench({ layoutId }: { layoutId: string }) {
  const session = useOpenLayout(layoutId)
  const isLoaded = useLayoutStore((state) => state.layoutId === layoutId && state.visible !== null)
  const name = useLayoutStore((state) => state.visible?.name)
  const refused = useLayoutStore((state) => (state.layoutId === layoutId ? state.refusedReason : null))
  const isNarrow = useIsNarrow()
  usePageTitle(name ?? 'Layout')

  if (session === null) return <BenchOpening />
  if (!isLoaded) return refused ? <BenchClosed {...refused} /> : <BenchOpening />
  return (
    <LayoutSessionProvider session={session}>
      <EditorProvider>
        {isNarrow ? <NarrowBench layoutId={layoutId} /> : <BenchPage layoutId={layoutId} />}
      </EditorProvider>
    </LayoutSessionProvider>
  )
}
