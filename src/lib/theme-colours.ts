/** The tokens of src/app/theme.css as plain hex values, for konva, which cannot read custom properties. */
import { useSyncExternalStore } from 'react'

const LIGHT = {
  paper: '#f6f3ec',
  card: '#fffefb',
  ink: '#1f242c',
  quiet: '#667080',
  hairline: '#e1dacb',
  edge: '#8d8a82',
  bar: '#1f242c',
  steel: '#2b4c7e',
  straw: '#c58a1b',
  plum: '#6b3a5b',
  bronze: '#a8642a',
  good: '#2e7a5a',
  bad: '#b0392b',
  strawInk: '#7d560b',
  bronzeInk: '#9a5a22',
  onFill: '#fffefb',
  goodSoft: '#e0f4e8',
  badSoft: '#f6dfda',
  steelSoft: '#eff4fc',
  strawSoft: '#f7ebcf',
}
export type ThemeColours = Record<keyof typeof LIGHT, string>

const DARK: ThemeColours = {
  paper: '#16191e',
  card: '#1d2127',
  ink: '#ece8df',
  quiet: '#a1a9b4',
  hairline: '#343a43',
  edge: '#727b87',
  bar: '#0f1216',
  steel: '#93b4e6',
  straw: '#e2b04a',
  plum: '#d0a3c1',
  bronze: '#d99b60',
  good: '#6fc59d',
  bad: '#f28c80',
  strawInk: '#e8bf69',
  bronzeInk: '#d99b60',
  onFill: '#16191e',
  goodSoft: '#1c352b',
  badSoft: '#43231f',
  steelSoft: '#22314a',
  strawSoft: '#3a301a',
}

export const THEME_COLOURS: Record<'light' | 'dark', ThemeColours> = { light: LIGHT, dark: DARK }

// The attribute, not the preference, is the truth: the preference may be "system".
const currentTheme = () => (document.documentElement.dataset.theme === 'dark' ? 'dark' : 'light')

function subscribe(onChange: () => void): () => void {
  const observer = new MutationObserver(onChange)
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme'] })
  return () => observer.disconnect()
}

export function useThemeColours(): ThemeColours {
  return THEME_COLOURS[useSyncExternalStore(subscribe, currentTheme)]
}
