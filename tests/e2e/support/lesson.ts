import type { Page } from '@playwright/test'

/** Ticks the kit check, as soon as it is there, and begins the lesson. */
export async function beginLesson(page: Page) {
  await tickKit(page)
  await page.getByRole('button', { name: 'Play the lesson' }).click()
  await page.getByRole('slider', { name: 'Where the video is' }).waitFor()
}

async function tickKit(page: Page) {
  const items = page.getByRole('checkbox')
  await items.first().waitFor()
  for (const item of await items.all()) await item.check()
}
