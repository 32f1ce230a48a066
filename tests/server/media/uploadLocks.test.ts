import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs'
import { readdir } from 'node:fs/promises'
import { hostname, tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it, vi } from 'vitest'
import { createUploadLocks } from '../../../server/media/uploadLocks'

const folder = mkdtempSync(join(tmpdir(), 'locks-'))
afterAll(() => rmSync(folder, { recursive: true }))
/** As two processes have them, that share a folder. */
const [here, there] = [createUploadLocks(folder), createUploadLocks(folder)]
const never = new AbortController().signal
const keep = () => undefined

describe('a lock on an upload', () => {
  it('is held by one at a time, whichever process asks', async () => {
    let held = 0
    let most = 0
    const work = async (index: number) => {
      const lock = (index % 2 ? here : there).newLock('shared')
      await lock.lock(never, keep)
      most = Math.max(most, ++held)
      await new Promise((resolve) => setTimeout(resolve, 20))
      held -= 1
      await lock.unlock()
    }
    await Promise.all(Array.from({ length: 8 }, (_, index) => work(index)))
    expect(most).toBe(1)
    expect(await readdir(folder)).toEqual([])
  })

  it('asks its holder to give way, once another wants it', async () => {
    const old = here.newLock('cut')
    const giveWay = vi.fn(() => void old.unlock())
    await old.lock(never, giveWay)
    const next = there.newLock('cut')
    await next.lock(never, keep)
    expect(giveWay).toHaveBeenCalled()
    await next.unlock()
  })

  it('is not waited for without end', async () => {
    const impatient = createUploadLocks(folder, { waitMs: 300 })
    const holder = here.newLock('busy')
    await holder.lock(never, keep)
    await expect(impatient.newLock('busy').lock(never, keep)).rejects.toMatchObject({
      status_code: 500,
    })
    await holder.unlock()
  })

  it('is not waited for by a request that is gone', async () => {
    const holder = here.newLock('gone')
    await holder.lock(never, keep)
    await expect(there.newLock('gone').lock(AbortSignal.abort(), keep)).rejects.toBeDefined()
    await holder.unlock()
  })

  it('of a process that has ended is taken over at once', async () => {
    const { pid } = spawnSync(process.execPath, ['-e', ''])
    writeFileSync(join(folder, 'dead.lock'), `${hostname()} ${pid}`)
    const lock = here.newLock('dead')
    await lock.lock(never, keep)
    await lock.unlock()
  })

  it('of another machine is taken over when nobody has touched it for long', async () => {
    const path = join(folder, 'far.lock')
    writeFileSync(path, 'elsewhere 1')
    const impatient = createUploadLocks(folder, { waitMs: 300 })
    await expect(impatient.newLock('far').lock(never, keep)).rejects.toBeDefined()
    const long = new Date(Date.now() - 60_000)
    utimesSync(path, long, long)
    const lock = impatient.newLock('far')
    await lock.lock(never, keep)
    await lock.unlock()
  })
})
