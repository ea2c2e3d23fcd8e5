import type { ReactNode } from 'react'
import { usePageTitle } from './use-page-title'

export function PageHeading({
  title,
  children,
  actions,
}: {
  title: string
  children?: ReactNode
  actions?: ReactNode
}) {
  usePageTitle(title)
  return (
    <div className="mb-6 flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
      <div>
        <h1 className="text-2xl font-extrabold tracking-tight">{title}</h1>
        {children && <p className="mt-1 text-quiet">{children}</p>}
      </div>
      {actions && <div className="flex flex-wrap gap-3">{actions}</div>}
    </div>
  )
}
