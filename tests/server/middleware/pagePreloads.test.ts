import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { createPagePreloads } from '../../../server/middleware/pagePreloads'

const folder = mkdtempSync(join(tmpdir(), 'client-'))
afterAll(() => rmSync(folder, { recursive: true }))
mkdirSync(join(folder, '.vite'))
writeFileSync(
  join(folder, '.vite/manifest.json'),
  JSON.stringify({
    'index.html': { file: 'assets/index.js', css: ['assets/index.css'], imports: ['_vendor.js'] },
    '_vendor.js': { file: 'assets/vendor.js' },
    '_sheets.js': { file: 'assets/sheets.js', imports: ['_vendor.js'] },
    'src/pages/courses/RegisterPage.vue': {
      file: 'assets/register.js',
      css: ['assets/register.css'],
      imports: ['_sheets.js', 'index.html'],
    },
  }),
)
const preloads = createPagePreloads(folder)

describe('createPagePreloads', () => {
  it('names a page’s own files and its first requests, once, and nothing the page of all names itself', () => {
    expect(preloads('/register', false).split(', ')).toEqual([
      '</assets/register.js>; rel=modulepreload; crossorigin',
      '</assets/register.css>; rel=preload; as=style; crossorigin',
      '</assets/sheets.js>; rel=modulepreload; crossorigin',
      '</api/accounts/me>; rel=preload; as=fetch; crossorigin',
      '</api/courses>; rel=preload; as=fetch; crossorigin',
    ])
  })

  it('asks ahead for what the address names', () => {
    const links = preloads('/sheets/a-low-deck/lessons/digging-in', false)
    expect(links).toContain('</api/courses/a-low-deck/lessons/digging-in>; rel=preload; as=fetch')
    expect(links).toContain(
      '</api/courses/a-low-deck/lessons/digging-in/poster>; rel=preload; as=image',
    )
  })

  it('asks for no data where a query may change it', () => {
    expect(preloads('/register', true)).not.toContain('/api/')
  })

  it.each(['/register/', '/nowhere', '/sheets/x>; rel=evil', '/sheets/%3Cscript', '/bench'])(
    'keeps quiet about %s',
    (path) => {
      expect(preloads(path, false)).toBe('')
    },
  )

  it('keeps quiet about files while there is no build', () => {
    const links = createPagePreloads(join(folder, 'nothing'))('/register', false)
    expect(links).not.toContain('assets')
  })
})
