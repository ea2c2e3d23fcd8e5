/** Times for people, in their language's order and this device's time zone. */

const MINUTE_S = 60
const HOUR_S = 3_600
const DAY_S = 86_400
/** Beyond this a date is easier to place than a count of days. */
const AGO_LIMIT_S = 14 * DAY_S
const absolute = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' })
const dateOnly = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium' })
const relative = new Intl.RelativeTimeFormat('en-GB', { numeric: 'auto' })

export const formatDateTime = (iso: string): string => absolute.format(new Date(iso))

export const formatDate = (iso: string): string => dateOnly.format(new Date(iso))

/** "just now", "5 minutes ago", "yesterday", or the date. */
export function formatAgo(iso: string, now: number = Date.now()): string {
  const seconds = Math.round((now - Date.parse(iso)) / 1_000)
  if (seconds < MINUTE_S) return 'just now'
  if (seconds < HOUR_S) return relative.format(-Math.floor(seconds / MINUTE_S), 'minute')
  if (seconds < DAY_S) return relative.format(-Math.floor(seconds / HOUR_S), 'hour')
  if (seconds < AGO_LIMIT_S) return relative.format(-Math.floor(seconds / DAY_S), 'day')
  return formatDate(iso)
}

/** "5 minutes ago, 1 Dec 2026, 05:40": relative and absolute at once. */
export function formatAgoAndWhen(iso: string, now: number = Date.now()): string {
  const isRecent = now - Date.parse(iso) < AGO_LIMIT_S * 1_000
  return isRecent ? `${formatAgo(iso, now)}, ${formatDateTime(iso)}` : formatDateTime(iso)
}
