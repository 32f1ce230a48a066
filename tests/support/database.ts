import { randomBytes } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { createConnection } from 'mysql2/promise'

interface Journal {
  entries: { tag: string }[]
}

export interface FreshDatabase {
  url: string
  drop: () => Promise<void>
}

/** A database of its own with all tables and no rows, on the test run's MariaDB. */
export async function createTestDatabase(): Promise<FreshDatabase> {
  const serverUrl = process.env['TEST_DATABASE_URL']
  if (!serverUrl) throw new Error('TEST_DATABASE_URL is not set: run Vitest with its projects.')
  const name = `gf_test_${randomBytes(6).toString('hex')}`
  await runStatements(serverUrl, `create database ${name}`)
  const url = new URL(serverUrl)
  url.pathname = `/${name}`
  await runStatements(url.href, readMigrations())
  return { url: url.href, drop: () => runStatements(serverUrl, `drop database ${name}`) }
}

/** All migrations as one text: a round trip for each statement would cost more than the tables. */
function readMigrations(folder = 'drizzle'): string {
  const journal = JSON.parse(readFileSync(`${folder}/meta/_journal.json`, 'utf8')) as Journal
  const statements = journal.entries.flatMap(({ tag }) =>
    readFileSync(`${folder}/${tag}.sql`, 'utf8').split('--> statement-breakpoint'),
  )
  return statements.map((statement) => statement.trim().replace(/;?$/, ';')).join('\n')
}

async function runStatements(url: string, statements: string): Promise<void> {
  const connection = await createConnection({ uri: url, multipleStatements: true })
  try {
    await connection.query(statements)
  } finally {
    await connection.end()
  }
}
