import { startTestDatabase } from '../../server/cli/testDatabase'

/** Gives the server tests a MariaDB of their own, unless the one who calls has brought one. */
export default async function setUp(): Promise<(() => Promise<void>) | undefined> {
  if (process.env['TEST_DATABASE_URL']) return undefined
  const database = await startTestDatabase()
  process.env['TEST_DATABASE_URL'] = database.url
  return database.stop
}
