import type { Page } from '@playwright/test'

const mostPresses = 150

/** What a screen reader would call the element that has the focus, nearly. */
const nameOfFocused = (page: Page) =>
  page.evaluate(() => {
    const element = document.activeElement as HTMLInputElement | null
    const spoken = element?.getAttribute('aria-label') ?? element?.labels?.[0]?.textContent
    return (spoken ?? element?.textContent ?? '').trim()
  })

/** Presses Tab until the focus stands on what is called so. */
export async function tabTo(page: Page, name: RegExp, key: 'Tab' | 'Shift+Tab' = 'Tab') {
  for (let count = 0; count < mostPresses; count++) {
    await page.keyboard.press(key)
    if (name.test(await nameOfFocused(page))) return
  }
  throw new Error(`The keyboard does not reach ${name.source}.`)
}
export async function pressOn(page: Page, name: RegExp, key: 'Tab' | 'Shift+Tab' = 'Tab') {
  await tabTo(page, name, key)
  await page.keyboard.press('Enter')
}
export async function typeInto(page: Page, name: RegExp, text: string) {
  await tabTo(page, name)
  await page.keyboard.press('ControlOrMeta+a')
  await page.keyboard.type(text)
}
