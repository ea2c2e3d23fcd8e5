// @vitest-environment jsdom
import { QueryClientProvider } from '@tanstack/react-query'
import { cleanup, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { MemoryRouter, Route, Routes } from 'react-router'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { FrozenBanner } from '@/features/releases/frozen-banner'
import { ReleaseActions } from '@/features/releases/release-actions'
import { queryClient } from '@/lib/query-client'
import { EMPTY_LAYOUT_STATE, useLayoutStore } from '@/stores/layout-store'
import { useResultsStore } from '@/stores/results-store'
import flawedFile from '@server/demo/data/reducer-intermediate-shaft.demo.layout.json'
import { parseLayoutFile } from '@shared/layout/layout-file'
import type { LayoutStatus } from '@shared/protocol/layouts'
import { findingKey, type ReleaseSummary } from '@shared/protocol/releases'
import type { Role } from '@shared/protocol/roles'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { fakeApi, refusal } from '../../support/fake-api'

/** Wheel A slips in both load cases. */
const parsed = parseLayoutFile(flawedFile)
if (!parsed.ok) throw new Error('The demo layout is not readable')
const flawed = parsed.document
const failing = recalculateLayout(flawed).findings.filter((finding) => finding.severity === 'fails')

const release: ReleaseSummary = {
  id: 'release-1',
  layoutId: 'layout-1',
  layoutName: flawed.name,
  revisionLetter: 'A',
  revision: 7,
  status: 'released',
  frozenAt: '2026-12-01T09:30:00.000Z',
  frozenByName: 'Mira Kast',
  engineVersion: '1.0.0',
  documentHash: `sha256:${'0'.repeat(64)}`,
  verdict: 'fails',
  acceptanceCount: 2,
  note: '',
  withdrawnAt: null,
  withdrawnByName: null,
  withdrawalReason: null,
}

function show(role: Role, status: LayoutStatus, document = flawed) {
  useLayoutStore.setState({
    ...EMPTY_LAYOUT_STATE,
    layoutId: 'layout-1',
    revision: 7,
    access: {
      role,
      status,
      revisionLetter: 'A',
      canEdit: role !== 'viewer' && (status === 'draft' || status === 'inReview'),
    },
  })
  useResultsStore.setState({ document, results: recalculateLayout(document), isStale: false })
  return render(
    <QueryClientProvider client={queryClient}>
      <MemoryRouter initialEntries={['/w/workspace-1/layouts/layout-1']}>
        <Routes>
          <Route
            path="/w/:workspaceId/layouts/:layoutId"
            element={
              <>
                <ReleaseActions layoutId="layout-1" />
                <FrozenBanner layoutId="layout-1" />
              </>
            }
          />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  )
}

const buttons = () =>
  screen
    .queryAllByRole('button')
    .map((button) => button.textContent ?? '')
    .filter((name) => !name.startsWith('Release') || name === 'Release sheet')

async function openFreezeDialog() {
  const user = userEvent.setup()
  await user.click(screen.getByRole('button', { name: 'Freeze layout' }))
  return { user, dialog: within(screen.getByRole('dialog', { name: 'Freeze revision A' })) }
}

beforeEach(() => {
  // jsdom knows the element but not its modal state.
  HTMLDialogElement.prototype.showModal = function () {
    this.open = true
  }
  HTMLDialogElement.prototype.close = function () {
    this.open = false
  }
})
afterEach(() => {
  cleanup()
  queryClient.clear()
  vi.unstubAllGlobals()
  useLayoutStore.setState(EMPTY_LAYOUT_STATE)
})

describe('the release actions', () => {
  it.each<[Role, LayoutStatus, string[]]>([
    ['viewer', 'draft', []],
    ['shop', 'inReview', []],
    ['designer', 'draft', ['Ask for review']],
    ['designer', 'inReview', ['Take back']],
    ['manager', 'draft', ['Ask for review', 'Freeze layout']],
    ['manager', 'inReview', ['Take back', 'Freeze layout']],
    ['admin', 'draft', ['Ask for review', 'Freeze layout']],
    ['viewer', 'released', ['Release sheet']],
    ['designer', 'withdrawn', ['Release sheet']],
    ['manager', 'released', ['Start next revision', 'Release sheet']],
    ['manager', 'withdrawn', ['Start next revision', 'Release sheet']],
  ])('of a %s on a layout that is %s are %j', async (role, status, expected) => {
    fakeApi({ 'GET /api/layouts/layout-1/releases': { body: { releases: [release] } } })
    show(role, status)
    await waitFor(() => expect(buttons()).toEqual(expected))
  })
})

describe('the frozen banner', () => {
  it('says who released the revision and leads to it', async () => {
    fakeApi({ 'GET /api/layouts/layout-1/releases': { body: { releases: [release] } } })
    show('designer', 'released')
    expect(await screen.findByText(/by Mira Kast/)).toBeTruthy()
    expect(screen.getByRole('link', { name: 'Open the release' }).getAttribute('href')).toBe(
      '/w/workspace-1/releases/release-1',
    )
  })

  it('warns against building from a withdrawn one, with the reason', async () => {
    const withdrawn: ReleaseSummary = {
      ...release,
      status: 'withdrawn',
      withdrawnAt: '2026-12-02T09:30:00.000Z',
      withdrawnByName: 'Ada Winter',
      withdrawalReason: 'The wheel drawing was wrong.',
    }
    fakeApi({ 'GET /api/layouts/layout-1/releases': { body: { releases: [withdrawn] } } })
    show('designer', 'withdrawn')
    expect(await screen.findByText(/The wheel drawing was wrong/)).toBeTruthy()
    expect(screen.getByText(/Do not build from it/)).toBeTruthy()
  })

  it('is not there on a draft', () => {
    fakeApi({})
    show('designer', 'draft')
    expect(screen.queryByRole('status')).toBeNull()
  })
})

describe('the freeze dialog', () => {
  it('asks for a reason for each failing finding, at its field, before anything is sent', async () => {
    const api = fakeApi({})
    show('manager', 'draft')
    const { user, dialog } = await openFreezeDialog()
    const fields = dialog.getAllByLabelText(/^Why slip of wheel, first stage/)
    expect(fields).toHaveLength(failing.length)
    await user.click(dialog.getByRole('button', { name: 'Freeze revision A' }))
    expect(dialog.getAllByText(/at least ten characters/)).toHaveLength(failing.length)
    for (const field of fields) expect(field.getAttribute('aria-invalid')).toBe('true')
    expect(api.sent('POST', '/api/layouts/layout-1/freeze')).toEqual([])
  })

  it('sends the revision that was seen and the reasons', async () => {
    const api = fakeApi({ 'POST /api/layouts/layout-1/freeze': { status: 201, body: release } })
    show('manager', 'inReview')
    const { user, dialog } = await openFreezeDialog()
    for (const field of dialog.getAllByLabelText(/^Why slip/))
      await user.type(field, 'Bench test without slip.')
    await user.type(dialog.getByLabelText('Note on the release'), 'First batch.')
    await user.click(dialog.getByRole('button', { name: 'Freeze revision A' }))
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull())
    const [sent] = api.sent('POST', '/api/layouts/layout-1/freeze')
    expect(sent?.body).toEqual({
      revision: 7,
      note: 'First batch.',
      acceptances: failing.map(({ code, part, loadCase }) => ({
        code,
        part,
        loadCase,
        reason: 'Bench test without slip.',
      })),
    })
  })

  it('shows what the server refuses at the finding it is about, and keeps the reasons', async () => {
    const [first] = failing
    if (!first) throw new Error('nothing fails')
    fakeApi({
      'POST /api/layouts/layout-1/freeze': refusal(422, 'fails', 'One finding fails and is not accepted.', {
        [findingKey(first)]: 'Slips, says the server.',
      }),
    })
    show('manager', 'draft')
    const { user, dialog } = await openFreezeDialog()
    for (const field of dialog.getAllByLabelText(/^Why slip/))
      await user.type(field, 'Bench test without slip.')
    await user.click(dialog.getByRole('button', { name: 'Freeze revision A' }))
    expect(await dialog.findByText('One finding fails and is not accepted.')).toBeTruthy()
    expect(dialog.getByText('Slips, says the server.')).toBeTruthy()
    for (const field of dialog.getAllByLabelText<HTMLTextAreaElement>(/^Why slip/))
      expect(field.value).toBe('Bench test without slip.')
  })

  it('holds back when somebody edits meanwhile, until the newest state was looked at', async () => {
    fakeApi({})
    show('manager', 'draft')
    const { user, dialog } = await openFreezeDialog()
    useLayoutStore.setState({ revision: 8 })
    const freeze = dialog.getByRole<HTMLButtonElement>('button', { name: 'Freeze revision A' })
    await waitFor(() => expect(freeze.disabled).toBe(true))
    expect(dialog.getByText('The layout was edited while this was open')).toBeTruthy()
    await user.click(dialog.getByRole('button', { name: 'I have looked at it' }))
    expect(freeze.disabled).toBe(false)
  })

  it('waits for edits of one’s own that are not saved yet', async () => {
    fakeApi({})
    show('manager', 'draft')
    const { dialog } = await openFreezeDialog()
    useLayoutStore.setState({
      pending: [
        {
          editId: 'edit-1',
          clientId: 'client-1',
          clientSeq: 1,
          baseRevision: 7,
          label: 'Move',
          operations: [],
        },
      ],
    })
    expect(await dialog.findByText('Waiting until your edits are saved.')).toBeTruthy()
    expect(dialog.getByRole<HTMLButtonElement>('button', { name: 'Freeze revision A' }).disabled).toBe(true)
  })
})
