// Plain JavaScript without packages: it runs before there is a node_modules.
import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { installMissingPackages } from './packages.mjs'

const wantedNode = { major: 20, minor: 19 }
const programs = ['start', 'dev', 'test']
const stampFile = 'node_modules/.lock-hash'
const npmRecord = 'node_modules/.package-lock.json'

process.chdir(resolve(import.meta.dirname, '../..'))
const program = process.argv[2] ?? ''
if (!programs.includes(program)) stop(`Say what to run: ${programs.join(', ')}.`)
checkNode()
const missing = installMissingPackages({ withTests: program === 'test', say: console.log })
if (missing) stop(missing)
installNodeModules()

const { register } = await import('tsx/esm/api')
register()
await import(`./${program}.ts`)

function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major === wantedNode.major && minor >= wantedNode.minor) return
  stop(
    `This is Node ${process.versions.node}; Good Footing runs on Node ${wantedNode.major}, from ${wantedNode.major}.${wantedNode.minor} on.`,
  )
}

function installNodeModules() {
  const lock = createHash('sha256').update(readFileSync('package-lock.json')).digest('hex')
  if (!isInstalled(lock)) {
    console.log('Installing the npm packages (about a minute) …')
    const { status, stdout, stderr, error } = spawnSync('npm', ['ci', '--include=dev'], {
      encoding: 'utf8',
    })
    if (status !== 0) stop(`npm ci did not succeed.\n${stdout ?? ''}${stderr ?? error?.message}`)
  }
  if (readStamp() !== lock) writeFileSync(stampFile, lock)
}

/** @param {string} lock */
function isInstalled(lock) {
  if (!existsSync(npmRecord)) return false
  const stamp = readStamp()
  if (stamp !== null) return stamp === lock
  return statSync(npmRecord).mtimeMs >= statSync('package-lock.json').mtimeMs
}

function readStamp() {
  return existsSync(stampFile) ? readFileSync(stampFile, 'utf8') : null
}

/**
 * @param {string} sentence
 * @returns {never}
 */
function stop(sentence) {
  console.error(sentence)
  process.exit(1)
}
