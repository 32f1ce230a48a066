import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { checkCases } from './calcCases'
import { computeCutList, cutListDescription } from './calcCutList'
import { computeJson, describeCalculator, failure } from './calcJson'
import { calculators } from '../../shared/calculators/index'

const USAGE = `calc ID 'JSON of inputs' computes, calc list names every calculator, calc check FILE.json checks cases.`

/** Text for stdout and the exit code. */
export interface CommandResult {
  text: string
  exitCode: number
}

const answer = (value: unknown, exitCode = 0): CommandResult => ({
  text: JSON.stringify(value, null, 2),
  exitCode,
})

/** Runs the command line of the calculators: `ID JSON`, `list` or `check FILE.json`. */
export function runCalc(
  words: readonly string[],
  readFile: (path: string) => string,
): CommandResult {
  const [command, argument] = words
  if (command === undefined) return answer(failure('id', USAGE), 1)
  if (command === 'list') {
    return answer([...calculators.map(describeCalculator), cutListDescription])
  }
  if (command !== 'check') {
    const result = computeJson(command, argument ?? '{}')
    return answer(result, 'error' in result ? 1 : 0)
  }
  if (argument === undefined) return answer(failure('file', USAGE), 1)
  try {
    return checkCases(readFile(argument))
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    return answer(failure('file', `${argument} cannot be read: ${reason}`), 1)
  }
}

/** Runs `cutlist JSON`, which searches and so takes its time. */
export async function runCalcCutList(json = '{}'): Promise<CommandResult> {
  const result = await computeCutList(json)
  return answer(result, 'error' in result ? 1 : 0)
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const words = process.argv.slice(2)
  const { text, exitCode } =
    words[0] === 'cutlist'
      ? await runCalcCutList(words[1])
      : runCalc(words, (path) => readFileSync(path, 'utf8'))
  process.stdout.write(`${text}\n`)
  process.exitCode = exitCode
}
