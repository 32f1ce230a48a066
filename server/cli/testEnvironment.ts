import { findFreePort } from './processes'
import type { TestDatabase } from './testDatabase'

/** What the server and browser tests find in their environment. */
export async function testEnvironment(database: TestDatabase): Promise<NodeJS.ProcessEnv> {
  return {
    ...process.env,
    TEST_DATABASE_URL: database.url,
    DATABASE_URL: database.url,
    DATA_DIR: database.dataFolder,
    E2E_PORT: process.env['E2E_PORT'] ?? String(await findFreePort()),
    // One machine plays all the people of the browser tests.
    RATE_LIMIT_FACTOR: '1000',
  }
}
