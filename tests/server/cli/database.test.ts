import { mkdtemp, rm, stat } from 'node:fs/promises'
import { createServer, type Server } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createConnection, type RowDataPacket } from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startDatabase, type PrivateDatabase } from '../../../server/cli/database'
import { waitUntil } from '../../../server/cli/processes'

// On a real disk: in memory MariaDB maps its log, and nothing could be lost by a kill.
let folder: string
let database: PrivateDatabase

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'good-footing-database-'))
  await start()
}, 120_000)

afterAll(async () => {
  await database.stop()
  await rm(folder, { recursive: true, force: true })
})

/** Starts it, or finds what an earlier test has left running. */
async function start(): Promise<PrivateDatabase> {
  database = await startDatabase({ folder, database: 'good_footing' })
  return database
}

async function ask<Row>(url: string, statement: string): Promise<Row[]> {
  const connection = await createConnection(url)
  try {
    const [rows] = await connection.query<RowDataPacket[]>(statement)
    return rows as Row[]
  } finally {
    await connection.end()
  }
}

describe('startDatabase', () => {
  it('makes a database in UTC and utf8mb4 that writes every commit to disk', async () => {
    const { url } = await start()
    const [settings] = await ask(
      url,
      `select @@time_zone as zone, @@collation_database as collation_name,
        @@innodb_flush_log_at_trx_commit as flush_at_commit, @@bind_address as address`,
    )
    expect(settings).toEqual({
      zone: '+00:00',
      collation_name: 'utf8mb4_unicode_ci',
      flush_at_commit: 1,
      address: '127.0.0.1',
    })
  })

  it('lets nobody in without the password, which only the owner can read', async () => {
    const { url } = await start()
    for (const user of ['root', 'good_footing']) {
      const { host } = new URL(url)
      await expect(createConnection(`mysql://${user}@${host}/`)).rejects.toThrow(/denied/)
    }
    const { mode } = await stat(join(folder, 'settings.json'))
    expect((mode & 0o777).toString(8)).toBe('600')
  })

  it('uses the one that is still running', async () => {
    const first = await start()
    const second = await start()
    expect(second.wasRunning).toBe(true)
    expect(second.processId).toBe(first.processId)
    expect(second.url).toBe(first.url)
  })

  it('keeps all rows over a stop and a start', async () => {
    const first = await start()
    await ask(first.url, 'create table stopped (id int primary key)')
    await ask(first.url, 'insert into stopped values (1), (2)')
    await first.stop()
    expect(first.isRunning()).toBe(false)

    const second = await start()
    expect(second.wasRunning).toBe(false)
    expect(await ask(second.url, 'select id from stopped order by id')).toEqual([
      { id: 1 },
      { id: 2 },
    ])
  })

  it('keeps every acknowledged row when it is killed in the middle of writing', async () => {
    const first = await start()
    await ask(first.url, 'create table killed (id int primary key)')
    const connection = await createConnection(first.url)
    const losses: unknown[] = []
    connection.on('error', (error) => losses.push(error))
    const acknowledged: number[] = []
    const writing = (async () => {
      for (let id = 1; ; id++) {
        await connection.query('insert into killed values (?)', [id])
        acknowledged.push(id)
      }
    })()
    await waitUntil(() => acknowledged.length >= 20, 10_000, 1)
    process.kill(first.processId, 'SIGKILL')
    await expect(writing).rejects.toThrow()
    connection.destroy()
    await waitUntil(() => !first.isRunning(), 5_000)

    const second = await start()
    const rows = await ask<{ id: number }>(second.url, 'select id from killed')
    const kept = new Set(rows.map(({ id }) => id))
    expect(acknowledged.length).toBeGreaterThanOrEqual(20)
    expect(acknowledged.filter((id) => !kept.has(id))).toEqual([])
  })

  it('moves to another port when its own was taken meanwhile', async () => {
    const first = await start()
    const port = Number(new URL(first.url).port)
    await first.stop()
    const blocker: Server = createServer()
    await new Promise<void>((resolve) => blocker.listen(port, '127.0.0.1', resolve))
    try {
      const second = await start()
      expect(Number(new URL(second.url).port)).not.toBe(port)
      expect(await ask(second.url, 'select 1 as one')).toEqual([{ one: 1 }])
    } finally {
      blocker.close()
    }
  })
})
