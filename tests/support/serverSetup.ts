import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll } from 'vitest'
import { createTestDatabase } from './database'

// Set before the test file imports the server, whose configuration is read once.
const database = await createTestDatabase()
const dataFolder = await mkdtemp(join(tmpdir(), 'good-footing-files-'))
process.env['DATABASE_URL'] = database.url
process.env['DATA_DIR'] = dataFolder

afterAll(async () => {
  const { pool } = await import('../../server/db/client')
  await pool.end()
  await database.drop()
  await rm(dataFolder, { recursive: true, force: true })
})
