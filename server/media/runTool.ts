import { spawn } from 'node:child_process'

export interface ToolResult {
  exitCode: number | null
  stdout: string
  stderr: string
}

interface Limits {
  timeoutMs: number
  signal?: AbortSignal
}

const mostOutput = 2 * 1024 ** 2

/**
 * Runs a program without a shell, with nothing to read and a time limit.
 * Rejects when it cannot be started, takes too long, says too much, or `signal` ends it.
 */
export function runTool(
  path: string,
  args: string[],
  { timeoutMs, signal }: Limits,
): Promise<ToolResult> {
  return new Promise((resolve, reject) => {
    const child = spawn(path, args, {
      stdio: ['ignore', 'pipe', 'pipe'],
      shell: false,
      killSignal: 'SIGKILL',
      timeout: timeoutMs,
      ...(signal ? { signal } : {}),
    })
    const output = { stdout: '', stderr: '' }
    let isTooMuch = false
    for (const name of ['stdout', 'stderr'] as const) {
      child[name].setEncoding('utf8')
      child[name].on('data', (text: string) => {
        output[name] += text
        if (output[name].length <= mostOutput) return
        isTooMuch = true
        child.kill('SIGKILL')
      })
    }
    child.on('error', reject)
    child.on('close', (exitCode, killedBy) => {
      if (isTooMuch) reject(new Error(`${path} said too much`))
      else if (killedBy) reject(new Error(`${path} was ended by ${killedBy}`))
      else resolve({ exitCode, ...output })
    })
  })
}
