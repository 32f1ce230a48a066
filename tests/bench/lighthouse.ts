import { spawn } from 'node:child_process'
import { chromium } from '@playwright/test'
import lighthouse from 'lighthouse'
import { sheetSchema } from '../../shared/contracts/courses'
import { endChild, findFreePort, waitUntil } from '../../server/cli/processes'
import { runToEnd, stopOnSignals, whenStopping } from '../../server/cli/shutdown'
import { startTestDatabase } from '../../server/cli/testDatabase'
import { testEnvironment } from '../../server/cli/testEnvironment'

const slug = 'a-log-store-on-a-concrete-pad'
const startMs = 240_000
const goals = { performance: 90, accessibility: 100 }
const flags = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]

/** The built server with a seeded database of its own; answers its address. */
async function serve(): Promise<string> {
  const database = await startTestDatabase()
  whenStopping(() => database.stop())
  const port = await findFreePort()
  const env = { ...(await testEnvironment(database)), PORT: String(port) }
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/cli/start.ts'], {
    stdio: ['ignore', 'ignore', 'inherit'],
    env,
  })
  whenStopping(() => endChild(child, 15_000))
  const base = `http://localhost:${port}`
  const answers = () =>
    fetch(`${base}/api/courses`).then(
      ({ ok }) => ok,
      () => false,
    )
  if (!(await waitUntil(answers, startMs, 500))) throw new Error('The server did not start.')
  return base
}

async function openBrowser(): Promise<number> {
  const port = await findFreePort()
  const browser = await chromium.launch({
    executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
    args: [...flags, `--remote-debugging-port=${port}`],
  })
  whenStopping(() => browser.close())
  return port
}

async function findSample(base: string): Promise<string> {
  const answer = await fetch(`${base}/api/courses/${slug}`)
  const sheet = sheetSchema.parse(await answer.json())
  const sample = sheet.stages.flatMap(({ lessons }) => lessons).find(({ isSample }) => isSample)
  if (!sample) throw new Error('The demo has no sample lesson.')
  return `/sheets/${slug}/lessons/${sample.key}`
}

/** Looks at one page as on a phone with a slow line; prints scores and answers whether the goals hold. */
async function judge(url: string, port: number): Promise<boolean> {
  const onlyCategories = Object.keys(goals)
  const run = await lighthouse(url, { port, onlyCategories, logLevel: 'error', output: 'json' })
  if (!run) throw new Error(`Lighthouse said nothing about ${url}.`)
  const { categories, audits } = run.lhr
  const score = (name: keyof typeof goals) => Math.round((categories[name]?.score ?? 0) * 100)
  const seen = (name: string) => audits[name]?.displayValue ?? '?'
  console.log(`${new URL(url).pathname}
  performance ${score('performance')} (goal ${goals.performance}), accessibility ${score('accessibility')} (goal ${goals.accessibility})
  first paint ${seen('first-contentful-paint')}, largest ${seen('largest-contentful-paint')}, blocked ${seen('total-blocking-time')}, shifted ${seen('cumulative-layout-shift')}`)
  for (const { auditRefs } of Object.values(categories)) {
    for (const { id, weight } of auditRefs) {
      const audit = audits[id]
      if (audit && weight > 0 && audit.score !== null && audit.score < 0.9) {
        console.log(`  loses points: ${audit.title} (${audit.displayValue ?? ''})`)
      }
    }
  }
  return score('performance') >= goals.performance && score('accessibility') >= goals.accessibility
}

/** Of a server that is open already, when its address is given; else of one started for this. */
async function bench(): Promise<number> {
  const base = process.argv[2] ?? (await serve())
  const port = await openBrowser()
  const held: boolean[] = []
  for (const path of ['/register', await findSample(base)]) {
    held.push(await judge(base + path, port))
  }
  return held.every(Boolean) ? 0 : 1
}

stopOnSignals(130)
void runToEnd(bench)
