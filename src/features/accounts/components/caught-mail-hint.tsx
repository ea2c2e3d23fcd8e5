import { useEffect, useState } from 'react'
import { Link } from 'react-router'
import { paths } from '@/config/paths'
import { request } from '@/lib/http-client'

/** Only where mail is caught on this machine instead of being sent. */
export function CaughtMailHint() {
  const [isCatching, setIsCatching] = useState(false)
  useEffect(() => {
    const controller = new AbortController()
    request('/api/caught-mail', { signal: controller.signal }).then(
      () => setIsCatching(true),
      () => setIsCatching(false),
    )
    return () => controller.abort()
  }, [])
  if (!isCatching) return null
  return (
    <p className="text-sm text-quiet">
      Mail is caught on this machine:{' '}
      <Link to={paths.caughtMail} className="font-semibold text-steel underline">
        open the caught mail
      </Link>
      .
    </p>
  )
}
