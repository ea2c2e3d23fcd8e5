import { useLayoutEffect } from 'react'
import { usePreferencesStore } from '@/stores/preferences-store'

/** Writes the theme in force to <html>; follows the system while the preference is "system". */
export function useTheme(): void {
  const preference = usePreferencesStore((state) => state.theme)
  useLayoutEffect(() => {
    const system = matchMedia('(prefers-color-scheme: dark)')
    const apply = () => {
      const isDark = preference === 'dark' || (preference === 'system' && system.matches)
      document.documentElement.dataset.theme = isDark ? 'dark' : 'light'
    }
    apply()
    system.addEventListener('change', apply)
    return () => system.removeEventListener('change', apply)
  }, [preference])
}
