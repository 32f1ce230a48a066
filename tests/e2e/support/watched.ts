import { expect as baseExpect, test as base, type Page } from '@playwright/test'

/** No test is about speed; a busy machine may take this long. */
const patience = { testMs: 300_000, stepMs: 30_000 }

export const expect = baseExpect.configure({ timeout: patience.stepMs })

/** What a page must never do: break, complain in the console, or ask another host. */
interface Complaints {
  errors: string[]
  otherHosts: string[]
}

/** Chromium notes every answer of 400 and above and every lost line by itself; these are provoked. */
const isNoteOfTheBrowser = (text: string) => text.startsWith('Failed to load resource')

function listen(page: Page, hostname: string, complaints: Complaints) {
  page.on('pageerror', (error) => complaints.errors.push(error.message))
  page.on('console', (message) => {
    if (message.type() !== 'error' || isNoteOfTheBrowser(message.text())) return
    complaints.errors.push(message.text())
  })
  page.on('response', (response) => {
    if (response.status() >= 500) complaints.errors.push(`${response.status()} ${response.url()}`)
  })
  page.on('request', (request) => {
    const url = new URL(request.url())
    if (/^(http|ws)/.test(url.protocol) && url.hostname !== hostname) {
      complaints.otherHosts.push(url.host)
    }
  })
}

/** Playwright's test with every page of it watched; it fails on a complaint whatever else it found. */
export const test = base.extend<{ watched: Complaints }>({
  watched: [
    async ({ context, baseURL }, use, testInfo) => {
      testInfo.setTimeout(patience.testMs)
      const complaints: Complaints = { errors: [], otherHosts: [] }
      const { hostname } = new URL(baseURL ?? '')
      context.on('page', (page) => listen(page, hostname, complaints))
      await use(complaints)
      expect(complaints).toEqual({ errors: [], otherHosts: [] })
    },
    { auto: true },
  ],
})
