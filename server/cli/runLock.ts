import { mkdir, readFile, rm, writeFile } from 'node:fs/promises'
import { dirname } from 'node:path'
import { isProcessAlive } from './processes'

const ourPrograms = 'server/cli/'

/**
 * Makes this process the only one that starts and stops the private database of a data folder.
 * @returns the undoing
 * @throws when another one is at it, with its process id in the sentence
 */
export async function takeRunLock(file: string): Promise<() => Promise<void>> {
  await mkdir(dirname(file), { recursive: true })
  const holder = Number(await readFile(file, 'utf8').catch(() => '0'))
  if (holder > 0 && holder !== process.pid && isProcessAlive(holder, ourPrograms)) {
    throw new Error(
      `Good Footing is running in this folder already (process ${holder}). Stop it first, or set DATA_DIR to another folder and PORT to another port.`,
    )
  }
  await rm(file, { force: true })
  await writeFile(file, String(process.pid), { flag: 'wx' })
  return () => rm(file, { force: true })
}
