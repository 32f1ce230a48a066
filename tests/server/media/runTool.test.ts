import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { runTool } from '../../../server/media/runTool'

const folder = mkdtempSync(join(tmpdir(), 'tool-'))
afterAll(() => rmSync(folder, { recursive: true }))
const limits = { timeoutMs: 10_000 }
const node = process.execPath

describe('runTool', () => {
  it('1.2.5 hands over what a shell would run as plain words', async () => {
    const trace = join(folder, 'ran')
    const words = [
      `film.mp4; touch ${trace}`,
      `$(touch ${trace})`,
      `\`touch ${trace}\``,
      '| cat',
      '*',
    ]
    const echo = ['-e', 'console.log(JSON.stringify(process.argv.slice(1)))', '--', ...words]
    const { stdout, exitCode } = await runTool(node, echo, limits)
    expect(JSON.parse(stdout)).toEqual(words)
    expect(exitCode).toBe(0)
    expect(existsSync(trace)).toBe(false)
  })

  it('ends a program that takes too long', async () => {
    const forever = ['-e', 'setInterval(() => {}, 1000)']
    await expect(runTool(node, forever, { timeoutMs: 300 })).rejects.toThrow('ended by SIGKILL')
  })

  it('ends a program that says too much', async () => {
    await expect(runTool('/usr/bin/yes', [], limits)).rejects.toThrow('said too much')
  })

  it('gives way when it is told to', async () => {
    const stop = new AbortController()
    const running = runTool(node, ['-e', 'setInterval(() => {}, 1000)'], {
      ...limits,
      signal: stop.signal,
    })
    stop.abort()
    await expect(running).rejects.toThrow('abort')
  })

  it('says that a program is not there', async () => {
    await expect(runTool(join(folder, 'nothing'), [], limits)).rejects.toThrow('ENOENT')
  })
})
