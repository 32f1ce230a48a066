import { spawn, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { mkdir, mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createConnection, type RowDataPacket } from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startDatabase, type PrivateDatabase } from '../../server/cli/database'
import { endChild, findFreePort, waitUntil } from '../../server/cli/processes'
import { migrateDatabase } from '../../server/db/migrate'

const writers = 3
const enoughAcknowledged = 12

// On a real disk: in memory MariaDB maps its log, and nothing could be lost by a kill.
let folder: string
let port: number
let database: PrivateDatabase
let server: ChildProcess

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'good-footing-crash-'))
  await mkdir(join(folder, 'files'))
  port = await findFreePort()
  database = await startOwnDatabase()
  await migrateDatabase(database.url)
  server = await startServer()
}, 120_000)

afterAll(async () => {
  await endChild(server, 10_000)
  await database.stop()
  await rm(folder, { recursive: true, force: true })
}, 60_000)

const startOwnDatabase = () =>
  startDatabase({ folder: join(folder, 'mariadb'), database: 'good_footing' })

/** Breaks the server from within, as an error would that nobody catches. */
const fault = `data:text/javascript,process.on('SIGUSR2',()=>{throw new Error('nobody foresaw this')})`

async function startServer(): Promise<ChildProcess> {
  const imports = ['--import', 'tsx', '--import', fault]
  const child = spawn(process.execPath, [...imports, 'server/index.ts'], {
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
    env: {
      ...process.env,
      NODE_ENV: 'test',
      PORT: String(port),
      DATABASE_URL: database.url,
      DATA_DIR: join(folder, 'files'),
      RATE_LIMIT_FACTOR: '1000',
    },
  })
  await new Promise((resolve, reject) => {
    child.once('message', resolve)
    child.once('exit', (code) => reject(new Error(`The server ended with ${code}.`)))
  })
  return child
}

/** Signs somebody up; true once the server has acknowledged it. */
async function signUp(email: string): Promise<boolean> {
  const origin = `http://127.0.0.1:${port}`
  const answer = await fetch(`${origin}/api/accounts`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', Origin: origin },
    body: JSON.stringify({
      displayName: 'Somebody',
      email,
      passphrase: 'gravel sand and a string',
      units: 'metric',
      isOldEnough: true,
    }),
    signal: AbortSignal.timeout(10_000),
  })
  return answer.status === 201
}

/** Signs people up until something breaks, and strikes down the victim in the middle of it. */
async function writeWhile(kind: string, strike: () => void): Promise<string[]> {
  const acknowledged: string[] = []
  const write = async (writer: number) => {
    for (let number = 1; ; number++) {
      const email = `${kind}-${writer}-${number}@example.org`
      const isWritten = await signUp(email).catch(() => false)
      if (!isWritten) return
      acknowledged.push(email)
    }
  }
  const writing = Promise.all(Array.from({ length: writers }, (_, writer) => write(writer)))
  await waitUntil(() => acknowledged.length >= enoughAcknowledged, 20_000, 5)
  expect(acknowledged.length).toBeGreaterThanOrEqual(enoughAcknowledged)
  strike()
  await writing
  return acknowledged
}

async function findLost(emails: string[]): Promise<string[]> {
  const connection = await createConnection(database.url)
  const [rows] = await connection.query<RowDataPacket[]>('select email from users')
  await connection.end()
  const kept = new Set(rows.map((row) => String(row['email'])))
  return emails.filter((email) => !kept.has(email))
}

describe('a crash', () => {
  it('of the server loses nothing it has acknowledged, and the next start goes on', async () => {
    const emails = await writeWhile('server', () => server.kill('SIGKILL'))
    server = await startServer()
    expect(await findLost(emails)).toEqual([])
    expect(await signUp('after-server@example.org')).toBe(true)
  }, 90_000)

  it('of the database loses nothing either, and the server finds the next one', async () => {
    const emails = await writeWhile('database', () => process.kill(database.processId, 'SIGKILL'))
    await waitUntil(() => !database.isRunning(), 10_000)
    database = await startOwnDatabase()
    expect(database.wasRunning).toBe(false)
    expect(await findLost(emails)).toEqual([])
    expect(await signUp('after-database@example.org')).toBe(true)
    expect(server.exitCode).toBeNull()
  }, 90_000)
})

describe('16.5.4 an error that nobody caught', () => {
  it('ends the server in order, what was acknowledged is kept', async () => {
    expect(await signUp('before-fault@example.org')).toBe(true)
    server.kill('SIGUSR2')
    const [code] = (await once(server, 'exit')) as [number]
    expect(code).toBe(1)
    expect(await findLost(['before-fault@example.org'])).toEqual([])
    server = await startServer()
    expect(await signUp('after-fault@example.org')).toBe(true)
  }, 60_000)
})
