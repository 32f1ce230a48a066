import { join } from 'node:path'
import { buildWhenChanged } from './build'
import { endChild, runProgram } from './processes'
import { runToEnd, stopOnSignals, whenStopping } from './shutdown'
import { startTestDatabase } from './testDatabase'
import { testEnvironment } from './testEnvironment'
import { addTallies, describeTally, tallyPlaywright, tallyVitest, type Tally } from './testReports'

const bin = {
  eslint: 'node_modules/eslint/bin/eslint.js',
  vueTsc: 'node_modules/vue-tsc/bin/vue-tsc.js',
  tsc: 'node_modules/typescript/bin/tsc',
  vitest: 'node_modules/vitest/vitest.mjs',
  playwright: 'node_modules/@playwright/test/cli.js',
}
const passedOnce: Tally = { passed: 1, failed: 0, skipped: 0 }
const failedOnce: Tally = { passed: 0, failed: 1, skipped: 0 }

/** All checks of the project; the last line is their count. */
async function testAll(): Promise<number> {
  const database = await timed('Database', startTestDatabase)
  whenStopping(() => database.stop())
  const env = await testEnvironment(database)

  const [checks, units] = await Promise.all([runChecks(), runVitest(env, database.dataFolder)])
  const build = await runBuild()
  const browser = build.failed === 0 ? await runPlaywright(env, database.dataFolder) : failedOnce

  const total = addTallies([...checks, units, build, browser])
  await database.stop()
  console.log(`\n${describeTally(total)}`)
  return total.failed === 0 ? 0 : 1
}

/** One after the other, so that the tests beside them keep a core. */
async function runChecks(): Promise<Tally[]> {
  return [
    await runCheck('Lint and import rules', [bin.eslint, '.', '--max-warnings', '0']),
    await runCheck('Types', [bin.vueTsc, '--noEmit', '-p', 'tsconfig.json']),
    await runCheck('Types of shared/', [bin.tsc, '--noEmit', '-p', 'shared/tsconfig.json']),
  ]
}

async function runCheck(name: string, args: string[]): Promise<Tally> {
  return timed(name, async () => {
    const { code, output } = await runProgram(process.execPath, args, { onStart: endWithUs })
    if (code !== 0) console.log(`\n${name}: failed\n${output}`)
    return code === 0 ? passedOnce : failedOnce
  })
}

async function runVitest(env: NodeJS.ProcessEnv, folder: string): Promise<Tally> {
  const report = join(folder, 'vitest.json')
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  return timed('Unit and API tests', async () => {
    const { code } = await runProgram(
      process.execPath,
      [bin.vitest, 'run', '--maxWorkers=1', ...reporters],
      { env: { ...env, NODE_ENV: 'test' }, stdio: 'inherit', onStart: endWithUs },
    )
    return tallyVitest(report, code)
  })
}

async function runBuild(): Promise<Tally> {
  return timed('Build', async () => {
    try {
      await buildWhenChanged(console.log)
      return passedOnce
    } catch (error) {
      console.log(String(error))
      return failedOnce
    }
  })
}

async function runPlaywright(env: NodeJS.ProcessEnv, folder: string): Promise<Tally> {
  const report = join(folder, 'playwright.json')
  return timed('Browser tests', async () => {
    const { code } = await runProgram(
      process.execPath,
      [bin.playwright, 'test', '-c', 'tests/e2e/playwright.config.ts', '--reporter=list,json'],
      {
        env: { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: report },
        stdio: 'inherit',
        onStart: endWithUs,
      },
    )
    return tallyPlaywright(report, code)
  })
}

function endWithUs(child: Parameters<typeof endChild>[0]): void {
  whenStopping(() => endChild(child, 15_000))
}

async function timed<T>(name: string, step: () => Promise<T>): Promise<T> {
  const start = performance.now()
  console.log(`${name} …`)
  const result = await step()
  console.log(`${name}: ${((performance.now() - start) / 1000).toFixed(1)} s`)
  return result
}

stopOnSignals(130)
void runToEnd(testAll)
