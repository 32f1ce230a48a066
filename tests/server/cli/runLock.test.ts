import { spawn } from 'node:child_process'
import { existsSync } from 'node:fs'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { takeRunLock } from '../../../server/cli/runLock'

let folder: string
let file: string

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'good-footing-lock-'))
  file = join(folder, 'running.pid')
})
afterEach(() => rm(folder, { recursive: true }))

const waitFor60Seconds = 'setTimeout(() => {}, 60_000)'

describe('takeRunLock', () => {
  it('is gone after it was given back', async () => {
    const giveBack = await takeRunLock(file)
    expect(existsSync(file)).toBe(true)
    await giveBack()
    expect(existsSync(file)).toBe(false)
  })

  it('refuses while another start of ours lives, and names it', async () => {
    const other = spawn(process.execPath, ['-e', waitFor60Seconds, 'server/cli/start.ts'])
    try {
      await writeFile(file, String(other.pid))
      await expect(takeRunLock(file)).rejects.toThrow(`process ${other.pid}`)
    } finally {
      other.kill('SIGKILL')
    }
  })

  it('takes over from a process that died, and from a stranger with a reused id', async () => {
    const stranger = spawn(process.execPath, ['-e', waitFor60Seconds])
    try {
      await writeFile(file, String(stranger.pid))
      await expect(takeRunLock(file)).resolves.toBeTypeOf('function')
    } finally {
      stranger.kill('SIGKILL')
    }
    await writeFile(file, '999999999')
    await expect(takeRunLock(file)).resolves.toBeTypeOf('function')
  })
})
