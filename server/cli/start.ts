import { spawn } from 'node:child_process'
import { buildWhenChanged } from './build'
import { prepareDatabase } from './prepareDatabase'
import { endChild, isPortFree } from './processes'
import { isStopping, runToEnd, stopOnSignals, whenStopping } from './shutdown'
import { describeSignIns } from './signIns'

const serverStopMs = 10_000

async function start(): Promise<number> {
  const port = Number(process.env['PORT'] ?? 3000)
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Error(`PORT is "${process.env['PORT']}"; it has to be a number from 1 to 65535.`)
  }
  if (!(await isPortFree(port))) {
    throw new Error(`Port ${port} is taken by another program. Stop it, or set PORT to a free one.`)
  }
  await prepareDatabase(console.log)
  await buildWhenChanged(console.log)
  return serve(port)
}

/** Runs the built server until it ends; answers with its exit code. */
async function serve(port: number): Promise<number> {
  const signIns = await describeSignIns()
  const child = spawn(process.execPath, ['--enable-source-maps', 'dist/server/index.js'], {
    stdio: ['inherit', 'inherit', 'inherit', 'ipc'],
    env: { ...process.env, NODE_ENV: 'production', LOG_LEVEL: process.env['LOG_LEVEL'] ?? 'warn' },
  })
  whenStopping(() => endChild(child, serverStopMs))
  child.on('message', (message) => {
    if (message !== 'listening') return
    console.log(`\nGood Footing is open at http://localhost:${port}\n\n${signIns}`)
    console.log('Ctrl-C stops it.')
  })
  return new Promise((resolve, reject) => {
    child.once('error', reject)
    child.once('exit', (code) => {
      if (!isStopping()) console.error('The server has ended; stopping the rest. Start it again.')
      resolve(code ?? 1)
    })
  })
}

stopOnSignals(0)
void runToEnd(start)
