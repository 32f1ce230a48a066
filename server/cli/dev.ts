import { spawn } from 'node:child_process'
import { prepareDatabase } from './prepareDatabase'
import { endChild, isPortFree, waitUntil } from './processes'
import { runToEnd, stopOnSignals, whenStopping } from './shutdown'
import { describeSignIns } from './signIns'

const firstAnswerMs = 60_000

/** The server from its sources, started again when they change, with Vite's hot reload behind it. */
async function develop(): Promise<number> {
  const port = Number(process.env['PORT'] ?? 3000)
  if (!(await isPortFree(port))) {
    throw new Error(`Port ${port} is taken by another program. Stop it, or set PORT to a free one.`)
  }
  await prepareDatabase(console.log)
  const signIns = await describeSignIns()
  const child = spawn(
    process.execPath,
    ['node_modules/tsx/dist/cli.mjs', 'watch', '--clear-screen=false', 'server/index.ts'],
    { stdio: 'inherit', env: { ...process.env, NODE_ENV: 'development' } },
  )
  whenStopping(() => endChild(child, 10_000))
  void waitUntil(async () => !(await isPortFree(port)), firstAnswerMs, 500).then((isOpen) => {
    if (isOpen) console.log(`\nhttp://localhost:${port}\n\n${signIns}`)
  })
  return new Promise((resolve) => {
    child.once('exit', (code) => resolve(code ?? 1))
  })
}

process.env['NODE_ENV'] = 'development'
stopOnSignals(0)
void runToEnd(develop)
