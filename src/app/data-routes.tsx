/** Every page that reads from the server through the query cache. */
import '@/config/configure-zod'
import { QueryClientProvider } from '@tanstack/react-query'
import { lazy, Suspense } from 'react'
import { Route, Routes } from 'react-router'
import { ToastRegion } from '@/components/toast-region'
import { paths } from '@/config/paths'
import { queryClient } from '@/lib/query-client'
import { BareFrame } from './frames/bare-frame'
import { PageFrame } from './frames/page-frame'
import { SignedInFrame } from './frames/signed-in-frame'
import { WorkspaceFrame } from './frames/workspace-frame'
import { NotFound } from './not-found'
import { OfflineBanner } from './offline-banner'
import { PageLoading } from './page-loading'
import HomeRoute from './routes/home/home-route'

const AccountRoute = lazy(() => import('./routes/account/account-route'))
const BenchRoute = lazy(() => import('./routes/bench/bench-route'))
const CaughtMailRoute = lazy(() => import('./routes/caught-mail/caught-mail-route'))
const InvitationRoute = lazy(() => import('./routes/invitation/invitation-route'))
const LayoutsRoute = lazy(() => import('./routes/layouts/layouts-route'))
const MethodsRoute = lazy(() => import('./routes/methods/methods-route'))
const PeopleRoute = lazy(() => import('./routes/people/people-route'))
const ReleaseDeskRoute = lazy(() => import('./routes/releases/release-desk-route'))
const ReleaseRoute = lazy(() => import('./routes/releases/release-route'))

export default function DataRoutes() {
  return (
    <QueryClientProvider client={queryClient}>
      <OfflineBanner />
      <Suspense fallback={<PageLoading />}>
        <Routes>
          <Route element={<BareFrame />}>
            <Route path={paths.caughtMail} element={<CaughtMailRoute />} />
            <Route path={paths.invitation()} element={<InvitationRoute />} />
            <Route path="*" element={<NotFound />} />
          </Route>
          <Route element={<SignedInFrame />}>
            <Route path={paths.home} element={<HomeRoute />} />
            <Route element={<PageFrame />}>
              <Route path={paths.account} element={<AccountRoute />} />
            </Route>
            <Route element={<PageFrame showsResults />}>
              <Route path={paths.methods} element={<MethodsRoute />} />
            </Route>
            <Route element={<WorkspaceFrame />}>
              {/* The bench fills the window and brings its own bar. */}
              <Route path={paths.bench()} element={<BenchRoute />} />
              <Route element={<PageFrame />}>
                <Route path={paths.people()} element={<PeopleRoute />} />
              </Route>
              <Route element={<PageFrame showsResults />}>
                <Route path={paths.layouts()} element={<LayoutsRoute />} />
                <Route path={paths.releases()} element={<ReleaseDeskRoute />} />
                <Route path={paths.release()} element={<ReleaseRoute />} />
              </Route>
            </Route>
          </Route>
        </Routes>
      </Suspense>
      <ToastRegion />
    </QueryClientProvider>
  )
}
