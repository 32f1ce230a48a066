import AxeBuilder from '@axe-core/playwright'
import type { Page } from '@playwright/test'
import { pressOn, tabTo, typeInto } from './support/keyboard'
import { beginLesson } from './support/lesson'
import { signUp } from './support/people'
import { expect, test } from './support/watched'

const slug = 'a-log-store-on-a-concrete-pad'
const sheetPath = `/sheets/${slug}`
const lessonPath = `${sheetPath}/lessons/the-roof-and-its-pitch`

/** Rise and run of the stop's own roof, as the lesson gives them, in millimetres. */
const [riseMm, runMm] = [241, 900]
const degreesOfRoof = (Math.atan(riseMm / runMm) * 180) / Math.PI
const percentOfRoof = (riseMm / runMm) * 100

/** Twice as fast as it was spoken: it is played all the same. */
async function playFast(page: Page) {
  for (let press = 0; press < 3; press++) await page.getByRole('button', { name: /^Speed/ }).click()
  await page.getByRole('button', { name: 'Play', exact: true }).click()
}
const workbench = (page: Page) => page.getByRole('region', { name: 'Workbench' })
const answerField = (page: Page) => workbench(page).locator('input[name=answer]')

async function answer(page: Page, text: string) {
  await answerField(page).fill(text)
  await workbench(page).getByRole('button', { name: 'Check it' }).click()
}
/** The slope the second stop gives this learner, turned into per cent here. */
async function percentGiven(page: Page) {
  const degrees = await workbench(page).getByLabel('Degrees, given').inputValue()
  return (Math.tan((parseFloat(degrees) * Math.PI) / 180) * 100).toFixed(1)
}
async function expectRoofInked(page: Page) {
  await page.goto('/builds')
  await expect(page.getByRole('img', { name: /Roof: inked/ })).toBeVisible()
  await expect(page.getByText('1 of 10 lessons done.')).toBeVisible()
}

test('a learner enrols, is stopped, is told the slip, answers right and sees the roof inked', async ({
  page,
}) => {
  await signUp(page, 'Nell Abbot')
  await page.goto(sheetPath)
  await page.getByRole('button', { name: 'Start this build' }).click()
  await expect(page.getByRole('img', { name: /Roof: in pencil/ })).toBeVisible()

  await page.goto(lessonPath)
  await expect(page.getByRole('button', { name: 'Play the lesson' })).toBeDisabled()
  await beginLesson(page)

  await playFast(page)
  await expect(page.getByText('The video waits at stop 1')).toBeVisible()
  await expect(workbench(page)).toBeFocused()
  const carryOn = page.getByRole('button', { name: 'Carry on' })
  await expect(carryOn).toBeDisabled()

  await answer(page, percentOfRoof.toFixed(1))
  await expect(workbench(page).getByText('That is the slope in per cent.')).toBeVisible()
  await expect(carryOn).toBeDisabled()
  await expect(workbench(page).getByText(degreesOfRoof.toFixed(1))).toHaveCount(0)

  await answerField(page).fill(degreesOfRoof.toFixed(1))
  await page.reload()
  await expect(answerField(page)).toHaveValue(degreesOfRoof.toFixed(1))
  await workbench(page).getByRole('button', { name: 'Check it' }).click()
  await expect(workbench(page).getByText('is right.')).toBeVisible()
  await workbench(page).getByRole('button', { name: 'Put in my field book' }).click()
  await expect(workbench(page).getByText('It is in your field book.')).toBeVisible()
  for (let press = 0; press < 3; press++) await page.getByRole('button', { name: /^Speed/ }).click()
  await carryOn.click()

  await expect(page.getByText('The video waits at stop 2')).toBeVisible()
  await answer(page, await percentGiven(page))
  await expect(workbench(page).getByText('is right.')).toBeVisible()
  await carryOn.click()

  await expect(page.getByText('Left for the end: stop 3')).toBeVisible({ timeout: 90_000 })
  await expectRoofInked(page)
})

test('what a learner solved on one device is solved on the other', async ({ page, browser }) => {
  await signUp(page, 'Otis Fenn')
  await page.goto(sheetPath)
  await page.getByRole('button', { name: 'Start this build' }).click()
  await page.getByRole('heading', { name: 'Next thing to do' }).waitFor()
  await page.goto(lessonPath)
  await beginLesson(page)
  await page.getByRole('button', { name: /^Stop 1, Pitch in degrees/ }).click()
  await answer(page, degreesOfRoof.toFixed(1))
  await expect(workbench(page).getByText('is right.')).toBeVisible()

  const other = await browser.newContext({ storageState: await page.context().storageState() })
  const phone = await other.newPage()
  await phone.goto(lessonPath)
  await expect(phone.getByRole('button', { name: /^Stop 1, .*, done/ })).toBeVisible()
  await phone.getByRole('button', { name: /^Stop 1/ }).click()
  await expect(answerField(phone)).toHaveValue(degreesOfRoof.toFixed(1))
  await expect(phone.getByRole('button', { name: 'Carry on' })).toBeEnabled()
  await other.close()
})

test('a learner does all of it by keyboard alone', async ({ page }) => {
  await signUp(page, 'Pia Lund')
  await page.goto(sheetPath)
  await page.getByRole('button', { name: 'Start this build' }).waitFor()
  await pressOn(page, /^Start this build/)
  await page.getByRole('heading', { name: 'Next thing to do' }).waitFor()

  await page.goto(lessonPath)
  await page.getByRole('heading', { name: 'Kit check' }).waitFor()
  await tabTo(page, /^Eye protection/)
  const items = await page.getByRole('checkbox').count()
  for (let item = 0; item < items; item++) {
    await page.keyboard.press('Space')
    await page.keyboard.press('Tab')
  }
  await page.keyboard.press('Enter')

  await page.getByRole('slider', { name: 'Where the video is' }).waitFor()
  await tabTo(page, /^Speed/)
  for (let press = 0; press < 3; press++) await page.keyboard.press('Enter')
  await page.keyboard.press('k')
  await expect(workbench(page)).toBeFocused()
  await typeInto(page, /^Degrees/, percentOfRoof.toFixed(1))
  await page.keyboard.press('Enter')
  await expect(workbench(page).getByText('That is the slope in per cent.')).toBeVisible()
  await expect(answerField(page)).toBeFocused()
  await page.keyboard.press('ControlOrMeta+a')
  await page.keyboard.type(degreesOfRoof.toFixed(1))
  await page.keyboard.press('Enter')
  await expect(workbench(page).getByText('is right.')).toBeVisible()
  await pressOn(page, /^Put in my field book/)
  await expect(workbench(page).getByText('It is in your field book.')).toBeVisible()
  await pressOn(page, /^Carry on/, 'Shift+Tab')

  await expect(page.getByText('The video waits at stop 2')).toBeVisible()
  await typeInto(page, /^Per cent/, await percentGiven(page))
  await page.keyboard.press('Enter')
  await expect(workbench(page).getByText('is right.')).toBeVisible()
  await pressOn(page, /^Carry on/, 'Shift+Tab')

  await expect(page.getByText('Left for the end: stop 3')).toBeVisible({ timeout: 90_000 })
  await expectRoofInked(page)
})

for (const [width, height] of [
  [1440, 900],
  [390, 844],
  [360, 740],
] as const) {
  test(`a visitor’s sample lesson holds at ${width} px in both themes`, async ({ page }) => {
    await page.setViewportSize({ width, height })
    await page.goto(`${sheetPath}/lessons/squaring-the-form`)
    await beginLesson(page)
    for (const theme of ['paper', 'sun']) {
      await page.evaluate((name) => (document.documentElement.dataset['theme'] = name), theme)
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([])
    }
    await page.keyboard.press('s')
    await answer(page, '2100')
    await expect(workbench(page).getByText('That is the way round the corner')).toBeVisible()
    for (const theme of ['paper', 'sun']) {
      await page.evaluate((name) => (document.documentElement.dataset['theme'] = name), theme)
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([])
    }
    const overflow = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    )
    expect(overflow).toBeLessThanOrEqual(0)
  })
}

test('a calculator opens with the numbers of its link, works without a line, and is kept', async ({
  page,
  context,
}) => {
  await signUp(page, 'Ruben Oakes')
  await page.goto(sheetPath)
  await page.getByRole('button', { name: 'Start this build' }).click()
  await page.getByRole('heading', { name: 'Next thing to do' }).waitFor()

  await page.goto('/calculators/square?units=imperial&sideA=10 ft&sideB=8 ft')
  const across = page.getByRole('definition').first()
  const field = (name: string) => page.getByRole('textbox', { name })
  await expect(field('Long side')).toHaveValue('3048')
  // 8 ft holds three units of 32 in, 10 ft four of 30: the unit is 30 in or 762 mm, down to 750.
  await expect(across).toHaveText(/^3750.mm$/)
  await expect(page.getByRole('img', { name: /the tape reads 3750/ })).toBeVisible()

  await context.setOffline(true)
  await field('Short side').fill('1.5 m')
  await expect(across).toHaveText(/^2500.mm$/)
  await page.getByLabel('Which number to slide').selectOption('Short side')
  const slider = page.getByRole('slider', { name: 'Short side' })
  await slider.press('End')
  await expect(field('Short side')).toHaveValue('3000')
  await expect(across).toHaveText(/^3750.mm$/)
  await context.setOffline(false)

  const download = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Save the drawing' }).click()
  expect((await download).suggestedFilename()).toBe('square.svg')
  await expect(page).toHaveURL(/sideB=3000/)
  await page.getByRole('button', { name: 'Put in my field book' }).click()
  await expect(page.getByRole('button', { name: 'It is in your field book' })).toBeDisabled()
  const kept = await page.request.get(`/api/courses/${slug}/field-book-entries`)
  expect(await kept.json()).toMatchObject({
    items: [
      {
        ...{ calculator: 'square', calculatorVersion: 1, lessonKey: null, stopKey: null },
        ...{ inputs: { sideA: '3048', sideB: '3000', unit: '' }, outputs: { diagonal: 3.75 } },
      },
    ],
  })
})
