/**
 * What a manager confirms. The revision is taken when the dialog opens: an edit that arrives while
 * it is open has to be looked at first.
 */
import { useId, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Dialog } from '@/components/dialog'
import { TextAreaField } from '@/components/text-area-field'
import { showToast } from '@/components/toast-store'
import { HttpError, messageOf } from '@/lib/http-client'
import { useLayoutStore } from '@/stores/layout-store'
import { useResultsStore } from '@/stores/results-store'
import { type Acceptance, acceptanceSchema, findingKey } from '@shared/protocol/releases'
import type { Finding } from '@shared/recalculation/layout-results'
import { useFreezeLayout } from '../api/change-status'
import { AcceptanceField } from './acceptance-field'

export function FreezeDialog({
  workspaceId,
  layoutId,
  letter,
  onClose,
}: {
  workspaceId: string
  layoutId: string
  letter: string
  onClose: () => void
}) {
  const revision = useLayoutStore((state) => state.revision)
  const pendingCount = useLayoutStore((state) => state.pending.length)
  const peopleCount = useLayoutStore((state) => new Set(state.people.map((person) => person.userId)).size)
  const document = useResultsStore((state) => state.document)
  const findings = useResultsStore((state) => state.results?.findings)
  const isStale = useResultsStore((state) => state.isStale)
  const [seenRevision, setSeenRevision] = useState(revision)
  const [reasons, setReasons] = useState<Record<string, string>>({})
  const [problems, setProblems] = useState<Record<string, string>>({})
  const [note, setNote] = useState('')
  const formId = useId()
  const freeze = useFreezeLayout(workspaceId, layoutId)

  const failing = failingOnce(findings ?? [])
  const isWaiting = pendingCount > 0 || isStale || findings === undefined
  const hasMoved = revision !== seenRevision

  const submit = () => {
    const acceptances = failing.map((finding) => acceptanceOf(finding, reasons[findingKey(finding)] ?? ''))
    const found = problemsOf(acceptances)
    setProblems(found)
    if (Object.keys(found).length > 0) {
      focusFirst(formId)
      return
    }
    freeze.mutate(
      { revision: seenRevision, acceptances, note: note.trim() },
      {
        onSuccess: (release) => {
          showToast(`Revision ${release.revisionLetter} is frozen. The team gets an e-mail.`)
          onClose()
        },
        onError: (error) => setProblems(fieldsOf(error, acceptances)),
      },
    )
  }

  return (
    <Dialog
      title={`Freeze revision ${letter}`}
      size={failing.length > 0 ? 'lg' : 'md'}
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button
            variant="primary"
            type="submit"
            form={formId}
            isBusy={freeze.isPending}
            disabled={isWaiting || hasMoved}
          >
            Freeze revision {letter}
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
          submit()
        }}
      >
        {freeze.error && <Banner tone="bad">{messageOf(freeze.error)}</Banner>}
        {hasMoved && (
          <Banner
            tone="straw"
            title="The layout was edited while this was open"
            action={
              <Button size="sm" onClick={() => setSeenRevision(revision)}>
                I have looked at it
              </Button>
            }
          >
            Look at the newest state before you freeze it. Your reasons are kept.
          </Banner>
        )}
        {isWaiting && !hasMoved && (
          <Banner tone="steel">
            {pendingCount > 0 ? 'Waiting until your edits are saved.' : 'Waiting for the recalculation.'}
          </Banner>
        )}
        <div>
          <p className="font-semibold">What happens</p>
          <ul className="mt-1 list-disc space-y-1 pl-5">
            <li>The server recalculates and stores layout, results, engine version and hash for good.</li>
            <li>
              The layout can only be read from then on, at once for {audienceWords(peopleCount)}. Edits that
              arrive later are refused and kept for whoever made them.
            </li>
            <li>The release sheet is ready as PDF, and the team gets an e-mail.</li>
          </ul>
        </div>
        {document !== null && failing.length > 0 && (
          <fieldset className="grid gap-4">
            <legend className="mb-2 font-semibold">
              {failing.length === 1 ? 'One finding fails' : `${failing.length} findings fail`}. Accept each
              with a reason, or cancel and mend it.
            </legend>
            {failing.map((finding) => {
              const key = findingKey(finding)
              return (
                <AcceptanceField
                  key={key}
                  finding={finding}
                  document={document}
                  reason={reasons[key] ?? ''}
                  error={problems[key]}
                  onChange={(reason) => {
                    setReasons({ ...reasons, [key]: reason })
                    const { [key]: _solved, ...others } = problems
                    setProblems(others)
                  }}
                />
              )
            })}
          </fieldset>
        )}
        {failing.length === 0 && findings !== undefined && (
          <p className="font-semibold text-good">No finding fails.</p>
        )}
        <TextAreaField
          label="Note on the release"
          hint="Optional; printed on the sheet"
          value={note}
          maxLength={1000}
          rows={2}
          onChange={(event) => setNote(event.target.value)}
        />
      </form>
    </Dialog>
  )
}

const audienceWords = (count: number) =>
  count > 2 ? `all ${count} people in it` : count === 2 ? 'both people in it' : 'everyone'

/** Two findings of one code at one place in one case are accepted together. */
function failingOnce(findings: readonly Finding[]): Finding[] {
  const failing = findings.filter((finding) => finding.severity === 'fails')
  return [...new Map(failing.map((finding) => [findingKey(finding), finding])).values()]
}

const acceptanceOf = ({ code, part, loadCase }: Finding, reason: string): Acceptance => ({
  code,
  part,
  loadCase,
  reason: reason.trim(),
})

function problemsOf(acceptances: readonly Acceptance[]): Record<string, string> {
  const problems: Record<string, string> = {}
  for (const acceptance of acceptances) {
    const message = acceptanceSchema.safeParse(acceptance).error?.issues[0]?.message
    if (message) problems[findingKey(acceptance)] = message
  }
  return problems
}

/** The server names findings by their key, and parts of the body by their place in it. */
function fieldsOf(error: unknown, acceptances: readonly Acceptance[]): Record<string, string> {
  if (!(error instanceof HttpError)) return {}
  return Object.fromEntries(
    Object.entries(error.fields).map(([field, message]) => {
      const place = /^acceptances\.(\d+)\./.exec(field)?.[1]
      const acceptance = place === undefined ? undefined : acceptances[Number(place)]
      return [acceptance ? findingKey(acceptance) : field, message]
    }),
  )
}

function focusFirst(formId: string): void {
  // The fields learn of their errors with the next rendering.
  requestAnimationFrame(() => {
    document.getElementById(formId)?.querySelector<HTMLElement>('[aria-invalid=true]')?.focus()
  })
}
