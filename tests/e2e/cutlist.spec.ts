import AxeBuilder from '@axe-core/playwright'
import type { Page } from '@playwright/test'
import { expect, test } from './support/watched'

const path = '/calculators/cutlist'
const cell = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true })
const bars = (page: Page) => page.getByRole('img', { name: /^Bars drawn to scale/ })
const proved = (page: Page) => page.getByText('Proved: it cannot be done with less.')
const buys = (page: Page) => page.getByRole('table', { name: 'Bars to buy' })

/** Two lengths of stock and two of posts: three bars of 3600 are the best, which no bound shows at once. */
const postsLink = () => {
  const parts = 'Front post*1500*3*89×89~Back post*1750*3*89×89'
  const query = { units: 'metric', parts, stock: '89×89*3000~89×89*3600', kerf: '3', trim: '10' }
  return `${path}?${new URLSearchParams(query).toString()}`
}
/** What of the solver was asked for. */
function listenForSolver(page: Page) {
  const asked: string[] = []
  page.on('request', (request) => {
    if (/cutlist\.worker|\.wasm/.test(request.url())) asked.push(request.url())
  })
  return asked
}

test('a visitor changes a part, sees the bars and the proof, and switches units', async ({
  page,
}) => {
  const asked = listenForSolver(page)
  await page.goto('/calculators')
  await page.getByRole('link', { name: /Cut list/ }).click()
  await expect(page).toHaveURL(/\/calculators\/cutlist$/)
  await expect(proved(page)).toBeVisible()
  await expect(bars(page)).toHaveAccessibleName(/4 bars of 19×140, 3600 .* 4 × 895 Side slat/)
  expect(asked).toEqual([])

  // Four of 900 and their saw cuts come to 3609: now one slat a bar is left for another.
  await cell(page, 'Length, Side slat').fill('0.9 m')
  await expect(bars(page)).not.toHaveAccessibleName(/4 × 895/)
  await expect(bars(page)).toHaveAccessibleName(/900 Side slat/)
  await expect(proved(page)).toBeVisible()
  await expect(page).toHaveURL(/Side\+slat\*0\.9\+m\*16/)

  await page.getByRole('radio', { name: 'ft, cubic yd' }).check()
  await expect(cell(page, 'Length, Side slat')).toHaveValue(`2' 11-7/16"`)
  await expect(cell(page, 'Section, Side slat')).toHaveValue('1x6')
  await expect(buys(page).getByRole('cell', { name: '2x4' }).first()).toBeVisible()
  await expect(page.getByText('here they are rounded')).toBeVisible()
  await page.getByRole('radio', { name: 'mm, m³' }).check()
  await expect(cell(page, 'Length, Side slat')).toHaveValue('0.9 m')

  await cell(page, 'Length, Side slat').fill('four')
  await expect(page.getByText(/^Length: “four” cannot be read as a length/)).toBeVisible()
  await expect(bars(page)).toBeVisible()
})

test('lines are added and taken out by keyboard alone, and prices give a cost', async ({
  page,
}) => {
  await page.goto(path)
  await page.getByRole('button', { name: 'Empty both tables' }).click()
  await expect(page.getByText('List at least one part to cut.')).toBeVisible()
  await cell(page, 'Part, part 1').focus()
  await page.keyboard.type('Shelf')
  await page.keyboard.press('Tab')
  await page.keyboard.type('880')
  await page.keyboard.press('Enter')
  await expect(cell(page, 'Part, part 2')).toBeFocused()
  await page.keyboard.press('Backspace')
  await expect(cell(page, 'Part, Shelf')).toBeFocused()
  await expect(cell(page, 'Part, part 2')).toHaveCount(0)

  await cell(page, 'Length, length 1').fill('1800')
  await cell(page, 'Price each, length 1').fill('7,50')
  await expect(page.getByText('Proved: nothing cheaper is possible.')).toBeVisible()
  await expect(page.getByRole('definition').first()).toHaveText('7.50')
  await page.getByRole('button', { name: 'Back to the log store' }).click()
  await expect(cell(page, 'Length, Side slat')).toHaveValue('895')
})

test('a link opens its list, the search proves it, and it works on without a line', async ({
  page,
  context,
}) => {
  const asked = listenForSolver(page)
  await page.goto(postsLink())
  await expect(proved(page)).toBeVisible()
  await expect(buys(page).getByRole('row', { name: 'Bars in all 3' })).toBeVisible()
  expect(asked.some((url) => url.endsWith('.wasm'))).toBe(true)

  await context.setOffline(true)
  await cell(page, 'Length, Back post').fill('1745')
  await expect(bars(page)).toHaveAccessibleName(/3 bars of 89×89, 3600 .* 1745 Back post/)
  await expect(proved(page)).toBeVisible()
  // Two such pieces no longer share a bar.
  await cell(page, 'Length, Back post').fill('2200')
  await expect(bars(page)).toHaveAccessibleName(/2200 Back post/)
  await expect(proved(page)).toBeVisible()
  await context.setOffline(false)

  const download = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Save the drawing' }).click()
  expect((await download).suggestedFilename()).toBe('cutlist.svg')
})

test('a search can be cancelled, and what is known of the list is said', async ({ page }) => {
  await page.route('**/*.wasm', () => new Promise<void>(() => undefined))
  await page.goto(postsLink())
  await expect(page.getByRole('progressbar')).toBeVisible()
  await expect(bars(page).first()).toBeVisible()
  await page.getByRole('button', { name: 'Cancel' }).click()
  await expect(page.getByText('Stopped. This is the best list found so far.')).toBeVisible()
  await expect(page.getByText(/^Within [\d.]+ % of the best possible\.$/)).toBeVisible()
  await page.unrouteAll({ behavior: 'ignoreErrors' })
  await page.getByRole('button', { name: 'Search again' }).click()
  await expect(proved(page)).toBeVisible()
})

for (const [width, height] of [
  [1440, 900],
  [360, 740],
] as const) {
  test(`the page holds at ${width} px in both themes`, async ({ page }) => {
    await page.setViewportSize({ width, height })
    await page.goto(path)
    await cell(page, 'Length, Rafter').fill('9 m')
    await expect(page.getByText(/^Length: Longer than every 38×89 bar/)).toBeVisible()
    await expect(bars(page)).toBeVisible()
    for (const theme of ['paper', 'sun']) {
      await page.evaluate((name) => (document.documentElement.dataset['theme'] = name), theme)
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([])
      const overflow = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      )
      expect(overflow).toBeLessThanOrEqual(0)
    }
  })
}
