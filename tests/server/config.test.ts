import { readFileSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { afterEach, describe, expect, it, vi } from 'vitest'

const before = { ...process.env }
afterEach(() => {
  process.env = { ...before }
})

/** The configuration as a process with these variables would read it. */
async function readWith(variables: Record<string, string>) {
  process.env = { ...before, ...variables }
  vi.resetModules()
  return (await import('../../server/config')).config
}

describe('the configuration', () => {
  it.each([
    ['RATE_LIMIT_FACTOR', 'none'],
    ['RATE_LIMIT_FACTOR', '0'],
    ['RATE_LIMIT_FACTOR', '-1'],
    ['TRUSTED_PROXIES', 'all'],
    ['PORT', '3000x'],
    ['PUBLIC_ORIGIN', 'footing.example'],
    ['PUBLIC_ORIGIN', 'javascript:alert(1)'],
    ['SESSION_SECRET', 'too short'],
  ])('refuses %s=%s, which would switch a guard off, and names it', async (name, value) => {
    await expect(readWith({ [name]: value })).rejects.toThrow(name)
  })

  it('refuses TLS in front without a proxy to believe: no cookie would ever be set', async () => {
    await expect(readWith({ PUBLIC_ORIGIN: 'https://footing.example' })).rejects.toThrow(
      'TRUSTED_PROXIES',
    )
  })

  it('reads an origin however it is written', async () => {
    const given = { PUBLIC_ORIGIN: 'https://Footing.example/', TRUSTED_PROXIES: '1' }
    expect(await readWith(given)).toMatchObject({
      publicOrigin: 'https://footing.example',
      isBehindTls: true,
    })
  })

  it('13.3.1 makes a secret of 256 bits by chance, for its own eyes, and keeps it', async () => {
    const { sessionSecret, dataDir } = await readWith({})
    expect(sessionSecret).toMatch(/^[0-9a-f]{64}$/)
    const file = join(dataDir, 'session-secret')
    expect(statSync(file).mode & 0o077).toBe(0)
    expect(readFileSync(file, 'utf8')).toBe(sessionSecret)
    expect((await readWith({})).sessionSecret).toBe(sessionSecret)
  })
})
