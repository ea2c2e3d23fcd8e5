import { useQueryClient } from '@tanstack/react-query'
import { useNavigate } from 'react-router'
import { Avatar } from '@/components/avatar'
import { Menu } from '@/components/menu'
import { showToast } from '@/components/toast-store'
import { paths } from '@/config/paths'
import { signOut } from '@/features/accounts/api/auth-endpoints'
import { messageOf } from '@/lib/http-client'
import { type ThemePreference, usePreferencesStore } from '@/stores/preferences-store'
import { useSignedIn } from '../workspace-context'

const THEMES: { value: ThemePreference; label: string }[] = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
]

export function AccountMenu() {
  const { user } = useSignedIn()
  const theme = usePreferencesStore((state) => state.theme)
  const setTheme = usePreferencesStore((state) => state.setTheme)
  const navigate = useNavigate()
  const queryClient = useQueryClient()

  const leave = async () => {
    try {
      await signOut()
      // First away from the pages that need a person, then forget everything read on their behalf.
      await navigate(paths.signIn)
      queryClient.clear()
    } catch (error) {
      showToast(`Still signed in. ${messageOf(error)}`, 'bad')
    }
  }

  return (
    <Menu
      label="Account"
      buttonClassName="rounded-full"
      button={<Avatar name={user.name} />}
      items={[
        { kind: 'heading', label: `${user.name}, ${user.email}` },
        { label: 'My account', icon: 'person', onSelect: () => void navigate(paths.account) },
        { label: 'Methods and checks', icon: 'info', onSelect: () => void navigate(paths.methods) },
        { kind: 'separator' },
        { kind: 'heading', label: 'Theme' },
        ...THEMES.map((option) => ({
          kind: 'choice' as const,
          label: option.label,
          isChosen: option.value === theme,
          onSelect: () => setTheme(option.value),
        })),
        { kind: 'separator' },
        { label: 'Sign out', onSelect: () => void leave() },
      ]}
    />
  )
}
