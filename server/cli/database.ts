import { spawn } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { existsSync } from 'node:fs'
import { mkdir, readFile, rename, rm, writeFile } from 'node:fs/promises'
import { userInfo } from 'node:os'
import { join, resolve } from 'node:path'
import { createConnection } from 'mysql2/promise'
import { findProgram } from './packages.mjs'
import { findFreePort, isPortFree, isProcessAlive, runProgram, waitUntil } from './processes'

const host = '127.0.0.1'
const user = 'good_footing'
const withoutDiskFlushes = [
  '--debug-no-sync',
  '--sync-frm=OFF',
  '--innodb-flush-method=nosync',
  '--innodb-doublewrite=OFF',
  '--innodb-file-per-table=OFF',
]
const startTimeoutMs = 120_000
const stopTimeoutMs = 60_000

export interface DatabaseOptions {
  /** Holds the data, the settings with the passwords (mode 600) and the log; nothing else uses it. */
  folder: string
  database: string
  /** Lets the user make further databases, as tests do. */
  mayCreateDatabases?: boolean
  /** Spares the disk: a crash of the machine may then lose data. For tests. */
  isThrowaway?: boolean
}

export interface PrivateDatabase {
  url: string
  processId: number
  /** It was still there from an earlier run and is used again. */
  wasRunning: boolean
  isRunning: () => boolean
  stop: () => Promise<void>
}

interface Settings {
  port: number
  password: string
  rootPassword: string
}

/**
 * Starts a MariaDB of our own on loopback, or finds the one of this folder still running.
 * Making, starting and recovering are the same call; the folder decides which it is.
 */
export async function startDatabase(options: DatabaseOptions): Promise<PrivateDatabase> {
  const folder = resolve(options.folder)
  await mkdir(folder, { recursive: true, mode: 0o700 })
  const settings = await readOrMakeSettings(folder)
  const url = `mysql://${user}:${settings.password}@${host}:${settings.port}/${options.database}`

  const earlier = await findRunning(folder)
  if (earlier !== null) {
    await waitForAnswer(url, folder, () => isOurs(folder, earlier))
    return describeRunning(folder, url, earlier, true)
  }

  await installData(folder)
  if (!(await isPortFree(settings.port, host))) {
    await writeSettings(folder, { ...settings, port: await findFreePort() })
    return startDatabase(options)
  }
  await writeInitFile(folder, settings, options)
  const processId = await spawnServer(folder, settings.port, options.isThrowaway ?? false)
  await waitForAnswer(url, folder, () => isOurs(folder, processId))
  return describeRunning(folder, url, processId, false)
}

function describeRunning(
  folder: string,
  url: string,
  processId: number,
  wasRunning: boolean,
): PrivateDatabase {
  const isRunning = () => isOurs(folder, processId)
  return {
    url,
    processId,
    wasRunning,
    isRunning,
    async stop() {
      if (!isRunning()) return
      process.kill(processId, 'SIGTERM')
      if (await waitUntil(() => !isRunning(), stopTimeoutMs)) return
      process.kill(processId, 'SIGKILL')
    },
  }
}

async function readOrMakeSettings(folder: string): Promise<Settings> {
  const file = join(folder, 'settings.json')
  if (existsSync(file)) return JSON.parse(await readFile(file, 'utf8')) as Settings
  const settings = {
    port: await findFreePort(),
    password: randomBytes(24).toString('hex'),
    rootPassword: randomBytes(24).toString('hex'),
  }
  await writeSettings(folder, settings)
  return settings
}

async function writeSettings(folder: string, settings: Settings): Promise<void> {
  const file = join(folder, 'settings.json')
  await writeFile(`${file}.new`, JSON.stringify(settings), { mode: 0o600 })
  await rename(`${file}.new`, file)
}

/** Makes the data folder under another name first, so that an interrupted making leaves no half. */
async function installData(folder: string): Promise<void> {
  const data = join(folder, 'data')
  if (existsSync(data)) return
  const unfinished = join(folder, 'data.new')
  await rm(unfinished, { recursive: true, force: true })
  const { code, output } = await runProgram(findProgram('mariadb-install-db'), [
    '--no-defaults',
    ...runAs(),
    `--datadir=${unfinished}`,
    '--auth-root-authentication-method=normal',
    '--skip-test-db',
  ])
  if (code !== 0) throw new Error(`MariaDB could not make its data folder ${data}:\n${output}`)
  await rename(unfinished, data)
}

/** Runs before the first connection is taken: the passwords hold from the first moment. */
async function writeInitFile(
  folder: string,
  settings: Settings,
  options: DatabaseOptions,
): Promise<void> {
  const account = `'${user}'@'${host}'`
  const scope = options.mayCreateDatabases
    ? '*.*'
    : `\`${options.database.replaceAll('_', '\\_')}\`.*`
  const statements = [
    "DELETE FROM mysql.global_priv WHERE User = 'root' AND Host <> 'localhost'",
    'FLUSH PRIVILEGES',
    `ALTER USER 'root'@'localhost' IDENTIFIED BY '${settings.rootPassword}'`,
    `CREATE DATABASE IF NOT EXISTS \`${options.database}\``,
    `CREATE USER IF NOT EXISTS ${account}`,
    `ALTER USER ${account} IDENTIFIED BY '${settings.password}'`,
    `GRANT ALL ON ${scope} TO ${account}`,
  ]
  const lines = statements.map((statement) => `${statement};\n`).join('')
  await writeFile(join(folder, 'init.sql'), lines, { mode: 0o600 })
}

async function spawnServer(folder: string, port: number, isThrowaway: boolean): Promise<number> {
  const child = spawn(
    findProgram('mariadbd'),
    [
      '--no-defaults',
      ...runAs(),
      dataArgument(folder),
      // Relative to the data folder: a full path may be longer than a socket's name can be.
      '--socket=mariadb.sock',
      `--port=${port}`,
      `--bind-address=${host}`,
      `--pid-file=${join(folder, 'mariadb.pid')}`,
      `--log-error=${join(folder, 'mariadb.log')}`,
      `--init-file=${join(folder, 'init.sql')}`,
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--default-time-zone=+00:00',
      '--innodb-flush-log-at-trx-commit=1',
      '--skip-name-resolve',
      ...(isThrowaway ? withoutDiskFlushes : []),
    ],
    // A group of its own: Ctrl-C reaches the server first, and the database when nobody needs it.
    { detached: true, stdio: 'ignore' },
  )
  return new Promise((resolve, reject) => {
    child.once('error', reject)
    child.once('spawn', () => {
      child.unref()
      resolve(child.pid ?? 0)
    })
  })
}

async function waitForAnswer(url: string, folder: string, isAlive: () => boolean): Promise<void> {
  await waitUntil(async () => !isAlive() || (await answers(url)), startTimeoutMs)
  if (isAlive() && (await answers(url))) return
  const log = join(folder, 'mariadb.log')
  const lastLines = existsSync(log) ? (await readFile(log, 'utf8')).split('\n').slice(-15) : []
  throw new Error(`MariaDB did not start. Its log ${log} ends with:\n${lastLines.join('\n')}`)
}

async function answers(url: string): Promise<boolean> {
  try {
    const connection = await createConnection({ uri: url, connectTimeout: 2_000 })
    await connection.query('select 1')
    await connection.end()
    return true
  } catch {
    return false
  }
}

async function findRunning(folder: string): Promise<number | null> {
  const file = join(folder, 'mariadb.pid')
  if (!existsSync(file)) return null
  const processId = Number.parseInt(await readFile(file, 'utf8'), 10)
  return isOurs(folder, processId) ? processId : null
}

function isOurs(folder: string, processId: number): boolean {
  return isProcessAlive(processId, dataArgument(folder))
}

function dataArgument(folder: string): string {
  return `--datadir=${join(folder, 'data')}`
}

function runAs(): string[] {
  return process.getuid?.() === 0 ? [`--user=${userInfo().username}`] : []
}
