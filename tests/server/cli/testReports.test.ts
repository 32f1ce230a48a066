import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import {
  addTallies,
  describeTally,
  tallyPlaywright,
  tallyVitest,
} from '../../../server/cli/testReports'

let folder: string

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'good-footing-reports-'))
})
afterAll(() => rm(folder, { recursive: true }))

async function report(content: unknown): Promise<string> {
  const file = join(folder, 'report.json')
  await writeFile(file, JSON.stringify(content))
  return file
}
const suite = (status: string, ...statuses: string[]) => ({
  status,
  assertionResults: statuses.map((each) => ({ status: each })),
})

describe('tallyVitest', () => {
  it('counts tests, not files', async () => {
    const file = await report({
      testResults: [
        suite('passed', 'passed', 'passed'),
        suite('failed', 'passed', 'failed', 'todo'),
      ],
    })
    expect(tallyVitest(file, 1)).toEqual({ passed: 3, failed: 1, skipped: 1 })
  })

  it('counts a file that did not load as a failure', async () => {
    const file = await report({ testResults: [suite('failed'), suite('passed', 'passed')] })
    expect(tallyVitest(file, 1)).toEqual({ passed: 1, failed: 1, skipped: 0 })
  })

  it('counts an error outside all tests as a failure', async () => {
    const file = await report({ testResults: [suite('passed', 'passed')] })
    expect(tallyVitest(file, 1)).toEqual({ passed: 1, failed: 1, skipped: 0 })
  })

  it('counts a run without a report or without tests as a failure', async () => {
    expect(tallyVitest(join(folder, 'none.json'), 0).failed).toBe(1)
    expect(tallyVitest(await report({ testResults: [] }), 0).failed).toBe(1)
  })
})

describe('tallyPlaywright', () => {
  it('counts what passed at a second try only, and errors outside all tests, as failures', async () => {
    const file = await report({
      stats: { expected: 4, unexpected: 1, flaky: 1, skipped: 2 },
      errors: [{ message: 'the server did not start' }],
    })
    expect(tallyPlaywright(file, 1)).toEqual({ passed: 4, failed: 3, skipped: 2 })
  })
})

describe('describeTally', () => {
  it('names skipped tests only when there are any', () => {
    const sum = addTallies([
      { passed: 2, failed: 0, skipped: 0 },
      { passed: 1, failed: 3, skipped: 0 },
    ])
    expect(describeTally(sum)).toBe('3 passed, 3 failed')
    expect(describeTally({ ...sum, skipped: 1 })).toBe('3 passed, 3 failed, 1 skipped')
  })
})
