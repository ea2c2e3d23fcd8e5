/** Everything that must be said above the drawing: frozen, read only, refused edits, notices. */
import { Notices } from '@/features/collaboration/notices'
import { RefusedEdits } from '@/features/collaboration/refused-edits'
import { FrozenBanner } from '@/features/releases/frozen-banner'
import { useLayoutStore } from '@/stores/layout-store'
import { Icon } from '@/components/icon'

export function BenchMessages({ layoutId }: { layoutId: string }) {
  const role = useLayoutStore((state) => state.access?.role ?? null)
  const status = useLayoutStore((state) => state.access?.status ?? null)
  const isReader = (role === 'viewer' || role === 'shop') && (status === 'draft' || status === 'inReview')
  return (
    <>
      <FrozenBanner layoutId={layoutId} />
      {isReader && (
        <p className="flex items-center gap-2 border-b border-hairline bg-steel-soft px-4 py-1.5 text-[13px]">
          <Icon name="eye" className="size-3.5" />
          You are reading. Designers and managers can change this layout; you see their edits as they happen.
        </p>
      )}
      <div className="pointer-events-none fixed inset-x-0 bottom-4 z-40 mx-auto flex w-full max-w-xl flex-col gap-2 px-4 *:pointer-events-auto">
        <RefusedEdits />
        <Notices />
      </div>
    </>
  )
}
