import { mkdir, mkdtemp, readdir, rm, writeFile, readFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { startDatabase } from './database'
import { isProcessAlive } from './processes'

const prefix = 'good-footing-test-'
const ownerFile = 'owner'

export interface TestDatabase {
  /** Ends with the name of an empty database; its user may make further ones. */
  url: string
  /** For uploads, secrets and all else that would lie in .data/. */
  dataFolder: string
  stop: () => Promise<void>
}

/** A MariaDB in a temporary folder, with nothing in common with the one that people use. */
export async function startTestDatabase(): Promise<TestDatabase> {
  await clearAbandoned()
  const folder = await mkdtemp(join(tmpdir(), prefix))
  await writeFile(join(folder, ownerFile), String(process.pid))
  const dataFolder = join(folder, 'files')
  await mkdir(dataFolder)
  const database = await startDatabase({
    folder: join(folder, 'mariadb'),
    database: 'gf_test',
    mayCreateDatabases: true,
  })
  return {
    url: database.url,
    dataFolder,
    async stop() {
      await database.stop()
      await rm(folder, { recursive: true, force: true })
    },
  }
}

/** Ends and removes what a killed test run has left behind. */
async function clearAbandoned(): Promise<void> {
  for (const name of await readdir(tmpdir())) {
    if (!name.startsWith(prefix)) continue
    const folder = join(tmpdir(), name)
    const owner = Number(await readFile(join(folder, ownerFile), 'utf8').catch(() => '0'))
    if (owner === 0 || isProcessAlive(owner, 'node')) continue
    const file = join(folder, 'mariadb', 'mariadb.pid')
    const processId = Number.parseInt(await readFile(file, 'utf8').catch(() => '0'), 10)
    if (processId > 0 && isProcessAlive(processId, folder)) process.kill(processId, 'SIGKILL')
    await rm(folder, { recursive: true, force: true })
  }
}
