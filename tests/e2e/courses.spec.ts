import { expectSaved, lessonIdOf, readCourse, sendCaptions, sendFilm } from './support/bench'
import { brokenCaptions, captions, falseFilm, film, filmName, vttFile } from './support/films'
import { pressOn, tabTo, typeInto } from './support/keyboard'
import { comeInstructor, newWord, signUpInstructor } from './support/people'
import { expect, test } from './support/watched'

test('an instructor builds a lesson, from sign-up to issue', async ({ page, browser }) => {
  const title = `A lean-to for tools ${newWord()}`
  const choose = (label: string, file: Parameters<typeof page.setInputFiles>[1]) =>
    page.getByLabel(label).setInputFiles(file)

  await test.step('sign up, open a bench, draw a course', async () => {
    await signUpInstructor(page)
    await page.getByRole('link', { name: 'Draw a new course' }).click()
    await page.getByLabel('Title').fill(title)
    await page.getByLabel('What you will have built').fill('A lean-to that keeps tools dry.')
    await page.getByLabel('Cover drawing').selectOption('A deck at ground level')
    await page.getByLabel('Weekends').fill('3')
    for (const stage of ['Base', 'Frame', 'Cladding', 'Finish'])
      await page.getByLabel(stage, { exact: true }).uncheck()
    await page.getByRole('button', { name: 'Make the course' }).click()
    await expect(page.getByRole('heading', { level: 1, name: title })).toBeVisible()
    await expect(page.getByRole('button', { name: 'Issue Rev A' })).toBeDisabled()
  })
  const courseUrl = page.url()
  const courseId = Number(courseUrl.split('/').at(-1))

  await test.step('add lessons', async () => {
    for (const lesson of ['Strings and pegs', 'The slope of the roof']) {
      await page.getByLabel('New lesson in Roof').fill(lesson)
      await page.getByRole('button', { name: 'Add the lesson' }).last().click()
      await expect(page.getByRole('link', { name: lesson })).toBeVisible()
    }
  })
  const row = page.getByRole('listitem').filter({ hasText: 'The slope of the roof' })
  await page.getByRole('link', { name: 'The slope of the roof' }).first().click()

  await test.step('hazards and their kit check', async () => {
    await page.getByLabel('What it is about').fill('How steep, and how long the rafter is.')
    await page.getByRole('button', { name: 'Add a hazard' }).click()
    await page.getByLabel('Kind of hazard 1').selectOption('A drop, or something that can fall')
    await page.getByLabel('Hazard 1 in words').fill('Lifting a lid over your head')
    await page.getByRole('button', { name: 'Add a caution' }).click()
    const kit = page.getByRole('region', { name: 'Kit check' })
    await kit.getByLabel('What', { exact: true }).fill('Prop the lid before you reach under it')
    await kit.getByLabel('Why, or how').fill('It falls on the hand that let it go.')
    await expectSaved(page)
  })

  await test.step('the video: what is none is refused, a real one comes in', async () => {
    await choose('Choose a video', falseFilm)
    await expect(page.getByText('“lecture.mp4” cannot be used.').first()).toBeVisible({
      timeout: 20_000,
    })
    await page.getByLabel(/Choose a video|Send another video/).setInputFiles(film)
    await expect(page.getByText(/0:51 long|0:50 long/)).toBeVisible({ timeout: 30_000 })
    await expect(page.getByText(filmName).first()).toBeVisible()
    await expect(page.getByRole('heading', { name: 'The tape' })).toBeVisible()
  })

  await test.step('captions: a broken file stores nothing, a good one is edited', async () => {
    await choose('Choose a caption file', vttFile('broken.vtt', brokenCaptions))
    const errors = page.getByRole('list', { name: 'Errors in the file' })
    await expect(errors).toContainText('Line 6, column 24')
    await expect(errors).toContainText('Line 9, column 19')
    await expect(page.getByText('None yet. A course is issued only with captions')).toBeVisible()
    await choose('Choose a caption file', vttFile('roof.vtt', captions))
    await expect(page.getByText('“roof.vtt” is in:')).toBeVisible()
    const isKept = page.waitForResponse((response) => response.request().method() === 'PUT')
    await page.getByLabel('Words of caption 1', { exact: true }).fill('First: prop the lid.')
    expect((await isKept).ok()).toBe(true)
    await page.reload()
    await expect(page.getByLabel('Words of caption 1', { exact: true })).toHaveValue(
      'First: prop the lid.',
    )
  })

  await test.step('a stop set while playing, moved by keys', async () => {
    await page.getByRole('button', { name: 'Play', exact: true }).first().click()
    await expect(page.locator('.controls .time b')).toHaveText(/0:0[2-9]|0:1/, { timeout: 20_000 })
    await page.getByRole('button', { name: 'Set a stop here' }).click()
    await page.getByRole('button', { name: 'Pause', exact: true }).first().click()
    const at = page.getByLabel('Holds at')
    await expect(page.getByLabel('Name on the tape')).toHaveValue('Stop 1')
    await at.fill('0:10.0')
    await page.getByRole('button', { name: /^Stop 1,/ }).focus()
    await page.keyboard.press('ArrowRight')
    await expect(at).toHaveValue('0:11.0')
    await page.keyboard.press('Shift+ArrowRight')
    await expect(at).toHaveValue('0:21.0')
    await page.getByLabel('Name on the tape').fill('Angle of the rafter')
    await expectSaved(page)
  })

  await test.step('a calculator exercise at it', async () => {
    await page.getByRole('link', { name: 'Write the exercise' }).click()
    await page.getByRole('radio', { name: 'Worked with a calculator' }).check()
    await page.getByLabel('Calculator', { exact: true }).selectOption({ value: 'pitch' })
    await page.getByLabel('What you ask').fill('How steep is it, in degrees?')
    await expect(page.getByText('None: it can go out as it is.')).toBeVisible()
    await expectSaved(page)
    await page.getByRole('link', { name: 'Back to the tape' }).click()
    await expect(page.getByText('“How steep is it, in degrees?”')).toBeVisible()
  })

  await test.step('a second stop by typed time, with a quiz', async () => {
    await page.getByRole('button', { name: 'Set a stop here' }).click()
    await expect(page.getByLabel('Name on the tape')).toHaveValue('Stop 2')
    await page.getByLabel('Holds at').fill('0:40')
    await page.getByLabel('Name on the tape').fill('Before the felt')
    await expect(page.getByRole('heading', { name: 'Stop 2' })).toBeVisible()
    await page.getByRole('link', { name: 'Write the exercise' }).click()
    await page.getByRole('radio', { name: 'A quiz' }).check()
    await page.getByLabel('What it is about').fill('Before the felt goes on.')
    await page.getByLabel('What you ask').fill('Which way do the laps lie?')
    await page.getByRole('textbox', { name: 'Choice A' }).fill('Upper over lower')
    await page.getByRole('textbox', { name: 'Choice B' }).fill('Lower over upper')
    await page.getByLabel('What it would do on site').last().fill('Rain runs in under each lap.')
    await expectSaved(page)
  })

  await test.step('its snag leads to its place', async () => {
    await page.goto(courseUrl)
    const snag = page.getByRole('listitem').filter({ hasText: 'No choice is marked right' })
    await expect(snag).toBeVisible()
    await expect(page.getByRole('button', { name: 'Issue Rev A' })).toBeDisabled()
    await snag.getByRole('link', { name: 'To the stop' }).click()
    await expect(page.getByRole('heading', { name: 'Stop 2: Before the felt' })).toBeVisible()
    await page.getByRole('radio', { name: 'A wrong' }).check()
    await page.getByLabel('Why it holds').fill('Rain runs off the lap.')
    await expect(page.getByText('None: it can go out as it is.')).toBeVisible()
    await expectSaved(page)
  })

  await test.step('reorder by keyboard, then by drag', async () => {
    const course = await readCourse(page, courseId)
    const first = lessonIdOf(course, 'Strings and pegs')
    await sendFilm(page, first)
    await sendCaptions(page, first)
    await page.goto(courseUrl)
    const grip = (name: string) => page.getByRole('button', { name: `Move ${name}` })
    const orderOf = async () =>
      (await readCourse(page, courseId)).stages.map(({ lessons }) => lessons.map((l) => l.title))
    await grip('Strings and pegs').focus()
    await page.keyboard.press('Space')
    for (let count = 0; count < 3; count++) await page.keyboard.press('ArrowUp')
    await page.keyboard.press('Space')
    await expect.poll(orderOf).toEqual([['Strings and pegs'], ['The slope of the roof']])
    const [from, to] = [
      await grip('The slope of the roof').boundingBox(),
      await grip('Strings and pegs').boundingBox(),
    ]
    if (!from || !to) throw new Error('The grips are not on the page.')
    await page.mouse.move(from.x + from.width / 2, from.y + from.height / 2)
    await page.mouse.down()
    await page.mouse.move(to.x + to.width / 2, to.y + 40, { steps: 12 })
    await page.mouse.move(to.x + to.width / 2, to.y + 2, { steps: 8 })
    await page.mouse.up()
    await expect
      .poll(async () => (await orderOf())[0]?.toSorted())
      .toEqual(['Strings and pegs', 'The slope of the roof'])
  })

  await test.step('see it as a learner would', async () => {
    await row.getByRole('link', { name: 'The slope of the roof' }).click()
    await page.getByRole('link', { name: 'See it as a learner would' }).click()
    await expect(page).toHaveURL(/draft=1/)
    await expect(
      page.getByText('Prop the lid before you reach under it', { exact: true }),
    ).toBeVisible()
  })

  await test.step('issue Rev A', async () => {
    await page.goto(courseUrl)
    await page.getByRole('button', { name: 'Issue Rev A' }).click()
    await page.getByRole('button', { name: 'Issue it' }).click()
    await expect(page.getByRole('heading', { name: 'Rev A is issued' })).toBeVisible()
    await expect(page.getByRole('textbox', { name: 'Title' })).toHaveCount(0)
    await page.getByRole('link', { name: 'The slope of the roof' }).first().click()
    await expect(page.getByText('Rev A is issued: this lesson stays')).toBeVisible()
    await expect(page.getByLabel('What it is about')).toBeDisabled()
    await expect(page.getByRole('button', { name: 'Set a stop here' })).toHaveCount(0)
  })

  await test.step('a visitor finds it in the register', async () => {
    const visitor = await (await browser.newContext()).newPage()
    await visitor.goto('/register')
    await visitor.getByRole('link', { name: title }).first().click()
    await expect(visitor.getByRole('heading', { name: title })).toBeVisible()
    await expect(visitor.getByText('The slope of the roof').first()).toBeVisible()
    await visitor.context().close()
  })
})

test('the same by keyboard alone', async ({ page }) => {
  const title = `A bench for boots ${newWord()}`
  await comeInstructor(page)
  await pressOn(page, /^Draw a new course/)
  await page.getByRole('heading', { name: 'A new course' }).waitFor()
  await typeInto(page, /^Title/, title)
  await typeInto(page, /^What you will have built/, 'A bench that stands level on two stones.')
  await pressOn(page, /^Make the course/)
  await page.getByRole('heading', { level: 1, name: title }).waitFor()
  const courseUrl = page.url()

  await typeInto(page, /^New lesson in Ground/, 'Two stones, level')
  await page.keyboard.press('Enter')
  await page.getByRole('link', { name: 'Two stones, level' }).waitFor()
  const course = await readCourse(page, Number(courseUrl.split('/').at(-1)))
  const lessonId = lessonIdOf(course, 'Two stones, level')
  await sendFilm(page, lessonId)
  await sendCaptions(page, lessonId)

  await pressOn(page, /^Two stones, level/, 'Shift+Tab')
  await page.getByRole('heading', { name: 'The tape' }).waitFor()
  await pressOn(page, /^Set a stop here/)
  await expect(page.getByLabel('Name on the tape')).toHaveValue('Stop 1')
  await tabTo(page, /^Stop 1,/, 'Shift+Tab')
  await page.keyboard.press('Shift+ArrowRight')
  await page.keyboard.press('ArrowRight')
  await page.keyboard.press('ArrowRight')
  await expect(page.getByLabel('Holds at')).toHaveValue('0:12.0')
  await typeInto(page, /^Name on the tape/, 'Height of the stone')

  await pressOn(page, /^Write the exercise/)
  await page.getByRole('heading', { name: 'The exercise' }).waitFor()
  await tabTo(page, /^Worked with a calculator/)
  await page.keyboard.press('Space')
  await typeInto(page, /^What you ask/, 'How much concrete is that?')
  await expect(page.getByText('None: it can go out as it is.')).toBeVisible()
  await expectSaved(page)

  await pressOn(page, new RegExp(`^${title}`), 'Shift+Tab')
  await page.getByRole('heading', { name: 'Before Rev A goes out' }).waitFor()
  await pressOn(page, /^Issue Rev A/)
  await page.getByRole('dialog').waitFor()
  await pressOn(page, /^Issue it/)
  await expect(page.getByRole('heading', { name: 'Rev A is issued' })).toBeVisible()
})
