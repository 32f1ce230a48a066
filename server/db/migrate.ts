import { readMigrationFiles } from 'drizzle-orm/migrator'
import { drizzle } from 'drizzle-orm/mysql2'
import { migrate } from 'drizzle-orm/mysql2/migrator'
import { createConnection, type RowDataPacket } from 'mysql2/promise'

const lockName = 'good_footing_migrations'
const lockTimeoutSeconds = 120

/**
 * Brings the database to the state of the migration files, one process at a time.
 * @throws when another migration holds the lock too long, or a file was passed over because its
 * journal time is older than the last one applied.
 */
export async function migrateDatabase(url: string, folder = 'drizzle'): Promise<void> {
  const connection = await createConnection({ uri: url, timezone: 'Z' })
  try {
    const [locks] = await connection.query<RowDataPacket[]>('select get_lock(?, ?) as taken', [
      lockName,
      lockTimeoutSeconds,
    ])
    if (locks[0]?.['taken'] !== 1) {
      throw new Error('Another process is changing the tables. Wait for it, then start again.')
    }
    await migrate(drizzle(connection), { migrationsFolder: folder })
    const [applied] = await connection.query<RowDataPacket[]>(
      'select hash from __drizzle_migrations',
    )
    const hashes = new Set(applied.map((row) => String(row['hash'])))
    const passedOver = readMigrationFiles({ migrationsFolder: folder }).filter(
      (migration) => !hashes.has(migration.hash),
    )
    if (passedOver.length > 0) {
      throw new Error(
        `${passedOver.length} migration(s) in ${folder}/ are older than the last one applied, or were edited after they landed. Make them again with "npm run db:generate".`,
      )
    }
  } finally {
    await connection.end()
  }
}
