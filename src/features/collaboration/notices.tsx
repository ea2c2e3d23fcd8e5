/** What both people should know: a value was overwritten, a part had gone meanwhile. Stays until dismissed. */
import { Banner } from '@/components/banner'
import { IconButton } from '@/components/icon-button'
import { useLayoutSession } from '@/lib/layout-session-context'
import { useLayoutStore } from '@/stores/layout-store'

const MOST_SHOWN = 3

export function Notices() {
  const session = useLayoutSession()
  const notices = useLayoutStore((state) => state.notices)
  const storageFailure = useLayoutStore((state) => state.storageFailure)
  const hidden = notices.length - MOST_SHOWN
  return (
    <>
      {storageFailure !== null && <Banner tone="straw">{storageFailure}</Banner>}
      {notices.slice(-MOST_SHOWN).map((notice) => (
        <Banner
          key={notice.id}
          tone="straw"
          action={
            <IconButton icon="close" label="Dismiss" onClick={() => session.dismissNotice(notice.id)} />
          }
        >
          {notice.message}
        </Banner>
      ))}
      {hidden > 0 && (
        <p className="text-xs text-quiet">
          {hidden} earlier {hidden === 1 ? 'notice' : 'notices'}
        </p>
      )}
    </>
  )
}
