import { Link, Outlet } from 'react-router'
import { Mark } from '@/components/mark'
import { paths } from '@/config/paths'

/** The bar with nothing but the mark, for pages that do not ask who you are. */
export function BareFrame() {
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="on-bar flex h-14 items-center bg-bar px-4 text-bar-ink sm:px-6">
        <Link to={paths.home} className="flex items-center gap-3 rounded text-lg font-bold">
          <Mark />
          Hubstead
        </Link>
      </header>
      <main id="main" tabIndex={-1} className="flex-1 outline-none">
        <Outlet />
      </main>
    </div>
  )
}
