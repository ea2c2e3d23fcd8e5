/** Renders the whole client at an address, as the browser would after loading it. */
import { cleanup, configure, render } from '@testing-library/react'
import { MemoryRouter } from 'react-router'
import { afterEach, vi } from 'vitest'
import { Router } from '@/app/router'
import { useToastStore } from '@/components/toast-store'
import { queryClient } from '@/lib/query-client'

// A page and its parts load on demand; on a busy machine the first one takes a while.
configure({ asyncUtilTimeout: 15_000 })

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
