import { join } from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import { migrateDatabase } from '../db/migrate'
import { startDatabase, type PrivateDatabase } from './database'
import { dataFolder, openDatabase, privateDatabase } from './openDatabase'
import { takeRunLock } from './runLock'
import { isStopping, whenStopping } from './shutdown'

const checkEveryMs = 1_000
const mostRestarts = 5

type Say = (sentence: string) => void

/**
 * Brings up the database, its tables and, when it is empty, the demo courses and people.
 * From here on DATABASE_URL is set; the private database is started again should it end.
 */
export async function prepareDatabase(say: Say): Promise<void> {
  if (!process.env['DATABASE_URL']) {
    whenStopping(await takeRunLock(join(dataFolder, 'running.pid')))
  }
  const { url, own } = await openDatabase(say)
  if (own) {
    watchOver(own, say).catch((error: unknown) => {
      say(`The database could not be started again: ${String(error)}`)
    })
  }
  process.env['DATABASE_URL'] = url
  say('Bringing the tables up to date …')
  await migrateDatabase(url)
  await seedWhenEmpty(say)
}

async function seedWhenEmpty(say: Say): Promise<void> {
  const { db, pool } = await import('../db/client')
  const { isEmpty, seedDatabase } = await import('../db/seed')
  try {
    if (await isEmpty(db)) {
      say('Putting in the demo courses and people …')
      await seedDatabase(db)
    }
  } finally {
    await pool.end()
  }
}

async function watchOver(first: PrivateDatabase, say: Say): Promise<void> {
  let database = first
  let restarts = 0
  whenStopping(() => database.stop())
  while (!isStopping()) {
    await wait(checkEveryMs, undefined, { ref: false })
    if (isStopping() || database.isRunning()) continue
    restarts += 1
    if (restarts > mostRestarts) {
      say('The database ended again and again; see mariadb.log in its folder.')
      return
    }
    say('The database ended unexpectedly; starting it again …')
    database = await startDatabase(privateDatabase)
  }
}
