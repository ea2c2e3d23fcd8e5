import { BrowserRouter } from 'react-router'
import { ErrorBoundary } from './error-boundary'
import { OfflineBanner } from './offline-banner'
import { Router } from './router'
import { useTheme } from './use-theme'

export function App() {
  useTheme()
  return (
    <ErrorBoundary>
      <BrowserRouter>
        <OfflineBanner />
        <Router />
      </BrowserRouter>
    </ErrorBoundary>
  )
}
