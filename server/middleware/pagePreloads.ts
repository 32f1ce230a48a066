import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

/** One entry of Vite's manifest. */
interface Chunk {
  file: string
  css?: string[]
  imports?: string[]
}
type Manifest = Record<string, Chunk | undefined>

interface Page {
  path: RegExp
  /** The page's file, as the manifest names it. */
  source: string
  /** What it asks the server for at once, to the letter of the client's own requests. */
  data?: (parts: string[]) => string[]
  /** The picture that stands at its top. */
  picture?: (parts: string[]) => string
}

const entry = 'index.html'
const who = '/api/accounts/me'
/** The pages people land on from elsewhere. */
const pages: Page[] = [
  { path: /^\/$/, source: 'src/pages/HomePage.vue', data: () => [who, '/api/courses'] },
  {
    path: /^\/register$/,
    source: 'src/pages/courses/RegisterPage.vue',
    data: () => [who, '/api/courses'],
  },
  { path: /^\/sign-in$/, source: 'src/pages/accounts/SignInPage.vue', data: () => [who] },
  {
    path: /^\/sheets\/([a-z0-9-]+)$/,
    source: 'src/pages/courses/SheetPage.vue',
    data: ([slug]) => [who, `/api/courses/${slug}`],
  },
  {
    path: /^\/sheets\/([a-z0-9-]+)\/lessons\/([a-z0-9-]+)$/,
    source: 'src/pages/courses/LessonPage.vue',
    data: ([slug, lesson]) => [who, `/api/courses/${slug}/lessons/${lesson}`],
    picture: ([slug, lesson]) => `/api/courses/${slug}/lessons/${lesson}/poster`,
  },
]

function readManifest(folder: string): Manifest {
  const path = join(folder, '.vite/manifest.json')
  return existsSync(path) ? (JSON.parse(readFileSync(path, 'utf8')) as Manifest) : {}
}

/** A chunk with all that it imports. */
function filesOf(manifest: Manifest, name: string, found = new Set<string>()): Set<string> {
  const chunk = manifest[name]
  if (!chunk || found.has(chunk.file)) return found
  found.add(chunk.file)
  for (const style of chunk.css ?? []) found.add(style)
  for (const child of chunk.imports ?? []) filesOf(manifest, child, found)
  return found
}

function linkOf(file: string): string {
  return file.endsWith('.css')
    ? `</${file}>; rel=preload; as=style; crossorigin`
    : `</${file}>; rel=modulepreload; crossorigin`
}

/**
 * What a browser that asks for this page fetches anyway, as the value of a Link header: the page's own files and
 * its first requests, so that they come beside the application instead of after it. Empty for any other address.
 */
export function createPagePreloads(folder: string): (path: string, hasQuery: boolean) => string {
  const manifest = readManifest(folder)
  const common = filesOf(manifest, entry)
  return (path, hasQuery) => {
    const page = pages.find((one) => one.path.test(path))
    if (!page) return ''
    const files = [...filesOf(manifest, page.source)].filter((file) => !common.has(file))
    const parts = page.path.exec(path)?.slice(1) ?? []
    // A query may ask for a draft, a filter or another page of the list.
    const data = hasQuery ? [] : (page.data?.(parts) ?? [])
    const requests = data.map((address) => `<${address}>; rel=preload; as=fetch; crossorigin`)
    const picture = hasQuery ? undefined : page.picture?.(parts)
    const pictures = picture ? [`<${picture}>; rel=preload; as=image; fetchpriority=high`] : []
    return [...files.map(linkOf), ...requests, ...pictures].join(', ')
  }
}
