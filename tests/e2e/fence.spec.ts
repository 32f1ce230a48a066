import AxeBuilder from '@axe-core/playwright'
import { expect, test, type Browser, type Page } from '@playwright/test'
import { people } from '../../server/db/seed/people'

const slug = 'a-log-store-on-a-concrete-pad'
const fencePath = `/sheets/${slug}/fence`

type Who = 'jo' | 'anke' | 'tomas' | 'petra'

/** A browser of their own, signed in. */
async function pageOf(browser: Browser, who: Who, size = { width: 1440, height: 900 }) {
  const context = await browser.newContext({ viewport: size })
  const page = await context.newPage()
  await page.goto('/sign-in')
  await page.locator('input[type=email]').fill(people[who].email)
  await page.locator('input[type=password]').fill(people[who].passphrase)
  await page.keyboard.press('Enter')
  await page.waitForURL((url) => !url.pathname.includes('sign-in'))
  return page
}

/** Asks about the first lesson on the page of the sheet, and waits until it is open. */
async function ask(page: Page, title: string) {
  await page.goto(fencePath)
  await page.getByRole('button', { name: 'Ask a question' }).click()
  await page.getByLabel('Your question, in one sentence').fill(title)
  await page.getByRole('button', { name: 'Ask over the fence' }).click()
  await page.getByRole('heading', { name: title }).waitFor()
}
async function openQuestion(page: Page, title: string) {
  await page.goto(fencePath)
  await page.getByRole('link', { name: title }).click()
  await page.getByRole('article', { name: title }).waitFor()
}
async function answer(page: Page, text: string) {
  await page.getByRole('textbox', { name: /Answer|Add what/ }).fill(text)
  await page.getByRole('button', { name: 'Put it over the fence' }).click()
}
const titleOf = (words: string) => `${words} ${Date.now().toString(36)}?`

test('a question asked in one browser is answered in another, live both ways', async ({
  browser,
}) => {
  const title = titleOf('Does frost matter tonight')
  const [jo, anke] = [await pageOf(browser, 'jo'), await pageOf(browser, 'anke')]
  await openQuestion(anke, 'My water table is a spade below the grass')
  await expect(anke.getByText('Not live just now')).toHaveCount(0)
  await ask(jo, title)
  await expect(anke.getByRole('link', { name: title })).toBeVisible({ timeout: 1500 })

  await anke.getByRole('link', { name: title }).click()
  await expect(jo.getByText('Anke Dorsthorst is at this lesson now.')).toBeVisible()
  await anke.getByRole('textbox', { name: /Answer/ }).pressSequentially('Cover it, **five days**.')
  await expect(jo.getByText('Anke Dorsthorst is writing')).toBeVisible()
  await anke.getByRole('button', { name: 'Put it over the fence' }).click()
  await expect(jo.locator('strong', { hasText: 'five days' })).toBeVisible({ timeout: 1500 })

  await jo.getByRole('button', { name: 'This settles it' }).click()
  await expect(anke.getByText('Settled by Jo Varga')).toBeVisible({ timeout: 1500 })
})

test('after a lost line nothing is missed and nothing stands twice', async ({ browser }) => {
  const title = titleOf('Which string for the lines')
  const [jo, anke] = [await pageOf(browser, 'jo'), await pageOf(browser, 'anke')]
  await ask(jo, title)
  await openQuestion(anke, title)
  await anke.context().setOffline(true)
  await answer(jo, 'First while away')
  await answer(jo, 'Second while away')
  await expect(jo.getByText('Second while away')).toBeVisible()
  await answer(anke, 'Written without signal')
  await expect(anke.getByText('kept here')).toBeVisible()
  await anke.context().setOffline(false)
  await expect(anke.getByText('Second while away')).toBeVisible({ timeout: 20_000 })
  await anke.getByRole('button', { name: 'Try again' }).click()
  await expect(jo.getByText('Written without signal')).toBeVisible()
  for (const page of [jo, anke]) {
    await expect(
      page.getByRole('list', { name: 'Answers over the fence' }).locator('> li'),
    ).toHaveCount(3)
  }
})

test('it is complete without the live line', async ({ browser }) => {
  const title = titleOf('How deep is the stone bed')
  const [tomas, anke] = [await pageOf(browser, 'tomas'), await pageOf(browser, 'anke')]
  await tomas.context().route('**/socket.io/**', (route) => route.abort())
  await tomas.routeWebSocket(/socket\.io/, (socket) => socket.close())
  await ask(tomas, title)
  await expect(tomas.getByText('Not live just now')).toBeVisible()
  await openQuestion(anke, title)
  await answer(anke, 'A hand and a half')
  await expect(tomas.getByText('A hand and a half')).toBeVisible({ timeout: 20_000 })
})

test('a question is asked and answered by keyboard alone', async ({ browser }) => {
  const title = titleOf('Can the keyboard do it')
  const page = await pageOf(browser, 'tomas')
  await page.goto(fencePath)
  const tabTo = async (name: RegExp) => {
    for (let count = 0; count < 80; count++) {
      await page.keyboard.press('Tab')
      const focused = await page.evaluate(() => {
        const element = document.activeElement as HTMLInputElement | null
        return element?.labels?.[0]?.textContent ?? element?.textContent ?? ''
      })
      if (name.test(focused)) return
    }
    throw new Error(`the keyboard does not reach ${name.source}`)
  }
  await page.getByRole('button', { name: 'Ask a question' }).waitFor()
  await tabTo(/Ask a question/)
  await page.keyboard.press('Enter')
  await tabTo(/Your question/)
  await page.keyboard.type(title)
  await tabTo(/^Ask over the fence/)
  await page.keyboard.press('Enter')
  await page.getByRole('heading', { name: title }).waitFor()
  await tabTo(/Add what you found/)
  await page.keyboard.type('It can.')
  await tabTo(/Put it over the fence/)
  await page.keyboard.press('Enter')
  await expect(page.getByRole('list', { name: 'Answers over the fence' })).toContainText('It can.')
})

for (const size of [
  { width: 1440, height: 900 },
  { width: 390, height: 844 },
  { width: 360, height: 740 },
]) {
  test(`nothing is found by axe at ${size.width} px in either theme, nor sideways scroll`, async ({
    browser,
  }) => {
    const page = await pageOf(browser, 'jo', size)
    for (const theme of ['paper', 'sun']) {
      await page.goto(fencePath)
      const first = page.getByRole('link', { name: 'Do I measure to the inside' })
      await first.waitFor()
      await page.evaluate((name) => (document.documentElement.dataset['theme'] = name), theme)
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([])
      await first.click()
      await page.getByRole('article').waitFor()
      await page.evaluate((name) => (document.documentElement.dataset['theme'] = name), theme)
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([])
      const overflow = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      )
      expect(overflow).toBeLessThanOrEqual(0)
    }
  })
}
