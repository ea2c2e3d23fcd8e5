/**
 * The test object of all journeys. `openAs('dina')` gives a page of its own browser context in which that
 * person is signed in; each person signs in by the page once and later contexts reuse the cookie.
 * `problems` collects what no page may show: breaches of the content security policy and uncaught errors.
 */
import { type BrowserContextOptions, type Page, test as base } from '@playwright/test'
import { DEMO_PASSWORD, PEOPLE, type PersonKey } from './people'

type StorageState = Awaited<ReturnType<ReturnType<Page['context']>['storageState']>>

interface Journey {
  problems: string[]
  /** A page of a new context with nobody signed in. */
  openNew: (options?: BrowserContextOptions) => Promise<Page>
  openAs: (person: PersonKey, options?: BrowserContextOptions) => Promise<Page>
}

export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
}

async function watch(page: Page, problems: string[]): Promise<void> {
  page.on('pageerror', (error) => problems.push(`uncaught: ${error.message}`))
  page.on('console', (message) => {
    if (/content security policy/i.test(message.text())) problems.push(message.text())
  })
  await page.exposeFunction('reportPolicyViolation', (text: string) => problems.push(text))
  await page.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', (event) => {
      const report = (window as unknown as { reportPolicyViolation: (text: string) => void })
        .reportPolicyViolation
      report(`${location.pathname}: ${event.violatedDirective} blocked ${event.blockedURI}`)
    })
  })
}

export const test = base.extend<Journey, { sessions: Map<PersonKey, StorageState> }>({
  sessions: [
    async ({}, use) => {
      await use(new Map())
    },
    { scope: 'worker' },
  ],

  problems: async ({}, use) => {
    await use([])
  },
  openNew: async ({ browser, problems }, use) => {
    const contexts: { close: () => Promise<void> }[] = []
    await use(async (options) => {
      const context = await browser.newContext(options)
      contexts.push(context)
      const page = await context.newPage()
      await watch(page, problems)
      return page
    })
    for (const context of contexts) await context.close()
  },
  openAs: async ({ openNew, sessions }, use) => {
    await use(async (person, options) => {
      const page = await openNew({ ...options, storageState: sessions.get(person) })
      if (!sessions.has(person)) {
        await signIn(page, PEOPLE[person].email, DEMO_PASSWORD)
        sessions.set(person, await page.context().storageState())
      } else {
        await page.goto('/')
      }
      return page
    })
  },
})
