import AxeBuilder from '@axe-core/playwright'
import { expect, test, type BrowserContext, type Page } from '@playwright/test'
import { people } from '../../server/db/seed/people'

const slug = 'a-log-store-on-a-concrete-pad'
const sheet = `/sheets/${slug}`
const lesson = `${sheet}/lessons/reading-your-ground`
/** How each page is looked at; axe, which takes long, once in each theme. */
const looks = [
  { theme: 'paper', width: 1440, isJudged: true },
  { theme: 'paper', width: 390, isJudged: false },
  { theme: 'paper', width: 360, isJudged: false },
  { theme: 'sun', width: 1440, isJudged: false },
  { theme: 'sun', width: 360, isJudged: false },
  { theme: 'sun', width: 390, isJudged: true },
]
const open = ['/', '/register', sheet, lesson, '/calculators', '/calculators/square']
const nowhere = '/nowhere/at-all'

const readers = {
  visitor: { who: null, paths: [...open, '/sign-in', '/sign-up', `${sheet}/fence`, nowhere] },
  learner: {
    who: people.jo,
    paths: [
      ...['/register', sheet, lesson, '/builds', `${sheet}/build`],
      ...['/fence', `${sheet}/fence`, '/account'],
    ],
  },
  instructor: { who: people.maren, paths: ['/bench', '/bench/new', '/account', sheet, lesson] },
}

/** Signs in without the form; the session's cookie goes with every page of the context. */
async function signIn(context: BrowserContext, base: string, { email, passphrase }: SignIn) {
  const answer = await context.request.post(`${base}/api/sessions`, {
    headers: { origin: base },
    data: { email, passphrase },
  })
  expect(answer.ok()).toBe(true)
}
interface SignIn {
  email: string
  passphrase: string
}

/** As much of the bench's answers as the addresses need. */
interface BenchAnswer {
  id: number
  stages: { id: number; lessons: { id: number }[] }[]
}

/** Pages of the bench have numbers in their addresses: those of the draft this makes. */
async function draftPaths(context: BrowserContext, base: string): Promise<string[]> {
  const send = async (path: string, data: object) => {
    const headers = { origin: base, 'idempotency-key': crypto.randomUUID() }
    const answer = await context.request.post(`${base}/api/bench${path}`, { headers, data })
    expect(answer.ok()).toBe(true)
    return (await answer.json()) as BenchAnswer
  }
  const outline = { outcome: '', coverDrawing: 'deck', weekends: 1, stages: ['ground', 'frame'] }
  const course = await send('/courses', { title: 'A bench by the wall', ...outline })
  const title = 'Levelling a very long row of old flagstones against the wall'
  const grown = await send(`/stages/${String(course.stages[0]?.id)}/lessons`, { title })
  const lessonId = grown.stages[0]?.lessons[0]?.id
  const stop = await send(`/lessons/${lessonId}/stops`, {
    ...{ name: 'How deep', atMs: 4000, isRequired: true },
  })
  const place = `/bench/courses/${course.id}`
  return [place, `${place}/lessons/${lessonId}`, `${place}/lessons/${lessonId}/stops/${stop.id}`]
}

async function settle(page: Page, path: string) {
  await page.goto(path)
  await expect(page.locator('main')).toBeVisible()
  await expect(page.getByText(/^(Still f|F)etching/)).toHaveCount(0)
  await page.waitForLoadState('networkidle')
}

/** What a page says to its console, and which other hosts it asks. */
function listen(page: Page, base: string): string[] {
  const complaints: string[] = []
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) complaints.push(message.text())
  })
  page.on('pageerror', (error) => complaints.push(error.message))
  page.on('request', (request) => {
    const { protocol, host } = new URL(request.url())
    const isOurs = host === new URL(base).host || ['data:', 'blob:'].includes(protocol)
    if (!isOurs) complaints.push(`asked ${host}`)
  })
  return complaints
}

async function judge(page: Page, base: string, path: string) {
  const complaints = listen(page, base)
  await settle(page, path)
  for (const { theme, width, isJudged } of looks) {
    await page.setViewportSize({ width, height: 900 })
    await page.evaluate((name) => (document.documentElement.dataset['theme'] = name), theme)
    const over = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth)
    expect.soft(over, `sideways scroll at ${width} px, ${theme}`).toBeLessThan(1)
    if (!isJudged) continue
    const { violations } = await new AxeBuilder({ page }).analyze()
    const found = violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)
    expect.soft(found, `axe at ${width} px, ${theme}`).toEqual([])
  }
  expect(complaints).toEqual([])
}

for (const [reader, { who, paths }] of Object.entries(readers)) {
  for (const path of paths) {
    test(`${reader} reads ${path} in both themes and at every width`, async ({ page, baseURL }) => {
      const base = String(baseURL)
      if (who) await signIn(page.context(), base, who)
      await judge(page, base, path)
    })
  }
}

test('an instructor reads a draft on the bench, from its outline to its stop', async ({
  page,
  baseURL,
}) => {
  test.slow()
  const base = String(baseURL)
  await signIn(page.context(), base, people.maren)
  for (const path of await draftPaths(page.context(), base)) {
    await test.step(path, () => judge(page, base, path))
  }
})

test('a page of one’s own brings a visitor back after signing in, and never to another site', async ({
  page,
}) => {
  await page.goto('/builds')
  await expect(page).toHaveURL(/\/sign-in\?back=\/builds$/)
  await fillSignIn(page, people.jo)
  await expect(page).toHaveURL(/\/(builds|sheets\/.+\/build)$/)

  await page.context().clearCookies()
  await page.goto('/sign-in?back=//elsewhere.example/steal')
  await fillSignIn(page, people.jo)
  await expect(page).toHaveURL(/\/register$/)
})

async function fillSignIn(page: Page, { email, passphrase }: SignIn) {
  await page.getByLabel('Email').fill(email)
  await page.getByLabel('Passphrase').fill(passphrase)
  await page.getByRole('button', { name: 'Sign in' }).click()
}
