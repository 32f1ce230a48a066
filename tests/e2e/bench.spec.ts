import AxeBuilder from '@axe-core/playwright'
import {
  expectSaved,
  lessonIdOf,
  lessonPath,
  makeCourse,
  readCourse,
  readLesson,
  sendCaptions,
  sendFilm,
  setStop,
} from './support/bench'
import { comeInstructor } from './support/people'
import { expect, test } from './support/watched'

test('nothing typed is lost: without signal, over a reload, in two windows', async ({
  page,
  context,
}) => {
  await comeInstructor(page)
  const course = await makeCourse(page, ['Two stones, level'])
  const lessonId = lessonIdOf(course, 'Two stones, level')
  await sendFilm(page, lessonId)
  const stop = await setStop(page, lessonId, 20_000)
  const coursePath = `/bench/courses/${course.id}`
  const outcome = page.getByLabel('What you will have built')
  const unsent = page.getByText('No signal. What you typed is kept here')

  await test.step('without signal it is kept, and saved when it is back', async () => {
    await page.goto(coursePath)
    await outcome.fill('A bench that stands level.')
    await expectSaved(page)
    await context.setOffline(true)
    await outcome.fill('A bench that stands level on two stones.')
    await expect(unsent).toBeVisible()
    await context.setOffline(false)
    await expectSaved(page)
    expect((await readCourse(page, course.id)).outcome).toBe(
      'A bench that stands level on two stones.',
    )
  })

  await test.step('a stop is kept over a reload while the server is away', async () => {
    const stopRoute = `**/api/bench/stops/${stop.id}`
    await page.goto(lessonPath(course, lessonId))
    await page.route(stopRoute, (route) => route.abort())
    await page.getByLabel('Name on the tape').fill('Height of the stone')
    await page.getByLabel('Holds at').fill('0:2x')
    await expect(page.getByText('Write minutes and seconds, such as 6:20.5.')).toBeVisible()
    await page.reload()
    await expect(page.getByLabel('Name on the tape')).toHaveValue('Height of the stone')
    await expect(page.getByLabel('Holds at')).toHaveValue('0:2x')
    await page.unroute(stopRoute)
    await page.getByLabel('Holds at').fill('0:25')
    await expectSaved(page)
    const { stops } = await readLesson(page, lessonId)
    expect(stops[0]).toMatchObject({ name: 'Height of the stone', atMs: 25_000 })
  })

  await test.step('two windows keep both, and say what the other wrote', async () => {
    const other = await context.newPage()
    await other.goto(coursePath)
    await page.goto(coursePath)
    await expect(outcome).toBeVisible()
    await other.getByLabel('What you will have built').fill('A bench of oak.')
    await other.getByLabel('Weekends').fill('4')
    await expectSaved(other)
    await page.getByLabel('What this sheet does not cover').fill('Cushions.')
    await expectSaved(page)
    await expect(outcome).toHaveValue('A bench of oak.')
    await expect(page.getByLabel('Weekends')).toHaveValue('4')
    await other.getByLabel('What you will have built').fill('A bench of larch.')
    await expectSaved(other)
    await expect
      .poll(async () => (await readCourse(page, course.id)).outcome)
      .toBe('A bench of larch.')
    await outcome.fill('A bench of ash.')
    await expect(page.getByText('“A bench of larch.”. What stands here was kept.')).toBeVisible()
    const kept = await readCourse(page, course.id)
    expect(kept).toMatchObject({
      outcome: 'A bench of ash.',
      weekends: 4,
      notCovered: 'Cushions.',
    })
  })
})

for (const width of [1440, 360]) {
  test(`axe finds nothing on the bench at ${width} px in either theme, nor sideways scroll`, async ({
    page,
  }) => {
    await page.setViewportSize({ width, height: 800 })
    await comeInstructor(page)
    const course = await makeCourse(page, ['Two stones, level', 'The seat'])
    const lessonId = lessonIdOf(course, 'Two stones, level')
    await sendFilm(page, lessonId)
    await sendCaptions(page, lessonId)
    const worked = await setStop(page, lessonId, 20_000)
    const asked = await setStop(page, lessonId, 30_000, 'Which stone')
    const lesson = lessonPath(course, lessonId)

    await test.step('write an exercise of each kind', async () => {
      for (const [stop, kind] of [
        [worked, 'Worked with a calculator'],
        [asked, 'A quiz'],
      ] as const) {
        await page.goto(`${lesson}/stops/${stop.id}`)
        await page.getByRole('radio', { name: kind }).check()
      }
    })
    for (const [path, heading] of [
      [`/bench/courses/${course.id}`, 'Title block'],
      [lesson, 'The tape'],
      [`${lesson}/stops/${worked.id}`, 'Numbers given'],
      [`${lesson}/stops/${asked.id}`, /Question 1/],
    ] as const) {
      await test.step(path, async () => {
        await page.goto(path)
        await page.getByRole('heading', { name: heading, exact: true }).waitFor()
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
