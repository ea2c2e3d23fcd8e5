import type { ReactNode } from 'react'
import { Banner } from './banner'
import { Button } from './button'
import { Dialog } from './dialog'

interface ConfirmDialogProps {
  title: string
  children: ReactNode
  /** A verb: "Remove", "Archive". */
  confirmLabel: string
  isDangerous?: boolean
  isBusy?: boolean
  /** Why it did not work; the dialog stays open. */
  error?: string | null
  onConfirm: () => void
  onClose: () => void
}

export function ConfirmDialog(props: ConfirmDialogProps) {
  const {
    title,
    children,
    confirmLabel,
    isDangerous = false,
    isBusy = false,
    error,
    onConfirm,
    onClose,
  } = props
  return (
    <Dialog
      title={title}
      size="sm"
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button variant={isDangerous ? 'danger' : 'primary'} isBusy={isBusy} onClick={onConfirm}>
            {confirmLabel}
          </Button>
        </>
      }
    >
      <div className="grid gap-4 text-sm">
        {children}
        {error && <Banner tone="bad">{error}</Banner>}
      </div>
    </Dialog>
  )
}
