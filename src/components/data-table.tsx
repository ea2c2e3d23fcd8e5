import type { ComponentProps, ReactNode } from 'react'
import { classNames } from './class-names'
import { Icon } from './icon'

export interface Sorting<Key extends string> {
  key: Key
  direction: 'ascending' | 'descending'
}

/** Pressing the sorted column turns it round; another column starts ascending. */
export const nextSorting = <Key extends string>(current: Sorting<Key>, key: Key): Sorting<Key> => ({
  key,
  direction: current.key === key && current.direction === 'ascending' ? 'descending' : 'ascending',
})

export function DataTable({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="relative overflow-x-auto" tabIndex={0} role="region" aria-label={label}>
      <table className="w-full border-collapse text-sm">{children}</table>
    </div>
  )
}

const headClasses = 'px-3 py-2 text-xs font-semibold text-quiet whitespace-nowrap border-b border-hairline'

export function ColumnHead({
  align = 'left',
  className,
  ...rest
}: ComponentProps<'th'> & { align?: 'left' | 'right' }) {
  return (
    <th
      scope="col"
      className={classNames(headClasses, align === 'right' ? 'text-right' : 'text-left', className)}
      {...rest}
    />
  )
}

export function SortableColumnHead<Key extends string>({
  columnKey,
  sorting,
  onSort,
  align = 'left',
  children,
}: {
  columnKey: Key
  sorting: Sorting<Key>
  onSort: (sorting: Sorting<Key>) => void
  align?: 'left' | 'right'
  children: ReactNode
}) {
  const isSorted = sorting.key === columnKey
  return (
    <ColumnHead align={align} aria-sort={isSorted ? sorting.direction : 'none'}>
      <button
        type="button"
        className={classNames(
          'inline-flex items-center gap-1 rounded font-semibold hover:text-ink',
          isSorted && 'text-ink',
          align === 'right' && 'flex-row-reverse',
        )}
        onClick={() => onSort(nextSorting(sorting, columnKey))}
      >
        {children}
        <Icon
          name={isSorted && sorting.direction === 'descending' ? 'arrowDown' : 'arrowUp'}
          className={`size-3 ${isSorted ? '' : 'invisible'}`}
        />
      </button>
    </ColumnHead>
  )
}

export function Cell({
  align = 'left',
  className,
  ...rest
}: ComponentProps<'td'> & { align?: 'left' | 'right' }) {
  return (
    <td
      className={classNames(
        'border-b border-hairline px-3 py-2.5',
        align === 'right' && 'text-right',
        className,
      )}
      {...rest}
    />
  )
}
