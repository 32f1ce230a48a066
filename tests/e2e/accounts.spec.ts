import { expect, test, type Browser, type Page } from '@playwright/test'

const passphrase = 'four planks and a level'
const newEmail = () => `${crypto.randomUUID()}@example.test`

async function signUp(page: Page, email: string, name = 'Ines Kvam') {
  await page.goto('/sign-up')
  await page.getByLabel('Name others see').fill(name)
  await page.getByLabel('Email').fill(email)
  await page.getByLabel('Passphrase').fill(passphrase)
  await page.getByText('I am 16 or older.').click()
  await page.getByRole('button', { name: 'Make the account' }).click()
  await expect(page).toHaveURL(/\/register$/)
}
async function signIn(page: Page, email: string) {
  await page.goto('/sign-in')
  await page.getByLabel('Email').fill(email)
  await page.getByLabel('Passphrase').fill(passphrase)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page).toHaveURL(/\/register$/)
}
const pageOf = async (browser: Browser) => (await browser.newContext()).newPage()

test('a newcomer is told field by field what is missing, and loses nothing typed', async ({
  page,
}) => {
  await page.goto('/sign-up')
  await page.getByLabel('Name others see').fill('Ines Kvam')
  await page.getByLabel('Email').fill('ines.example')
  await page.getByLabel('Passphrase').fill('too short')
  await page.getByRole('button', { name: 'Make the account' }).click()
  await expect(page.getByText('An address with an @ in it.')).toBeVisible()
  await expect(page.getByText('Tick this to go on.')).toBeVisible()
  await expect(page.getByLabel('Passphrase')).toHaveValue('too short')
  await expect(page.getByLabel('Email')).toHaveAttribute('aria-invalid', 'true')
})

test('signs up, out and in again; a wrong passphrase is refused in words', async ({ page }) => {
  const email = newEmail()
  await signUp(page, email)
  await page.getByRole('link', { name: 'Ines Kvam' }).click()
  await page.getByRole('button', { name: 'Sign out here' }).click()
  await expect(page.getByRole('link', { name: 'Sign in' })).toBeVisible()

  await page.goto('/sign-in')
  await page.getByLabel('Email').fill(email)
  await page.getByLabel('Passphrase').fill('not the right one')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByText('Address and passphrase do not belong together.')).toBeVisible()
  await expect(page.getByLabel('Passphrase')).toBeFocused()
  await expect(page.getByLabel('Email')).toHaveValue(email)
  await signIn(page, email)
  await expect(page.getByRole('link', { name: 'Ines Kvam' })).toBeVisible()
})

test('units and theme change at once and are there on another device', async ({ browser }) => {
  const email = newEmail()
  const here = await pageOf(browser)
  await signUp(here, email)
  await here.goto('/account')
  await here.getByRole('radio', { name: 'ft and in, cubic yd, lb' }).check()
  const kept = here.waitForResponse((answer) => answer.request().method() === 'PATCH')
  await here.getByRole('radio', { name: 'Bright sun' }).check()
  await expect(here.locator('html')).toHaveAttribute('data-theme', 'sun')
  await kept

  const there = await pageOf(browser)
  await signIn(there, email)
  await expect(there.locator('html')).toHaveAttribute('data-theme', 'sun')
  await there.goto('/account')
  await expect(there.getByRole('radio', { name: 'ft and in, cubic yd, lb' })).toBeChecked()
})

test('signing out everywhere ends the other device, which says so and keeps what was typed', async ({
  browser,
}) => {
  const email = newEmail()
  const [here, there] = [await pageOf(browser), await pageOf(browser)]
  await signUp(here, email)
  await signIn(there, email)
  await there.goto('/account')
  await expect(there.getByText('one other device')).toBeVisible()

  await here.goto('/account')
  await here.getByRole('button', { name: 'Sign out everywhere' }).click()
  await expect(here.getByRole('link', { name: 'Sign in' })).toBeVisible()

  const about = there.getByLabel('About you')
  await about.fill('Builds benches.')
  await expect(there.getByText('You were signed out elsewhere.')).toBeVisible()
  await expect(about).toHaveValue('Builds benches.')
  await there.goto('/builds')
  await expect(there).toHaveURL(/\/sign-in\?back=/)
})
