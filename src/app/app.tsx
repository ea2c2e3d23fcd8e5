import { BrowserRouter } from 'react-router'
import { ErrorBoundary } from './error-boundary'
import { Router } from './router'
import { useTheme } from './use-theme'

export function App() {
  useTheme()
  return (
    <ErrorBoundary>
      <BrowserRouter>
        <Router />
      </BrowserRouter>
    </ErrorBoundary>
  )
}
