import { statSync } from 'node:fs'
import type { Page, Request } from '@playwright/test'
import { lessonIdOf, lessonPath, makeCourse, readLesson } from './support/bench'
import { longFilm } from './support/films'
import { beginLesson } from './support/lesson'
import { layLine, sendSlowly } from './support/line'
import { comeInstructor } from './support/people'
import { expect, test } from './support/watched'

const slowly = 300_000
const filmBytes = statSync(longFilm).size

/** An empty lesson on the bench, its line slow, and what is sent of its video written down. */
async function beginUpload(page: Page, url = '') {
  await comeInstructor(page)
  const course = await makeCourse(page, ['Pouring'])
  const lessonId = lessonIdOf(course, 'Pouring')
  await page.goto(url + lessonPath(course, lessonId))
  const offsets: number[] = []
  page.on('request', (request: Request) => {
    if (request.method() !== 'PATCH' || !request.url().includes('/api/uploads/')) return
    offsets.push(Number(request.headers()['upload-offset']))
  })
  const line = await sendSlowly(page, slowly)
  await page.getByLabel('Choose a video').setInputFiles(longFilm)
  const progress = page.getByRole('progressbar')
  const share = async () => Number(await progress.getAttribute('aria-valuenow'))
  await expect.poll(share, { timeout: 20_000 }).toBeGreaterThan(0.2)
  return { lessonId, offsets, line }
}
async function expectReady(page: Page, lessonId: number) {
  await expect(page.getByText(/\d:\d\d long, 2 MB/)).toBeVisible({ timeout: 30_000 })
  const { video } = await readLesson(page, lessonId)
  expect(video).toMatchObject({ state: 'ready', bytes: filmBytes })
}

test('a video on its way is paused and goes on from there', async ({ page }) => {
  const { lessonId, offsets, line } = await beginUpload(page)
  await page.getByRole('button', { name: 'Pause' }).click()
  await expect(page.getByText(/of 2 MB, paused/)).toBeVisible()
  expect(offsets).toEqual([0])
  await page.getByRole('button', { name: 'Go on' }).click()
  await expect.poll(() => offsets.length).toBe(2)
  expect(offsets[1]).toBeGreaterThan(filmBytes * 0.1)
  await line.atFullSpeed()
  await expectReady(page, lessonId)
})

test('after a reload the same file goes on where it stopped', async ({ page }) => {
  const { lessonId, offsets } = await beginUpload(page)
  await page.reload()
  await expect(page.getByText('“mixing-and-pouring.mp4” is half in')).toBeVisible()
  await page.getByLabel('Choose the same file').setInputFiles(longFilm)
  await expectReady(page, lessonId)
  expect(offsets).toHaveLength(2)
  expect(offsets[1]).toBeGreaterThan(filmBytes * 0.1)
})

test('a cut line is told, and the video goes on by itself when it is back', async ({
  page,
  baseURL,
}) => {
  const wire = await layLine(baseURL ?? '')
  const { lessonId, offsets, line } = await beginUpload(page, wire.url)
  wire.cut()
  await expect(page.getByText('the line is cut')).toBeVisible()
  wire.mend()
  await line.atFullSpeed()
  await expectReady(page, lessonId)
  expect(Math.max(...offsets)).toBeGreaterThan(filmBytes * 0.1)
  wire.takeUp()
})

/** What the page holds after its rubbish was collected. */
async function countHeld(page: Page) {
  const session = await page.context().newCDPSession(page)
  await session.send('Performance.enable')
  await session.send('HeapProfiler.collectGarbage')
  const { metrics } = await session.send('Performance.getMetrics')
  const valueOf = (name: string) => metrics.find((metric) => metric.name === name)?.value ?? NaN
  return { nodes: valueOf('Nodes'), listeners: valueOf('JSEventListeners') }
}

test('fifty changes between sheet and lesson leave no player behind', async ({ page }) => {
  await page.goto('/sheets/a-log-store-on-a-concrete-pad')
  const comeAndGo = async () => {
    await page.getByRole('link', { name: 'Reading your ground' }).first().click()
    await page.locator('video').waitFor({ state: 'attached' })
    await page.goBack()
    await page.getByRole('heading', { name: 'Stages and lessons' }).waitFor()
  }
  await page.getByRole('link', { name: 'Reading your ground' }).first().click()
  await beginLesson(page)
  await page.goBack()
  for (let round = 0; round < 3; round++) await comeAndGo()
  const before = await countHeld(page)
  const rounds = 22
  for (let round = 0; round < rounds; round++) await comeAndGo()
  await expect(page.locator('video')).toHaveCount(0)
  // A drawing may just be under way; a player left behind would hold its listeners and its lesson’s hundreds of nodes.
  const after = await countHeld(page)
  expect(after.listeners - before.listeners).toBeLessThan(rounds)
  expect(after.nodes - before.nodes).toBeLessThan(rounds * 30)
})
