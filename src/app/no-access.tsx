import { Link } from 'react-router'
import { buttonClasses } from '@/components/button'
import { paths } from '@/config/paths'
import { usePageTitle } from './use-page-title'

/** The same words for "not yours" and "does not exist": the address alone must not tell. */
export function NoAccess() {
  usePageTitle('No access')
  return (
    <div className="mx-auto grid max-w-lg gap-4 px-6 py-20">
      <p className="text-sm font-semibold text-quiet">403</p>
      <h1 className="text-2xl font-bold">You have no access to this page</h1>
      <p className="text-quiet">
        It belongs to a workspace or a role that you do not have. If you should, ask an admin of that
        workspace for an invitation or another role.
      </p>
      <Link to={paths.home} className={`${buttonClasses('primary')} w-fit`}>
        Go to your layouts
      </Link>
    </div>
  )
}
