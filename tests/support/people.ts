/** The demo people. Every role once, and a second designer for co-editing. */
export const DEMO_PASSWORD = 'between-two-centres'

export const PEOPLE = {
  vera: { name: 'Vera Lund', email: 'vera@cedar-line.example', role: 'viewer' },
  sam: { name: 'Sam Okoro', email: 'sam@cedar-line.example', role: 'shop' },
  dina: { name: 'Dina Reyes', email: 'dina@cedar-line.example', role: 'designer' },
  tomas: { name: 'Tomas Berg', email: 'tomas@cedar-line.example', role: 'designer' },
  mira: { name: 'Mira Kast', email: 'mira@cedar-line.example', role: 'manager' },
  ada: { name: 'Ada Winter', email: 'ada@cedar-line.example', role: 'admin' },
} as const

export type PersonKey = keyof typeof PEOPLE
