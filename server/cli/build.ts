import { createHash } from 'node:crypto'
import { existsSync } from 'node:fs'
import { readdir, readFile, rm, stat, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { endChild, runProgram } from './processes'
import { whenStopping } from './shutdown'

const sources = [
  'src',
  'shared',
  'server',
  'index.html',
  'vite.config.ts',
  'tsconfig.json',
  'package-lock.json',
]
const stampFile = 'dist/.sources'
const serverBuild = ['--ssr']

/** Builds client and server into dist/ unless they were built from the very same sources. */
export async function buildWhenChanged(say: (sentence: string) => void): Promise<void> {
  const hash = await hashSources()
  const built = existsSync(stampFile) ? await readFile(stampFile, 'utf8') : ''
  if (built === hash) return
  say('Building the client and the server (up to a minute) …')
  await rm(stampFile, { force: true })
  await Promise.all([runBuild('client', []), runBuild('server', serverBuild)])
  await writeFile(stampFile, hash)
}

async function runBuild(name: string, args: string[]): Promise<void> {
  const { code, output } = await runProgram(
    process.execPath,
    ['node_modules/vite/bin/vite.js', 'build', ...args],
    {
      env: { ...process.env, NODE_ENV: 'production' },
      onStart: (child) => whenStopping(() => endChild(child, 2_000)),
    },
  )
  if (code !== 0) throw new Error(`The ${name} could not be built:\n${output}`)
}

async function hashSources(): Promise<string> {
  const hash = createHash('sha256')
  for (const source of sources) {
    for (const file of await listFiles(source)) hash.update(file).update(await readFile(file))
  }
  return hash.digest('hex')
}

async function listFiles(path: string): Promise<string[]> {
  if ((await stat(path)).isFile()) return [path]
  const entries = await readdir(path, { recursive: true, withFileTypes: true })
  const files = entries.filter((entry) => entry.isFile())
  return files.map((entry) => join(entry.parentPath, entry.name)).sort()
}
