import { spawn } from 'node:child_process'
import { delimiter, resolve } from 'node:path'
import { endChild } from './processes'
import { runToEnd, stopOnSignals, whenStopping } from './shutdown'
import { startTestDatabase } from './testDatabase'
import { testEnvironment } from './testEnvironment'

/** Runs the command that follows with a MariaDB and a data folder that end with it. */
async function run(): Promise<number> {
  const [command, ...args] = process.argv.slice(2)
  if (!command) throw new Error('Say which command needs the database, e.g. "vitest run".')
  const database = await startTestDatabase()
  whenStopping(() => database.stop())
  const env = await testEnvironment(database)
  const path = [resolve('node_modules/.bin'), process.env['PATH']].join(delimiter)
  const child = spawn(command, args, { stdio: 'inherit', env: { ...env, PATH: path } })
  whenStopping(() => endChild(child, 10_000))
  return new Promise((done, reject) => {
    child.once('error', reject)
    child.once('exit', (code) => done(code ?? 1))
  })
}

stopOnSignals(130)
void runToEnd(run)
