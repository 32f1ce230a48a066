import { mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { brotliCompressSync } from 'node:zlib'
import { connect } from 'node:net'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { startTestApp, type TestApp } from '../../support/app'

const { folder } = vi.hoisted(() => {
  const root = process.getBuiltinModule('node:fs').mkdtempSync('/tmp/good-footing-client-')
  process.env['CLIENT_DIR'] = `${root}/client`
  return { folder: root }
})

let app: TestApp
beforeAll(async () => {
  mkdirSync(join(folder, 'client', 'assets'), { recursive: true })
  mkdirSync(join(folder, 'client', '.vite'))
  writeFileSync(join(folder, 'secret.txt'), 'the session secret')
  writeFileSync(join(folder, 'client', 'index.html'), '<!doctype html><title>Page</title>')
  writeFileSync(join(folder, 'client', '.vite', 'manifest.json'), '{"where":"everything"}')
  writeFileSync(
    join(folder, 'client', '.vite', 'manifest.json.br'),
    brotliCompressSync('{"where":"everything"}'),
  )
  writeFileSync(join(folder, 'client', 'assets', 'page-abc.js'), 'export {}')
  app = await startTestApp()
})
afterAll(async () => {
  await app.close()
  rmSync(folder, { recursive: true, force: true })
})

/** Sends a path just as it stands; fetch would tidy it up. */
const askRaw = (path: string) =>
  new Promise<string>((resolve, reject) => {
    const { hostname, port } = new URL(app.url)
    const socket = connect(Number(port), hostname, () => {
      socket.write(`GET ${path} HTTP/1.1\r\nHost: ${hostname}\r\nConnection: close\r\n\r\n`)
    })
    let text = ''
    socket.on('data', (bytes: Buffer) => (text += bytes.toString('latin1')))
    socket.on('end', () => resolve(text))
    socket.on('error', reject)
  })

describe('the client files', () => {
  it.each([
    '/../secret.txt',
    '/..%2fsecret.txt',
    '/%2e%2e/secret.txt',
    '/assets/..%2f..%2fsecret.txt',
    '/assets/../../secret.txt',
    '/..\\secret.txt',
    '/assets/%5c..%5c..%5csecret.txt',
    '/secret.txt%00.js',
    '//../secret.txt',
  ])('5.3.2 nothing outside the folder is sent: %s', async (path) => {
    const text = await askRaw(path)
    expect(text).toMatch(/^HTTP\/1\.1 (200|400|403|404) /)
    expect(text).not.toContain('the session secret')
  })

  it('13.4.2 what the build knows of itself is not sent', async () => {
    const answer = await fetch(`${app.url}/.vite/manifest.json`)
    expect(await answer.text()).toContain('<title>Page</title>')
  })

  it('gives the page for paths of the client, with the headers of a page', async () => {
    const answer = await fetch(`${app.url}/register/anything`)
    expect(answer.status).toBe(200)
    expect(answer.headers.get('cache-control')).toBe('no-cache')
    expect(answer.headers.get('x-content-type-options')).toBe('nosniff')
  })

  it('keeps a hashed file for a year', async () => {
    const answer = await fetch(`${app.url}/assets/page-abc.js`)
    expect(answer.headers.get('cache-control')).toContain('immutable')
  })

  it('3.4.3 comes with a policy that runs our own script files and nothing else', async () => {
    const policy = (await fetch(app.url)).headers.get('content-security-policy') ?? ''
    const rules = new Map(
      policy.split(';').map((rule) => {
        const [name = '', ...sources] = rule.trim().split(/\s+/)
        return [name, sources] as const
      }),
    )
    expect(rules.get('script-src')).toEqual(["'self'"])
    expect(rules.get('default-src')).toEqual(["'self'"])
    expect(rules.get('object-src')).toEqual(["'none'"])
    expect(rules.get('base-uri')).toEqual(["'none'"])
    expect(policy).not.toMatch(/unsafe|\*|https?:/)
  })

  it('3.4.3 lets the worker of cut lists, and no page, compile its solver', async () => {
    const policyOf = async (path: string) =>
      (await fetch(app.url + path)).headers.get('content-security-policy') ?? ''
    const worker = await policyOf('/assets/cutlist.worker-BP1KD_Q-.js')
    expect(worker).toContain("script-src 'self' 'wasm-unsafe-eval';")
    for (const path of [
      '/assets/page-abc.js',
      '/cut?/assets/cutlist.worker-a.js',
      '/api/nothing',
    ]) {
      expect(await policyOf(path)).not.toContain('unsafe')
    }
  })

  it('3.4.6 cannot be framed', async () => {
    const { headers } = await fetch(app.url)
    expect(headers.get('content-security-policy')).toContain("frame-ancestors 'none'")
  })

  it('3.4.4 is never taken for another kind of file', async () => {
    for (const path of ['/', '/assets/page-abc.js', '/api/accounts/me', '/api/nothing']) {
      const { headers } = await fetch(app.url + path)
      expect([path, headers.get('x-content-type-options')]).toEqual([path, 'nosniff'])
    }
  })

  it('13.4.2 does not say what it is made with', async () => {
    for (const path of ['/', '/api/accounts/me', '/api/nothing']) {
      const { headers } = await fetch(app.url + path)
      expect([headers.get('x-powered-by'), headers.get('server')]).toEqual([null, null])
    }
  })
})
