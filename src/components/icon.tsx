import { LineDrawing, SIGN_PATHS } from './sign'

/** Line icons on a 16 px grid, drawn for this product. */
const PATHS = {
  ...SIGN_PATHS,
  add: 'M8 3v10M3 8h10',
  archive: 'M2.5 3.5h11v3h-11zM3.5 6.5v6.5h9V6.5M6.5 9h3',
  arrowDown: 'M8 3v10M4 9l4 4 4-4',
  arrowUp: 'M8 13V3M4 7l4-4 4 4',
  chevronDown: 'm4 6 4 4 4-4',
  chevronRight: 'm6 4 4 4-4 4',
  close: 'm4 4 8 8M12 4l-8 8',
  copy: 'M5.5 5.5h8v8h-8zM10.5 5.5v-3h-8v8h3',
  download: 'M8 2.5v7.5M4.5 7 8 10.5 11.5 7M3 13.5h10',
  edit: 'm3 13 .8-3L11 2.8l2.2 2.2L6 12.2zM9.5 4.3l2.2 2.2',
  eye: 'M1.5 8S4 3.5 8 3.5 14.5 8 14.5 8 12 12.5 8 12.5 1.5 8 1.5 8zM8 9.8a1.8 1.8 0 1 0 0-3.6 1.8 1.8 0 0 0 0 3.6z',
  folder: 'M1.5 4v9h13V5.5h-7L6 4z',
  lock: 'M3.5 7.5h9v6h-9zM5.5 7.5V5a2.5 2.5 0 0 1 5 0v2.5',
  mail: 'M1.5 3.5h13v9h-13zM1.5 4.5 8 9l6.5-4.5',
  menu: 'M2.5 4h11M2.5 8h11M2.5 12h11',
  more: 'M3 8h.01M8 8h.01M13 8h.01',
  people:
    'M6 7.5a2.5 2.5 0 1 0 0-5 2.5 2.5 0 0 0 0 5zM1.5 13.5c0-2.5 2-4 4.5-4s4.5 1.5 4.5 4M11 3a2.3 2.3 0 0 1 0 4.4M12.3 9.8c1.3.5 2.2 1.8 2.2 3.7',
  person: 'M8 7.5a2.75 2.75 0 1 0 0-5.5 2.75 2.75 0 0 0 0 5.5zM2.5 14c0-2.8 2.4-4.5 5.5-4.5s5.5 1.7 5.5 4.5',
  redo: 'M13 6.5H6a3.5 3.5 0 0 0 0 7h3M10 3l3.5 3.5L10 10',
  restore: 'M2.5 8a5.5 5.5 0 1 0 1.8-4M2.5 2v3h3',
  search: 'M7 12A5 5 0 1 0 7 2a5 5 0 0 0 0 10zM10.6 10.6 14 14',
  trash: 'M2.5 4.5h11M6 4.5v-2h4v2M4 4.5l.7 9h6.6l.7-9M6.7 7v4M9.3 7v4',
  undo: 'M3 6.5h7a3.5 3.5 0 0 1 0 7H7M6 3 2.5 6.5 6 10',
  upload: 'M8 10.5V3M4.5 6 8 2.5 11.5 6M3 13.5h10',
} as const

export type IconName = keyof typeof PATHS

export function Icon({ name, className = 'size-4' }: { name: IconName; className?: string }) {
  return <LineDrawing path={PATHS[name]} className={className} strokeWidth={name === 'more' ? 2.4 : 1.5} />
}
