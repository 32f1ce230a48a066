import { checkCutRequest } from './checkCutRequest'
import { layOut, type CutList, type SolvedSection } from './cutList'
import { homeLimits, type CutLimits, type CutRequest } from './cutRequest'
import type { Deadline, LpSolver } from './lpSolver'
import { splitSections } from './sectionProblem'
import { solveAtOnce, solveSection } from './solveSection'

/** How far a search has come. */
export interface CutProgress {
  /** Sections that are finished, of how many. */
  sectionsDone: number
  sections: number
  /** The best list so far; null while a section still has none. */
  list: CutList | null
}

/** With what and for how long to search. */
export interface CutTools {
  openSolver: (deadline: Deadline) => LpSolver
  /** For all sections together; each gets an equal share of what is left. */
  millisecondsLimit: number
  limits?: CutLimits
  isCancelled?: () => boolean
  onProgress?: (progress: CutProgress) => void
}

/**
 * A list at once, by first-fit and best mixtures, with what is already proved of it; null where stock is so scarce
 * that only a search can tell. Throws CalculatorInputError where the request cannot be cut.
 */
export function cutListAtOnce(request: CutRequest, limits: CutLimits = homeLimits): CutList | null {
  checkCutRequest(request, limits)
  const solved = splitSections(request).map(solveAtOnce)
  return solved.every((section) => section !== null) ? layOut(request, solved) : null
}

/**
 * The cut list of least cost (without prices: least bought length), then least waste, then few different cuts.
 * The same for the same request, unless time runs out or it is cancelled: then the best so far, with its gap.
 */
export function solveCutList(request: CutRequest, tools: CutTools): CutList {
  const { openSolver, millisecondsLimit, limits, onProgress } = tools
  checkCutRequest(request, limits)
  const ends = Date.now() + millisecondsLimit
  const problems = splitSections(request)
  const solved: (SolvedSection | null)[] = problems.map(solveAtOnce)
  const report = (sectionsDone: number) => {
    const isWhole = solved.every((section) => section !== null)
    const list = isWhole ? layOut(request, solved) : null
    onProgress?.({ sectionsDone, sections: problems.length, list })
  }
  problems.forEach((problem, index) => {
    report(index)
    const share = (ends - Date.now()) / (problems.length - index)
    const deadline = openDeadline(share, tools.isCancelled)
    const onChange = (better: SolvedSection) => {
      solved[index] = better
      report(index)
    }
    const sectionTools = { deadline, solver: openSolver(deadline), onChange }
    solved[index] = solveSection(problem, sectionTools, solved[index] ?? null)
  })
  report(problems.length)
  return layOut(
    request,
    solved.filter((section) => section !== null),
  )
}

function openDeadline(milliseconds: number, isCancelled?: () => boolean): Deadline {
  const ends = Date.now() + milliseconds
  return { millisecondsLeft: () => (isCancelled?.() ? 0 : ends - Date.now()) }
}
