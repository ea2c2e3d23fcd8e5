import { type ReactNode, useEffect, useId, useRef } from 'react'
import { IconButton } from './icon-button'

interface DialogProps {
  title: string
  /** Quiet line under the title. */
  description?: ReactNode
  onClose: () => void
  children: ReactNode
  /** Buttons, right-aligned under the content. */
  footer?: ReactNode
  size?: 'sm' | 'md' | 'lg'
}

const WIDTHS = { sm: 'max-w-md', md: 'max-w-xl', lg: 'max-w-4xl' }

/**
 * Mounted means open. The browser's modal dialog keeps focus inside and gives it back to what opened it;
 * Escape closes. A press on the backdrop does not close: half-filled forms are too easily lost that way.
 */
export function Dialog({ title, description, onClose, children, footer, size = 'md' }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null)
  const titleId = useId()

  useEffect(() => {
    const element = dialog.current
    const opener = document.activeElement
    if (element && !element.open) element.showModal()
    return () => {
      element?.close()
      // React removes the element before the browser can restore focus by itself.
      if (opener instanceof HTMLElement && opener.isConnected) opener.focus()
    }
  }, [])

  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      className={`m-auto max-h-[calc(100dvh-2rem)] w-[calc(100%-2rem)] overflow-auto rounded-lg border border-hairline bg-card p-0 text-left font-normal whitespace-normal text-ink shadow-xl ${WIDTHS[size]}`}
      onCancel={(event) => {
        event.preventDefault()
        onClose()
      }}
      onKeyDown={(event) => {
        // Keys typed into a dialog are not shortcuts of the page under it.
        event.stopPropagation()
      }}
    >
      <div className="flex items-start justify-between gap-4 px-6 pt-5">
        <div>
          <h2 id={titleId} className="text-lg font-bold">
            {title}
          </h2>
          {description && <p className="mt-1 text-sm text-quiet">{description}</p>}
        </div>
        <IconButton icon="close" label="Close" onClick={onClose} className="-mr-2" />
      </div>
      <div className="px-6 pt-4 pb-6">{children}</div>
      {footer && (
        <div className="sticky bottom-0 flex flex-wrap justify-end gap-3 border-t border-hairline bg-card px-6 py-4">
          {footer}
        </div>
      )}
    </dialog>
  )
}
