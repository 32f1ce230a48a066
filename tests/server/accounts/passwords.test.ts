import argon2 from 'argon2'
import { describe, expect, it, vi } from 'vitest'
import { hashPassphrase, isOutdatedHash, isPassphrase } from '../../../server/accounts/passwords'

/** Counts how many of argon2's own workings run at once while the real ones are done. */
function watchArgon2() {
  let running = 0
  let most = 0
  const { hash, verify } = argon2
  const watch = async <T>(work: () => Promise<T>): Promise<T> => {
    most = Math.max(most, ++running)
    try {
      return await work()
    } finally {
      running--
    }
  }
  vi.spyOn(argon2, 'hash').mockImplementation((...given: Parameters<typeof hash>) =>
    watch(() => hash(...given)),
  )
  vi.spyOn(argon2, 'verify').mockImplementation((...given) => watch(() => verify(...given)))
  return () => most
}

describe('a passphrase', () => {
  it('11.4.2 is hashed by Argon2id with 19 MiB, two passes and one lane at the least', async () => {
    const hash = await hashPassphrase('gravel sand and a string')
    const [, kind, , cost = ''] = hash.split('$')
    expect(kind).toBe('argon2id')
    const [memory = 0, passes = 0, lanes = 0] = (cost.match(/\d+/g) ?? []).map(Number)
    expect(memory).toBeGreaterThanOrEqual(19 * 1024)
    expect(passes).toBeGreaterThanOrEqual(2)
    expect(lanes).toBeGreaterThanOrEqual(1)
    expect(isOutdatedHash(hash)).toBe(false)
  })

  it('11.4.2 gets a salt of its own', async () => {
    const [first, second] = [await hashPassphrase('the same'), await hashPassphrase('the same')]
    expect(first).not.toBe(second)
    expect(await isPassphrase('the same', first)).toBe(true)
    expect(await isPassphrase('The same', first)).toBe(false)
  })

  it('is the same however the keyboard puts its accents together', async () => {
    const hash = await hashPassphrase('Bretter für Küche')
    expect(await isPassphrase('Bretter für Küche'.normalize('NFD'), hash)).toBe(true)
  })

  it('belongs to nobody without a hash, not even the decoy’s own', async () => {
    expect(await isPassphrase('nobody has this passphrase', null)).toBe(false)
  })

  it('2.4.1 is hashed or checked by two at once at most, and all get their turn', async () => {
    const hash = await hashPassphrase('one')
    const findMost = watchArgon2()
    const results = await Promise.all([
      ...Array.from({ length: 6 }, () => isPassphrase('one', hash)),
      ...Array.from({ length: 4 }, () => isPassphrase('one', null)),
      ...Array.from({ length: 4 }, async () => (await hashPassphrase('two')).length > 0),
    ])
    expect(findMost()).toBe(2)
    expect(results).toEqual([
      ...Array<boolean>(6).fill(true),
      ...Array<boolean>(4).fill(false),
      ...Array<boolean>(4).fill(true),
    ])
  })

  it('leaves its place to the next when hashing fails', async () => {
    vi.spyOn(argon2, 'hash').mockRejectedValue(new Error('no memory'))
    const failed = await Promise.allSettled(Array.from({ length: 5 }, () => hashPassphrase('x')))
    expect(failed.map(({ status }) => status)).toEqual(Array(5).fill('rejected'))
    vi.restoreAllMocks()
    expect(await hashPassphrase('x')).toContain('argon2id')
  })
})
