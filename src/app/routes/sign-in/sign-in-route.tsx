import { Link, useNavigate, useSearchParams } from 'react-router'
import { paths } from '@/config/paths'
import { SignInForm } from '@/features/accounts/components/sign-in-form'
import { safeNext, withNext } from '@/features/accounts/next-address'
import { usePageTitle } from '../../use-page-title'

export default function SignInRoute() {
  usePageTitle('Sign in')
  const [search] = useSearchParams()
  const navigate = useNavigate()
  const next = safeNext(search.get('next'))
  return (
    <>
      <h1 className="mb-6 text-3xl font-extrabold tracking-tight">Sign in</h1>
      <SignInForm next={next} onSignedIn={() => void navigate(next ?? paths.home, { replace: true })} />
      <p className="mt-8 border-t border-hairline pt-5 text-sm text-quiet">
        New here?{' '}
        <Link to={withNext(paths.signUp, next)} className="font-semibold text-steel underline">
          Create an account
        </Link>
      </p>
    </>
  )
}
