import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import loadHighs, { type Highs } from 'highs'
import { highsSolver } from '../../shared/cutlist/highsSolver'
import { splitSections } from '../../shared/cutlist/sectionProblem'
import { solveSection } from '../../shared/cutlist/solveSection'
import { readPackingFile, type PackingFileProblem } from './packingFile'

const USAGE =
  'cutlist FILE [SECONDS] packs each problem of the file, for at most 60 s or SECONDS each.'
const defaultSeconds = 60

/** What one run needs of the outside. */
export interface CutlistOutside {
  readFile: (path: string) => string
  loadSolver: () => Promise<Highs>
  print: (line: string) => void
}

/** Packs every problem of the file and prints a line for each; answers with the exit code. */
export async function runCutlist(
  words: readonly string[],
  { readFile, loadSolver, print }: CutlistOutside,
): Promise<number> {
  const [path, seconds = String(defaultSeconds)] = words
  if (path === undefined || !(Number(seconds) > 0)) {
    print(USAGE)
    return 1
  }
  try {
    const problems = readPackingFile(readFile(path))
    const highs = await loadSolver()
    const passed = problems.filter((problem) => packProblem(highs, problem, Number(seconds), print))
    const failed = problems.length - passed.length
    print(`${passed.length} passed, ${failed} failed`)
    return failed === 0 ? 0 : 1
  } catch (error) {
    print(`${path} cannot be packed: ${error instanceof Error ? error.message : String(error)}`)
    return 1
  }
}

/** Prints `identifier bars best-known seconds optimal|gap`; whether no more bars than the best known were needed. */
function packProblem(
  highs: Highs,
  { id, capacity, lengths, bestKnown }: PackingFileProblem,
  seconds: number,
  print: (line: string) => void,
): boolean {
  const started = Date.now()
  const deadline = { millisecondsLeft: () => started + seconds * 1000 - Date.now() }
  const request = {
    parts: lengths.map((lengthMm) => ({ label: '', lengthMm, count: 1, section: id })),
    stock: [{ lengthMm: capacity, section: id }],
    kerfMm: 0,
    endTrimMm: 0,
  }
  const solved = splitSections(request).map((problem) =>
    solveSection(problem, {
      deadline,
      solver: highsSolver(highs, deadline),
      onChange: () => undefined,
    }),
  )
  const bars = solved.flatMap(({ plan }) => plan).reduce((sum, line) => sum + line.bars, 0)
  const taken = ((Date.now() - started) / 1000).toFixed(2)
  const isProved = solved.every(({ proof }) => proof === 'optimal')
  print(`${id} ${bars} ${bestKnown} ${taken} ${isProved ? 'optimal' : 'gap'}`)
  return bars <= bestKnown
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  process.exitCode = await runCutlist(process.argv.slice(2), {
    readFile: (path) => readFileSync(path, 'utf8'),
    loadSolver: () => loadHighs(),
    print: (line) => void process.stdout.write(`${line}\n`),
  })
}
