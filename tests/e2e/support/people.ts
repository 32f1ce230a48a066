import type { Page } from '@playwright/test'
import { expect } from './watched'

let count = 0
const passphrase = 'spirit level and a long straight edge'
const newEmail = () => `${newWord()}@example.test`

/** A word that no other test has used. */
export const newWord = () => `${Date.now().toString(36)}${(count++).toString(36)}`

/** Somebody new, signed up by the form. */
export async function signUp(page: Page, displayName = 'Ida Marsh') {
  await page.goto('/sign-up')
  await page.getByLabel('Name others see').fill(displayName)
  await page.getByLabel('Email').fill(newEmail())
  await page.getByLabel('Passphrase').fill(passphrase)
  await page.getByLabel('I am 16 or older.').check()
  await page.getByRole('button', { name: 'Make the account' }).click()
  await page.waitForURL('**/register')
}

/** Somebody new with a bench of their own, who stands before it; all by the pages. */
export async function signUpInstructor(page: Page) {
  await signUp(page)
  await page.getByRole('link', { name: 'Ida Marsh' }).click()
  await page.getByRole('button', { name: 'Open my bench' }).click()
  await page.getByRole('heading', { name: 'The bench' }).waitFor()
}

/** The same without the forms. */
export async function comeInstructor(page: Page) {
  await page.goto('/sign-up')
  const { origin } = new URL(page.url())
  const ask = async (path: string, data: object) => {
    const answer = await page.request.post(`${origin}/api/accounts${path}`, {
      headers: { Origin: origin },
      data,
    })
    expect(answer.ok()).toBe(true)
  }
  await ask('', {
    displayName: 'Ida Marsh',
    email: newEmail(),
    passphrase,
    units: 'metric',
    isOldEnough: true,
  })
  await ask('/me/bench', {})
  await page.goto('/bench')
  await page.getByRole('heading', { name: 'The bench' }).waitFor()
}
