import { statSync } from 'node:fs'
import { readFile } from 'node:fs/promises'
import { basename, join } from 'node:path'
import { gzipSync } from 'node:zlib'
import { calculators } from '../../shared/calculators/index'
import { buildWhenChanged } from '../../server/cli/build'

/** One entry of Vite's manifest. */
interface Chunk {
  file: string
  css?: string[]
  imports?: string[]
  dynamicImports?: string[]
}
type Manifest = Record<string, Chunk>

const folder = 'dist/client'
const kB = 1000
const entry = 'index.html'
/** Pages that a visitor meets first. */
const firstPages = [
  { name: 'register', page: 'src/pages/courses/RegisterPage.vue' },
  { name: 'sign-in', page: 'src/pages/accounts/SignInPage.vue' },
]
/** The lesson, what it fetches while the kit check is read, and what it fetches before the first stop. */
const lessonParts = [
  'src/pages/courses/LessonPage.vue',
  'src/components/courses/LessonRoom.vue',
  'src/components/exercises/WorkbenchPanel.vue',
]
const limits = { scripts: 120 * kB, styles: 40 * kB, lesson: 235 * kB }

/** Some chunks and all that these import statically. */
function chunksOf(manifest: Manifest, names: readonly string[]): Map<string, Chunk> {
  const found = new Map<string, Chunk>()
  const visit = (name: string) => {
    if (found.has(name)) return
    const chunk = manifest[name]
    if (!chunk) throw new Error(`The build has no ${name}.`)
    found.set(name, chunk)
    for (const child of chunk.imports ?? []) visit(child)
  }
  for (const name of names) visit(name)
  return found
}

/** Each calculator and its drawing come alone, when a stop first shows them; a lesson has a handful of stops. */
const stopsOfLesson = 3
const calculatorNames = calculators.map(({ id }) =>
  id.replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase()),
)
const comeAlone = [calculatorNames, calculatorNames.map((name) => `${name}Sheet`)]
/** The name a chunk was given from what it holds: `slab` of assets/slab-iCGFvnNf.js. */
const nameOf = ({ file }: Chunk) => basename(file).replace(/-[\w-]{8}\.js$/, '')

/** The same with what these fetch later of themselves: the player, kinds of exercises, the largest few calculators. */
function chunksWithLater(manifest: Manifest, names: readonly string[], but: Set<string>) {
  const own = [...chunksOf(manifest, names)].filter(([name]) => !but.has(name))
  const later = own.flatMap(([, chunk]) => chunk.dynamicImports ?? [])
  const bytesOf = (name: string) => statSync(join(folder, manifest[name]?.file ?? '')).size
  const isOf = (names: readonly string[]) => (name: string) => {
    const chunk = manifest[name]
    return chunk !== undefined && names.includes(nameOf(chunk))
  }
  const largest = comeAlone.flatMap((names) =>
    later
      .filter(isOf(names))
      .sort((one, other) => bytesOf(other) - bytesOf(one))
      .slice(0, stopsOfLesson),
  )
  const always = later.filter((name) => !comeAlone.some((names) => isOf(names)(name)))
  return chunksOf(manifest, [...names, ...always, ...largest])
}

const filesOf = (chunks: Map<string, Chunk>) =>
  new Set([...chunks.values()].flatMap(({ file, css = [] }) => [file, ...css]))

/** Bytes after gzip at its highest level, as the server sends them where Brotli is not understood. */
async function weigh(files: Iterable<string>, ending: '.js' | '.css'): Promise<number> {
  let bytes = 0
  for (const file of files) {
    if (!file.endsWith(ending)) continue
    bytes += gzipSync(await readFile(join(folder, file)), { level: 9 }).length
  }
  return bytes
}

/** Prints one line; answers whether the limit holds. */
function report(name: string, bytes: number, limit: number): boolean {
  const size = (bytes / kB).toFixed(1).padStart(6)
  const verdict = bytes > limit ? 'OVER' : 'holds'
  console.log(`${name.padEnd(30)}${size} kB gzip, limit ${limit / kB} kB: ${verdict}`)
  return bytes <= limit
}

await buildWhenChanged(console.log)
const manifest = JSON.parse(await readFile(join(folder, '.vite/manifest.json'), 'utf8')) as Manifest
const common = new Set(chunksOf(manifest, [entry]).keys())
const held: boolean[] = []
for (const { name, page } of firstPages) {
  const files = filesOf(chunksOf(manifest, [entry, page]))
  held.push(report(`${name}, scripts`, await weigh(files, '.js'), limits.scripts))
  held.push(report(`${name}, styles`, await weigh(files, '.css'), limits.styles))
  const all = filesOf(chunksWithLater(manifest, [entry, page], common))
  const later = [...all].filter((file) => !files.has(file))
  console.log(`  what may follow          ${((await weigh(later, '.js')) / kB).toFixed(1)} kB gzip`)
}
const first = filesOf(
  chunksOf(manifest, [entry, ...firstPages.slice(0, 1).map(({ page }) => page)]),
)
const lesson = filesOf(chunksWithLater(manifest, [entry, ...lessonParts], common))
const own = [...lesson].filter((file) => !first.has(file))
held.push(report('lesson, more scripts in all', await weigh(own, '.js'), limits.lesson))
process.exitCode = held.every(Boolean) ? 0 : 1
