import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import loadHighs from 'highs'
import { afterAll, describe, expect, it } from 'vitest'
import { runCutlist } from '../../../server/cli/cutlist'

const folder = mkdtempSync(join(tmpdir(), 'good-footing-cutlist-'))
afterAll(() => rmSync(folder, { recursive: true, force: true }))

async function run(text: string, ...words: string[]) {
  const lines: string[] = []
  const readFile = () => text
  const exitCode = await runCutlist(['problems.txt', ...words], {
    readFile,
    loadSolver: () => loadHighs(),
    print: (line) => void lines.push(line),
  })
  return { lines, exitCode }
}

const easy = 'u1\n 10 4 2\n6\n4\n7\n3\n'
/** Three pieces of 6 never share a bar of 10, so that two bars are too few. */
const impossible = 't2\n 10 3 2\n6\n6\n6\n'

describe('cutlist FILE', () => {
  it('prints a line a problem and how many needed no more bars than the best known', async () => {
    const { lines, exitCode } = await run(`2\n${easy}${impossible}`)
    expect(lines).toEqual([
      expect.stringMatching(/^u1 2 2 \d+\.\d\d optimal$/),
      expect.stringMatching(/^t2 3 2 \d+\.\d\d optimal$/),
      '1 passed, 1 failed',
    ])
    expect(exitCode).toBe(1)
  })

  it('prints the gap where time runs out before the proof', async () => {
    // Twenty bars cut into three each with nothing left over; first-fit does not find that again.
    const pieces = Array.from({ length: 20 }, (_, bar) => {
      const [one, other] = [400 + ((bar * 41) % 90), 260 + ((bar * 53) % 110)]
      return [one, other, 1000 - one - other]
    }).flat()
    const text = `1\nt3\n1000 ${pieces.length} 20\n${pieces.join('\n')}\n`
    const quick = await run(text, '0.000001')
    expect(quick.lines).toEqual([
      expect.stringMatching(/^t3 2[1-9] 20 \d+\.\d\d gap$/),
      '0 passed, 1 failed',
    ])
    expect((await run(text)).lines).toEqual([
      expect.stringMatching(/^t3 20 20 \d+\.\d\d optimal$/),
      '1 passed, 0 failed',
    ])
  })

  it('says what is wrong with a file, and how it is called', async () => {
    expect(await run('1\nx\n')).toEqual({
      lines: [expect.stringMatching(/^problems.txt cannot be packed: Line 2 is “x”/)],
      exitCode: 1,
    })
    const long = await run('1\nu1\n10 1 1\n11\n')
    expect(long.exitCode).toBe(1)
    expect((await run('', '-1')).lines).toEqual([expect.stringMatching(/^cutlist FILE/)])
  })

  it('runs as the script cutlist and answers with the exit code', () => {
    const path = join(folder, 'easy.txt')
    writeFileSync(path, `1\n${easy}`)
    const text = execFileSync('npm', ['run', '--silent', 'cutlist', '--', path], {
      encoding: 'utf8',
    })
    expect(text).toMatch(/^u1 2 2 \d+\.\d\d optimal\n1 passed, 0 failed\n$/)
  })
})
