import { mkdir, mkdtemp, readdir, readFile, rm, statfs, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { startDatabase } from './database'
import { isProcessAlive } from './processes'

const prefix = 'good-footing-test-'
const ownerFile = 'owner'
/** A disk in memory makes a test's tables four times as fast. */
const memoryFolder = '/dev/shm'
const memoryWantedBytes = 1024 ** 3

export interface TestDatabase {
  /** Ends with the name of an empty database; its user may make further ones. */
  url: string
  /** For uploads, secrets and all else that would lie in .data/. */
  dataFolder: string
  stop: () => Promise<void>
}

/** A MariaDB in a temporary folder, with nothing in common with the one that people use. */
export async function startTestDatabase(): Promise<TestDatabase> {
  const parent = await chooseTestParent()
  await clearAbandoned(parent)
  const folder = await mkdtemp(join(parent, prefix))
  await writeFile(join(folder, ownerFile), String(process.pid))
  const dataFolder = join(folder, 'files')
  await mkdir(dataFolder)
  const database = await startDatabase({
    folder: join(folder, 'mariadb'),
    database: 'gf_test',
    mayCreateDatabases: true,
    isThrowaway: true,
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
async function clearAbandoned(parent: string): Promise<void> {
  for (const name of await readdir(parent)) {
    if (!name.startsWith(prefix)) continue
    const folder = join(parent, name)
    const owner = Number(await readFile(join(folder, ownerFile), 'utf8').catch(() => '0'))
    if (owner === 0 || isProcessAlive(owner, 'node')) continue
    const file = join(folder, 'mariadb', 'mariadb.pid')
    const processId = Number.parseInt(await readFile(file, 'utf8').catch(() => '0'), 10)
    if (processId > 0 && isProcessAlive(processId, folder)) process.kill(processId, 'SIGKILL')
    await rm(folder, { recursive: true, force: true })
  }
}

/** Where test databases lie: in memory where there is room for them, else in the temporary folder. */
export async function chooseTestParent(): Promise<string> {
  const room = await statfs(memoryFolder).catch(() => null)
  const isRoomy = room !== null && room.bavail * room.bsize >= memoryWantedBytes
  return isRoomy ? memoryFolder : tmpdir()
}
