import { randomUUID } from 'node:crypto'
import { access, readFile, rename, rm, stat, utimes, writeFile } from 'node:fs/promises'
import { hostname } from 'node:os'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { ERRORS, type Locker } from '@tus/server'

type Lock = ReturnType<Locker['newLock']>

/** How often a holder looks whether another request wants its upload, and a waiting one whether it is free. */
const lookMs = 200
/** A lock that nobody has touched for so long belongs to a machine that is gone. */
const staleMs = 15_000
const waitMs = 30_000

export interface UploadLockOptions {
  /** How long a request waits for another to let go. */
  waitMs?: number
}

/** What the library answers for a lock that was not let go, as an error. */
const stillHeld = () => Object.assign(new Error('still held'), ERRORS.ERR_LOCK_TIMEOUT)

const isThere = (path: string) =>
  access(path).then(
    () => true,
    () => false,
  )

/** True for a lock whose holder has ended without letting go. */
async function isForsaken(path: string): Promise<boolean> {
  const [found, holder] = await Promise.all([
    stat(path).catch(() => null),
    readFile(path, 'utf8').catch(() => ''),
  ])
  if (!found) return false
  const [host, pid] = holder.split(' ')
  if (host !== hostname() || Number(pid) === process.pid)
    return found.mtimeMs < Date.now() - staleMs
  try {
    process.kill(Number(pid), 0)
    return found.mtimeMs < Date.now() - staleMs
  } catch {
    return true
  }
}

/**
 * One request at a time for an upload, over all processes that share the folder: a lock is a file beside the
 * upload. Whoever wants it leaves a note, and the holder gives way, because its line may be dead already.
 */
export function createUploadLocks(
  folder: string,
  { waitMs: patience = waitMs }: UploadLockOptions = {},
): Locker {
  return {
    newLock(id: string): Lock {
      const path = join(folder, `${id}.lock`)
      const wanted = join(folder, `${id}.wanted`)
      let watching: ReturnType<typeof setInterval> | undefined

      async function take(): Promise<boolean> {
        try {
          await writeFile(path, `${hostname()} ${process.pid}`, { flag: 'wx' })
          return true
        } catch (error) {
          if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error
        }
        if (await isForsaken(path)) {
          // Of two that clear it away one succeeds; both then try again.
          const aside = `${path}.${randomUUID()}`
          await rename(path, aside).catch(() => undefined)
          await rm(aside, { force: true })
        }
        return false
      }

      return {
        async lock(signal, requestRelease) {
          const deadline = Date.now() + patience
          while (!(await take())) {
            if (signal.aborted || Date.now() > deadline) throw stillHeld()
            await writeFile(wanted, '').catch(() => undefined)
            await sleep(lookMs)
          }
          await rm(wanted, { force: true })
          watching = setInterval(() => {
            const now = new Date()
            utimes(path, now, now).catch(() => undefined)
            void isThere(wanted).then((isWanted) => isWanted && requestRelease())
          }, lookMs)
          watching.unref()
        },
        async unlock() {
          clearInterval(watching)
          await rm(path, { force: true })
        },
      }
    },
  }
}
