import { Link } from 'react-router'
import { buttonClasses } from '@/components/button'
import { paths } from '@/config/paths'
import { usePageTitle } from './use-page-title'

export function NotFound() {
  usePageTitle('Page not found')
  return (
    <div className="mx-auto grid max-w-lg gap-4 px-6 py-20">
      <p className="text-sm font-semibold text-quiet">404</p>
      <h1 className="text-2xl font-bold">There is no page here</h1>
      <p className="text-quiet">The address may be mistyped, or what it pointed to was removed.</p>
      <Link to={paths.home} className={`${buttonClasses('primary')} w-fit`}>
        Go to your layouts
      </Link>
    </div>
  )
}
