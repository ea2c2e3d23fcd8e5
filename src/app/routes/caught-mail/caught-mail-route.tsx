import { CaughtMail } from '@/features/accounts/components/caught-mail'
import { PageHeading } from '../../page-heading'

export default function CaughtMailRoute() {
  return (
    <div className="mx-auto w-full max-w-3xl px-4 py-8 sm:px-6">
      <PageHeading title="Caught mail">
        Mail sent by this installation is caught on this machine instead of being delivered.
      </PageHeading>
      <CaughtMail />
    </div>
  )
}
