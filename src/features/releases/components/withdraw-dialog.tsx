import { useId, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Dialog } from '@/components/dialog'
import { TextAreaField } from '@/components/text-area-field'
import { showToast } from '@/components/toast-store'
import { formErrors } from '@/lib/form-errors'
import { withdrawBodySchema } from '@shared/protocol/releases'
import { useWithdrawRelease } from '../api/change-status'

export function WithdrawDialog({
  workspaceId,
  releaseId,
  layoutName,
  letter,
  onClose,
}: {
  workspaceId: string
  releaseId: string
  layoutName: string
  letter: string
  onClose: () => void
}) {
  const [reason, setReason] = useState('')
  const [problem, setProblem] = useState<string | undefined>(undefined)
  const formId = useId()
  const withdraw = useWithdrawRelease(workspaceId, releaseId)
  const errors = formErrors(withdraw.error, ['reason'])
  return (
    <Dialog
      title={`Withdraw revision ${letter}`}
      description={layoutName}
      size="sm"
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button variant="danger" type="submit" form={formId} isBusy={withdraw.isPending}>
            Withdraw
          </Button>
        </>
      }
    >
      <form
        id={formId}
        noValidate
        className="grid gap-4 text-sm"
        onSubmit={(event) => {
          event.preventDefault()
          const parsed = withdrawBodySchema.safeParse({ reason })
          setProblem(parsed.error?.issues[0]?.message)
          if (!parsed.success) return
          withdraw.mutate(parsed.data.reason, {
            onSuccess: () => {
              showToast(`Revision ${letter} is withdrawn. The team gets an e-mail.`)
              onClose()
            },
          })
        }}
      >
        <p>
          The release stays readable and is marked as withdrawn, on its sheet too. The team gets an e-mail.
          This cannot be taken back.
        </p>
        {errors.form && <Banner tone="bad">{errors.form}</Banner>}
        <TextAreaField
          label="Reason"
          value={reason}
          maxLength={1000}
          error={problem ?? errors.fields.reason}
          onChange={(event) => {
            setReason(event.target.value)
            setProblem(undefined)
          }}
        />
      </form>
    </Dialog>
  )
}
