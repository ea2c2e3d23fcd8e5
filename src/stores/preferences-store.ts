/** What a person prefers on this device. Kept in the browser, not on the server. */
import { create } from 'zustand'

export type ThemePreference = 'system' | 'light' | 'dark'
export type Units = 'metric' | 'inch'

interface Preferences {
  theme: ThemePreference
  units: Units
}
interface PreferencesState extends Preferences {
  setTheme: (theme: ThemePreference) => void
  setUnits: (units: Units) => void
}

const STORAGE_KEY = 'hubstead.preferences'

function load(): Preferences {
  const preferences: Preferences = { theme: 'system', units: 'metric' }
  try {
    const stored = JSON.parse(localStorage.getItem(STORAGE_KEY) ?? '{}') as Partial<Preferences>
    if (stored.theme === 'light' || stored.theme === 'dark') preferences.theme = stored.theme
    if (stored.units === 'inch') preferences.units = 'inch'
  } catch {
    // Storage forbidden or damaged: the defaults serve.
  }
  return preferences
}

function save({ theme, units }: Preferences): void {
  try {
    localStorage.setItem(STORAGE_KEY, JSON.stringify({ theme, units }))
  } catch {
    // The choice then lasts until the page is left.
  }
}

export const usePreferencesStore = create<PreferencesState>()((set, get) => ({
  ...load(),
  setTheme: (theme) => {
    set({ theme })
    save(get())
  },
  setUnits: (units) => {
    set({ units })
    save(get())
  },
}))
