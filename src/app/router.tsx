/**
 * Declarative routing. The pages before sign-in stand here and stay small; everything with data,
 * schemas and the query cache loads as one further chunk, and each page as its own.
 */
import { lazy, Suspense } from 'react'
import { Route, Routes, useLocation } from 'react-router'
import { paths } from '@/config/paths'
import { ErrorBoundary } from './error-boundary'
import { EntryFrame } from './frames/entry-frame'
import { PageLoading } from './page-loading'
import SignInRoute from './routes/sign-in/sign-in-route'

const SignUpRoute = lazy(() => import('./routes/sign-up/sign-up-route'))
const ForgottenPasswordRoute = lazy(() => import('./routes/forgotten-password/forgotten-password-route'))
const ResetPasswordRoute = lazy(() => import('./routes/reset-password/reset-password-route'))
const ConfirmEmailRoute = lazy(() => import('./routes/confirm-email/confirm-email-route'))
const DataRoutes = lazy(() => import('./data-routes'))

export function Router() {
  const { pathname } = useLocation()
  return (
    <ErrorBoundary resetKey={pathname}>
      <Suspense fallback={<PageLoading />}>
        <Routes>
          <Route element={<EntryFrame />}>
            <Route path={paths.signIn} element={<SignInRoute />} />
            <Route path={paths.signUp} element={<SignUpRoute />} />
            <Route path={paths.forgotPassword} element={<ForgottenPasswordRoute />} />
            <Route path={paths.resetPassword} element={<ResetPasswordRoute />} />
            <Route path={paths.confirmEmail} element={<ConfirmEmailRoute />} />
          </Route>
          <Route path="*" element={<DataRoutes />} />
        </Routes>
      </Suspense>
    </ErrorBoundary>
  )
}
