import { flushPromises } from '@vue/test-utils'
import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { Me } from '../../../shared/contracts/accounts'
import * as api from '../../../src/api/accounts'
import { requestNothing } from '../../../src/api/client'
import { useAccountsStore } from '../../../src/stores/accounts'

vi.mock('../../../src/api/accounts')

const jo: Me = {
  ...{ id: 1, email: 'jo@example.test', displayName: 'Jo', about: '', role: 'learner' },
  ...{ units: 'imperial', theme: 'paper', sessions: 1, isStaff: false },
  can: { createCourse: false, openBench: true },
}
function answer(status: number, code: string) {
  const problem = { type: 'about:blank', title: code, status, code, detail: `${code}.` }
  vi.stubGlobal(
    'fetch',
    vi.fn(async () => Response.json(problem, { status })),
  )
}

beforeEach(() => {
  vi.resetAllMocks()
  localStorage.clear()
  setActivePinia(createPinia())
  vi.mocked(api.fetchMe).mockResolvedValue({ user: jo })
})

describe('useAccountsStore', () => {
  it('asks once who is signed in, however often it is wanted', async () => {
    const accounts = useAccountsStore()
    await Promise.all([accounts.load(), accounts.load()])
    expect(api.fetchMe).toHaveBeenCalledTimes(1)
    expect([accounts.isSignedIn, accounts.units]).toEqual([true, 'imperial'])
  })

  it('asks again after a lost line', async () => {
    vi.mocked(api.fetchMe).mockRejectedValueOnce(new Error('lost'))
    const accounts = useAccountsStore()
    await accounts.load()
    expect(accounts.isSignedIn).toBe(false)
    await accounts.load()
    expect(accounts.isSignedIn).toBe(true)
  })

  it('changes units at once, before the account has them', async () => {
    vi.mocked(api.changeMe).mockReturnValue(new Promise(() => undefined))
    const accounts = useAccountsStore()
    await accounts.load()
    void accounts.setUnits('metric')
    expect(accounts.units).toBe('metric')
    await flushPromises()
    expect(api.changeMe).toHaveBeenCalledWith({ units: 'metric' })
  })

  it('lets the answer to one choice not undo the next', async () => {
    vi.mocked(api.changeMe).mockImplementation(async (choice) => {
      await Promise.resolve()
      return { user: { ...jo, ...choice } }
    })
    const accounts = useAccountsStore()
    await accounts.load()
    const kept = accounts.setUnits('metric')
    const keptToo = accounts.setTheme('sun')
    await Promise.all([kept, keptToo])
    expect([accounts.units, accounts.theme]).toEqual(['metric', 'sun'])
  })

  it('asks no account for a visitor’s theme', async () => {
    const accounts = useAccountsStore()
    await accounts.setTheme('sun')
    expect(accounts.theme).toBe('sun')
    expect(api.changeMe).not.toHaveBeenCalled()
  })

  it('says so when the session was ended from elsewhere', async () => {
    const accounts = useAccountsStore()
    await accounts.load()
    answer(401, 'sign-in-first')
    await requestNothing('/accounts/me/bench', { method: 'POST' }).catch(() => undefined)
    await flushPromises()
    expect([accounts.isSignedIn, accounts.hasEndedElsewhere]).toEqual([false, true])
  })

  it('does not take a wrong passphrase for an ended session', async () => {
    const accounts = useAccountsStore()
    await accounts.load()
    answer(401, 'wrong-sign-in')
    await requestNothing('/sessions', { method: 'POST' }).catch(() => undefined)
    expect([accounts.isSignedIn, accounts.hasEndedElsewhere]).toEqual([true, false])
  })

  it('takes the word of an ended session back at the next sign-in', async () => {
    const accounts = useAccountsStore()
    await accounts.load()
    answer(401, 'sign-in-first')
    await requestNothing('/builds', {}).catch(() => undefined)
    vi.mocked(api.signIn).mockResolvedValue({ user: jo })
    await accounts.signIn({ email: jo.email, passphrase: 'first shovel in the ground' })
    expect([accounts.isSignedIn, accounts.hasEndedElsewhere]).toEqual([true, false])
  })
})
