/** Renders the whole client at an address, as the browser would after loading it. */
import { cleanup, render } from '@testing-library/react'
import { MemoryRouter } from 'react-router'
import { afterEach, vi } from 'vitest'
import { Router } from '@/app/router'
import { useToastStore } from '@/components/toast-store'
import { queryClient } from '@/lib/query-client'

afterEach(() => {
  cleanup()
  queryClient.clear()
  useToastStore.setState({ toasts: [] })
  vi.unstubAllGlobals()
})

export function renderPage(address: string) {
  vi.stubGlobal('scrollTo', () => undefined)
  return render(
    <MemoryRouter initialEntries={[address]}>
      <Router />
    </MemoryRouter>,
  )
}
