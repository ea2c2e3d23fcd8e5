import type { ReactNode } from 'react'

export function EmptyState({
  title,
  children,
  action,
  picture,
}: {
  title: string
  children?: ReactNode
  action?: ReactNode
  picture?: ReactNode
}) {
  return (
    <div className="mx-auto grid max-w-lg justify-items-center gap-3 px-6 py-14 text-center">
      {picture}
      <h2 className="text-lg font-bold">{title}</h2>
      {children && <div className="text-sm text-quiet">{children}</div>}
      {action && <div className="mt-2 flex flex-wrap justify-center gap-3">{action}</div>}
    </div>
  )
}
