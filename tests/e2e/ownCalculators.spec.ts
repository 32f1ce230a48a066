import AxeBuilder from '@axe-core/playwright'
import type { Page } from '@playwright/test'
import {
  expectSaved,
  lessonIdOf,
  lessonPath,
  makeCourse,
  makeOwnCalculator,
  sendFilm,
  setStop,
} from './support/bench'
import { pressOn, tabTo, typeInto } from './support/keyboard'
import { comeInstructor } from './support/people'
import { expect, test } from './support/watched'

/** The two cases are worked by hand: 12 × 0.4 × 0.15 m is 0.72 m³, 12 barrows of 60 L; 3 m of it are 0.18 m³, 3 barrows. */
const trench = { length: '12 m', width: '0.4 m', depth: '150 mm', barrow: '60 L', barrows: '12' }
const shortTrench = { ...trench, length: '3 m', barrows: '3' }

const formulaOf = (page: Page, label: string) => page.getByLabel(`Formula for ${label}`)
const keep = (page: Page, version: number) =>
  page.getByRole('button', { name: `Keep as version ${version}` })

async function addInput(page: Page, number: number, label: string, measured: string) {
  if (number > 1) await page.getByRole('button', { name: 'Add an input' }).click()
  const row = page
    .getByRole('region', { name: 'What a person gives' })
    .getByRole('listitem')
    .nth(number - 1)
  await row.getByLabel('Label').fill(label)
  await row.getByLabel('It is').selectOption({ label: measured })
}
async function writeExample(page: Page, number: number, typed: typeof trench) {
  const given = page.getByRole('group', { name: `Example ${number}: given` })
  await given.getByLabel('Length').fill(typed.length)
  await given.getByLabel('Width').fill(typed.width)
  await given.getByLabel('Depth').fill(typed.depth)
  await given.getByLabel('Barrow').fill(typed.barrow)
  const expected = page.getByRole('group', { name: `Example ${number}: must come out` })
  await expected.getByLabel('Barrows').fill(typed.barrows)
  return expected
}

test('an instructor writes a calculator, mends it, keeps it and makes a stop of it', async ({
  page,
}) => {
  await comeInstructor(page)
  const course = await makeCourse(page, ['The trench'])
  const lessonId = lessonIdOf(course, 'The trench')
  await sendFilm(page, lessonId)
  const stop = await setStop(page, lessonId, 20_000, 'Barrows of stone')

  await test.step('it is begun by keyboard', async () => {
    await page.goto(`/bench/courses/${course.id}`)
    await page.getByRole('link', { name: 'Open the calculators of this course' }).click()
    await page.getByRole('heading', { name: 'A new one' }).waitFor()
    await typeInto(page, /^What it works out/, 'Barrows of stone')
    await pressOn(page, /^Write the calculator/)
    await page.getByRole('heading', { name: 'Barrows of stone', level: 1 }).waitFor()
    await typeInto(page, /^The question it answers/, 'How many barrows fill the trench?')
  })

  await test.step('its inputs, in the order that is wanted', async () => {
    await addInput(page, 1, 'Length', 'a length')
    await addInput(page, 2, 'Depth', 'a length')
    await addInput(page, 3, 'Width', 'a length')
    await addInput(page, 4, 'Barrow', 'a volume')
    const rows = page.getByRole('region', { name: 'What a person gives' }).getByRole('heading')
    await tabTo(page, /^Move input 3 up/, 'Shift+Tab')
    await page.keyboard.press('Enter')
    await expect(rows).toHaveText(['What a person gives', 'Length', 'Width', 'Depth', 'Barrow'])
    await page.keyboard.press('Alt+ArrowDown')
    await expect(rows).toHaveText(['What a person gives', 'Length', 'Depth', 'Width', 'Barrow'])
    await expect(page.getByRole('button', { name: 'Move input 3 up' })).toBeFocused()
  })

  const answers = page.getByRole('region', { name: 'What comes out' }).first()
  await test.step('a mistake is shown at its character', async () => {
    await answers.getByLabel('Label').fill('Barrows')
    await answers.getByLabel('It is').selectOption({ label: 'a number of things' })
    await formulaOf(page, 'Barrows').fill('ceil(length * width * depth / barow)')
    await expect(formulaOf(page, 'Barrows')).toHaveAccessibleDescription(
      /^At character 31: Nothing is called barow\. Did you mean barrow\?/,
    )
    await expect(answers.locator('mark')).toHaveText('barow')
    await expect(keep(page, 1)).toBeDisabled()
    const mark = await answers.locator('mark').boundingBox()
    const point = await answers.locator('.point').boundingBox()
    const middle = (box: typeof mark) => (box?.x ?? 0) + (box?.width ?? 0) / 2
    expect(Math.abs(middle(mark) - middle(point))).toBeLessThan(2)
  })

  await test.step('units that do not fit are told, then mended', async () => {
    await formulaOf(page, 'Barrows').fill('ceil(length * width * depth / barrow + depth)')
    await expect(formulaOf(page, 'Barrows')).toHaveAccessibleDescription(/cannot be added/)
    await formulaOf(page, 'Barrows').fill('ceil(length * width * depth / barrow)')
    await expect(answers.locator('mark')).toHaveCount(0)
  })

  await test.step('a name that is changed stays the same everywhere', async () => {
    const name = page
      .getByRole('region', { name: 'What a person gives' })
      .getByRole('listitem')
      .nth(3)
      .getByLabel('Called in formulas')
    await name.fill('one_barrow')
    await name.blur()
    await expect(formulaOf(page, 'Barrows')).toHaveValue(
      'ceil(length * width * depth / one_barrow)',
    )
  })

  await test.step('two examples that agree, and a source', async () => {
    await writeExample(page, 1, trench)
    const second = await writeExample(page, 2, { ...shortTrench, barrows: '4' })
    await expect(second.getByText('It gives 3. Find out which is wrong.')).toBeVisible()
    await second.getByLabel('Barrows').fill(shortTrench.barrows)
    await expect(second.getByText('Agrees: it gives 3.')).toBeVisible()
    await page.getByLabel('Title of the source').fill('Length times width times depth')
    await expectSaved(page)
  })

  await test.step('it is tried out as a learner meets it', async () => {
    const preview = page.getByRole('region', { name: 'As a learner meets it' })
    await preview.getByLabel('Length').fill('6 m')
    await preview.getByLabel('Width').fill('400')
    await preview.getByLabel('Depth').fill('150')
    await preview.getByLabel('Barrow').fill('60 L')
    // 6 × 0.4 × 0.15 m is 0.36 m³, six barrows of 60 L.
    await expect(preview.getByRole('definition')).toHaveText('6')
    await expect(preview.getByText('Barrows:', { exact: true })).toBeVisible()
  })

  await test.step('it is kept as a version', async () => {
    await keep(page, 1).click()
    await expect(page.getByText('Version 1 says just this: it can be put in a stop.')).toBeVisible()
    await expect(page.getByText('at no stop')).toBeVisible()
  })

  const stopPath = `${lessonPath(course, lessonId)}/stops/${stop.id}`
  await test.step('a stop is made of it, and five learners see it', async () => {
    await page.goto(stopPath)
    await page.getByRole('radio', { name: 'Worked with a calculator' }).check()
    await page.getByLabel('Calculator', { exact: true }).selectOption({
      label: 'Barrows of stone (own)',
    })
    await page.getByLabel('What you ask').fill('How many barrows do you wheel?')
    const given = (label: string) => page.getByRole('group', { name: label, exact: true })
    await given('Length').getByRole('radio', { name: 'Ranged' }).check()
    await given('Length').getByLabel('From').fill('6 m')
    await given('Length').getByLabel('To').fill('6 m')
    await given('Length').getByLabel('Step').fill('100 mm')
    await given('Width').getByLabel('Number').fill('400 mm')
    await given('Depth').getByLabel('Number').fill('150 mm')
    await given('Barrow').getByLabel('Number').fill('61 L')
    const learners = page.getByRole('table', { name: 'Five learners' })
    // 0.36 m³ in barrows of 61 L: 5.9, and so six.
    await expect(learners.getByRole('row').nth(1)).toContainText('6000 mm')
    await expect(learners.getByRole('row').nth(1).getByRole('cell').nth(1)).toHaveText('6')
    await expectSaved(page)
  })

  await test.step('a newer version is offered where the older one is used', async () => {
    await page.goto(`/bench/courses/${course.id}/calculators`)
    await expect(page.getByRole('cell', { name: 'at 1 stop' })).toBeVisible()
    await page.getByRole('link', { name: 'Barrows of stone' }).click()
    await expect(page.getByText('1 stop is made of it, so it stays.')).toBeVisible()
    await page.getByLabel('When to use it').fill('Before the stone is ordered.')
    await keep(page, 2).click()
    await expect(page.getByText('Version 2 says just this')).toBeVisible()
    await page.goto(stopPath)
    await page.getByRole('button', { name: 'Take version 2' }).click()
    await expect(page.getByText('This stop is made of version')).toHaveCount(0)
    await expectSaved(page)
    await page.reload()
    await expect(page.getByRole('group', { name: 'Barrow', exact: true })).toBeVisible()
    await expect(page.getByLabel('What you ask')).toHaveValue('How many barrows do you wheel?')
    await expect(page.getByText('This stop is made of version')).toHaveCount(0)
  })
})

test('nothing typed is lost when two write the same calculator, nor where a bound cannot be read', async ({
  page,
  context,
}) => {
  await comeInstructor(page)
  const course = await makeCourse(page, ['The trench'])
  const own = await makeOwnCalculator(page, course.id)
  const path = `/bench/courses/${course.id}/calculators/${own.key}`
  const question = (on: Page) => on.getByLabel('The question it answers')
  await page.goto(path)
  await expect(question(page)).toBeVisible()

  await test.step('two windows keep both, and say so where both wrote', async () => {
    const other = await context.newPage()
    await other.goto(path)
    await question(other).fill('How many barrows of stone?')
    await expectSaved(other)
    await page.getByLabel('When to use it').fill('For trenches.')
    await expectSaved(page)
    await expect(question(page)).toHaveValue('How many barrows of stone?')
    await question(other).fill('How many loads?')
    await expectSaved(other)
    await question(page).fill('How many trips?')
    await expect(page.getByText('“How many loads?”. What stands here was kept.')).toBeVisible()
    await other.close()
  })

  await test.step('a bound that cannot be read is marked, kept, and holds up nothing else', async () => {
    const least = page.getByLabel('Least').first()
    await least.fill('a bit')
    await expect(least).toHaveAttribute('aria-invalid', 'true')
    await page.getByLabel('When to use it').fill('For drains.')
    await expect(page.getByText('Not saved: a marked field cannot be taken yet.')).toBeVisible()
    await page.reload()
    await expect(page.getByLabel('Least').first()).toHaveValue('a bit')
    await expect(keep(page, 1)).toBeDisabled()
    await page.getByLabel('Least').first().fill('350')
    await expectSaved(page)
    await page.reload()
    await expect(page.getByLabel('When to use it')).toHaveValue('For drains.')
  })
})

test('a calculator of another course is copied, and one that no stop needs is taken off', async ({
  page,
}) => {
  await comeInstructor(page)
  const from = await makeCourse(page, ['The trench'])
  const to = await makeCourse(page, ['The drain'])
  await makeOwnCalculator(page, from.id)
  await page.goto(`/bench/courses/${to.id}/calculators`)
  await expect(page.getByText('None yet. Write down what is measured')).toBeVisible()
  await page.getByRole('button', { name: `Copy Barrows of stone from ${from.title}` }).click()
  await page.getByRole('heading', { name: 'Barrows of stone', level: 1 }).waitFor()
  await expect(page.getByRole('link', { name: to.title })).toBeVisible()
  await keep(page, 1).click()
  await expect(page.getByText('Version 1 says just this')).toBeVisible()
  await page.getByRole('button', { name: 'Take it off the bench' }).click()
  await page.getByRole('button', { name: 'Take it off', exact: true }).click()
  await expect(page.getByText('None yet. Write down what is measured')).toBeVisible()
})

for (const width of [1440, 360]) {
  test(`axe finds nothing on own calculators at ${width} px in either theme, nor sideways scroll`, async ({
    page,
  }) => {
    await page.setViewportSize({ width, height: 800 })
    await comeInstructor(page)
    const course = await makeCourse(page, ['The trench'])
    const own = await makeOwnCalculator(page, course.id)
    const list = `/bench/courses/${course.id}/calculators`
    for (const [path, heading] of [
      [list, 'Copy from another course'],
      [`${list}/${own.key}`, 'Worked steps'],
    ] as const) {
      await test.step(path, async () => {
        await page.goto(path)
        await page.getByRole('heading', { name: heading, exact: true }).waitFor()
        if (heading === 'Worked steps') {
          await formulaOf(page, 'Barrows').fill('ceil(trench / barow)')
          await page.locator('mark').waitFor()
        }
        for (const theme of ['paper', 'sun']) {
          await page.evaluate((name) => (document.documentElement.dataset['theme'] = name), theme)
          expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([])
        }
        const overflow = await page.evaluate(
          () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
        )
        expect(overflow, 'sideways scroll').toBeLessThanOrEqual(0)
      })
    }
  })
}
