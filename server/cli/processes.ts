import { spawn, type ChildProcess, type SpawnOptions } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { setTimeout as wait } from 'node:timers/promises'

/** True while the process lives and its command line holds the words; a reused id or a zombie is not it. */
export function isProcessAlive(processId: number, commandPart: string): boolean {
  try {
    process.kill(processId, 0)
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EPERM') return false
  }
  if (process.platform !== 'linux') return true
  try {
    const commandLine = readFileSync(`/proc/${processId}/cmdline`, 'utf8').replaceAll('\0', ' ')
    return commandLine.includes(commandPart)
  } catch {
    return false
  }
}

/** Asks again and again until the answer is yes; false when the time is over. */
export async function waitUntil(
  isReached: () => boolean | Promise<boolean>,
  timeoutMs: number,
  pauseMs = 50,
): Promise<boolean> {
  const end = Date.now() + timeoutMs
  while (Date.now() < end) {
    if (await isReached()) return true
    await wait(pauseMs)
  }
  return isReached()
}

export interface ProcessEnd {
  code: number
  output: string
}

/** Runs a program to its end and hands back its exit code and what it wrote. */
export async function runProgram(
  command: string,
  args: string[],
  options: SpawnOptions & { onStart?: (child: ChildProcess) => void } = {},
): Promise<ProcessEnd> {
  const { onStart, ...spawnOptions } = options
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: ['ignore', 'pipe', 'pipe'], ...spawnOptions })
    onStart?.(child)
    let output = ''
    const collect = (chunk: Buffer) => {
      output += chunk.toString()
    }
    child.stdout?.on('data', collect)
    child.stderr?.on('data', collect)
    child.on('error', reject)
    child.on('close', (code) => resolve({ code: code ?? 1, output }))
  })
}

/** Ends a child in an orderly way, and by force when it has not ended in time. */
export async function endChild(child: ChildProcess, timeoutMs: number): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return
  const ended = new Promise((resolve) => child.once('exit', resolve))
  child.kill('SIGTERM')
  const force = setTimeout(() => child.kill('SIGKILL'), timeoutMs)
  await ended
  clearTimeout(force)
}

/** True when nothing listens on the port of this address. */
export async function isPortFree(port: number, host?: string): Promise<boolean> {
  return new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', () => resolve(false))
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)))
  })
}

/** A loopback port that nothing listens on at this moment. */
export async function findFreePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address()
      probe.close(() => {
        if (address && typeof address === 'object') resolve(address.port)
        else reject(new Error('This machine gave no free port.'))
      })
    })
  })
}
