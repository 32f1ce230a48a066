import { existsSync, readFileSync } from 'node:fs'
import loadHighs, { type Highs } from 'highs'
import { beforeAll, describe, expect, it } from 'vitest'
import type { CutRequest } from '../../../shared/cutlist/cutRequest'
import { highsSolver } from '../../../shared/cutlist/highsSolver'
import { isPlanSound } from '../../../shared/cutlist/patterns'
import { splitSections } from '../../../shared/cutlist/sectionProblem'
import { solveAtOnce, solveSection } from '../../../shared/cutlist/solveSection'

let highs: Highs
beforeAll(async () => {
  highs = await loadHighs()
})

/** Falkenauer's instances (J. Heuristics 2, 1996, 5–30) from the OR-Library, with their published optima. */
const file = '../shared/reference/cutting/instances.json'
interface Instance {
  id: string
  capacity: number
  items: number[]
  expected: number
  ffdBins?: number
}
const instances = existsSync(file) ? (JSON.parse(readFileSync(file, 'utf8')) as Instance[]) : []
/** A sample that runs in seconds; `npm run cutlist` packs whole files. */
const sample = /^orlib-(u120_0[0-8]|t60_0[0-5]|u250_0[01])$|^wiki-5600$/

const request = ({ id, items, capacity }: Instance, kerfMm = 0): CutRequest => ({
  parts: items.map((lengthMm) => ({ label: '', lengthMm, count: 1, section: id })),
  stock: [{ lengthMm: capacity, section: id }],
  kerfMm,
  endTrimMm: 0,
})

function pack(asked: CutRequest) {
  const [problem] = splitSections(asked)
  const deadline = { millisecondsLeft: () => 30_000 }
  const solver = highsSolver(highs, deadline)
  const { plan, proof } = solveSection(problem!, { solver, deadline, onChange: () => undefined })
  expect(isPlanSound(problem!, plan)).toBe(true)
  return { bars: plan.reduce((sum, line) => sum + line.bars, 0), proof }
}

const chosen = instances.filter(({ id }) => sample.test(id))
const describeInstances = chosen.length > 0 ? describe : describe.skip
const title = `published instances${chosen.length > 0 ? '' : ` (skipped: ${file} is not here)`}`

describeInstances(title, () => {
  it.each(chosen)('$id in $expected bars, proved', (instance) => {
    expect(pack(request(instance))).toEqual({ bars: instance.expected, proof: 'optimal' })
  })

  // Pieces with a kerf of k between them fill a bar just as pieces longer by k fill a bar longer by k.
  it.each(chosen.slice(0, 3))('$id again, a kerf of 3 taken off bar and pieces', (instance) => {
    const { items, capacity } = instance
    const thinner = { ...instance, items: items.map((item) => item - 3), capacity: capacity - 3 }
    expect(pack(request(thinner, 3))).toEqual({ bars: instance.expected, proof: 'optimal' })
  })

  it('needs the proof: first-fit alone is not the best on every one', () => {
    const atOnce = chosen.map((instance) => {
      const [problem] = splitSections(request(instance))
      const bars = solveAtOnce(problem!)!.plan.reduce((sum, line) => sum + line.bars, 0)
      expect(bars).toBeLessThanOrEqual(instance.ffdBins ?? Infinity)
      return bars - instance.expected
    })
    expect(Math.max(...atOnce)).toBeGreaterThan(0)
  })
})

describe('solveSection', () => {
  // Chvátal, Linear Programming, chapter 13, numbers from memory; the linear bound of 452.25 proves 453.
  it('cuts 1313 pieces of four widths from 453 rolls of 100, proved', () => {
    const demands = [
      [45, 97],
      [36, 610],
      [31, 395],
      [14, 211],
    ] as const
    const items = demands.flatMap(([width, count]) => Array<number>(count).fill(width))
    expect(pack(request({ id: 'rolls', capacity: 100, items, expected: 453 }))).toEqual({
      bars: 453,
      proof: 'optimal',
    })
  })

  it('packs a textbook case: 3 bars of 10 from 6, 5, 4, 3, 2 twice where first-fit takes as many', () => {
    const items = [600, 500, 400, 300, 200, 600, 400]
    expect(pack(request({ id: 'own', capacity: 1000, items, expected: 3 }))).toEqual({
      bars: 3,
      proof: 'optimal',
    })
  })
})
