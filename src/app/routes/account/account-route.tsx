import type { ReactNode } from 'react'
import { SegmentedControl } from '@/components/segmented-control'
import { ChangePasswordForm } from '@/features/accounts/components/change-password-form'
import { NameForm } from '@/features/accounts/components/name-form'
import { SessionList } from '@/features/accounts/components/session-list'
import { usePreferencesStore } from '@/stores/preferences-store'
import { PageHeading } from '../../page-heading'
import { useSignedIn } from '../../workspace-context'

const THEMES = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
] as const
const UNITS = [
  { value: 'metric', label: 'mm, N, MPa' },
  { value: 'inch', label: 'in, lbf, ksi' },
] as const

function Section({ title, text, children }: { title: string; text: string; children: ReactNode }) {
  return (
    <section className="grid gap-x-12 gap-y-4 border-t border-hairline py-8 md:grid-cols-[16rem_minmax(0,36rem)]">
      <div>
        <h2 className="font-bold">{title}</h2>
        <p className="mt-1 text-sm text-quiet">{text}</p>
      </div>
      {children}
    </section>
  )
}

export default function AccountRoute() {
  const { user } = useSignedIn()
  const { theme, units, setTheme, setUnits } = usePreferencesStore()
  return (
    <>
      <PageHeading title="My account" />
      <Section title="Name and address" text="The address is how colleagues invite you.">
        <NameForm name={user.name} email={user.email} />
      </Section>
      <Section
        title="This device"
        text="Kept in this browser. Stored values stay metric; units change what is shown and typed."
      >
        <div className="grid gap-5">
          <SegmentedControl label="Theme" options={THEMES} value={theme} onChange={setTheme} />
          <SegmentedControl label="Units" options={UNITS} value={units} onChange={setUnits} />
        </div>
      </Section>
      <Section title="Password" text="Any characters are allowed, and pasting too.">
        <ChangePasswordForm />
      </Section>
      <Section title="Where you are signed in" text="Sign out what you do not recognise or no longer use.">
        <SessionList />
      </Section>
    </>
  )
}
