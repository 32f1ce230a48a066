import fc from 'fast-check'
import loadHighs, { type Highs } from 'highs'
import { beforeAll, describe, expect, it } from 'vitest'
import { buildFlow } from '../../../shared/cutlist/arcFlow'
import { highsSolver } from '../../../shared/cutlist/highsSolver'
import type { Goal } from '../../../shared/cutlist/master'
import { countBars, dot, isPlanSound } from '../../../shared/cutlist/patterns'
import { openSearch } from '../../../shared/cutlist/search'
import type { PackingProblem } from '../../../shared/cutlist/sectionProblem'
import { solveGoal } from '../../../shared/cutlist/solveGoal'

let highs: Highs
beforeAll(async () => {
  highs = await loadHighs()
})
const deadline = { millisecondsLeft: () => 60_000 }
const solveFlow = (problem: PackingProblem, goal: Goal) => {
  const flow = buildFlow(problem, goal, 60_000)
  if (!flow) throw new Error('too many arcs')
  const limits = { target: -1, mostNodes: 1_000_000 }
  const answer = highsSolver(highs, deadline).solveInteger(flow.program, limits)
  return answer.columns ? flow.readPlan(answer.columns) : null
}

const anyProblem = fc
  .record({
    widths: fc.uniqueArray(fc.integer({ min: 3, max: 40 }), { minLength: 1, maxLength: 5 }),
    demands: fc.array(fc.integer({ min: 1, max: 6 }), { minLength: 5, maxLength: 5 }),
    offers: fc.array(
      fc.record({
        capacity: fc.integer({ min: 30, max: 60 }),
        cost: fc.integer({ min: 1, max: 9 }),
        available: fc.option(fc.integer({ min: 0, max: 4 })),
      }),
      { minLength: 1, maxLength: 3 },
    ),
  })
  .map(({ widths, demands, offers }) => ({
    sizes: widths
      .sort((one, other) => other - one)
      .map((width, size) => ({ width, demand: demands[size]! })),
    offers: offers.map((offer) => ({ ...offer, length: offer.capacity })),
  }))

describe('the flow along the bars', () => {
  it('costs what column generation and its branching find, and reads as a sound plan', () => {
    fc.assert(
      fc.property(anyProblem, (problem) => {
        const goal = { costs: problem.offers.map(({ cost }) => cost), cap: null }
        const plan = solveFlow(problem, goal)
        const search = openSearch(problem, goal, null, {
          solver: highsSolver(highs, deadline),
          deadline,
          onChange: () => undefined,
        })
        solveGoal(search)
        expect(search.bound).toBeGreaterThanOrEqual(search.cost)
        expect(plan === null).toBe(search.plan === null)
        if (!plan) return
        expect(isPlanSound(problem, plan)).toBe(true)
        expect(dot(goal.costs, countBars(problem, plan))).toBe(search.cost)
      }),
      { numRuns: 60 },
    )
  })

  it('keeps the cap on the other sum', () => {
    const problem: PackingProblem = {
      sizes: [{ width: 10, demand: 4 }],
      offers: [
        { capacity: 20, cost: 5, length: 20, available: null },
        { capacity: 40, cost: 9, length: 45, available: null },
      ],
    }
    const costs = [20, 45]
    expect(solveFlow(problem, { costs, cap: { costs: [5, 9], most: 9 } })).toMatchObject([
      { pattern: { offer: 1 }, bars: 1 },
    ])
    expect(solveFlow(problem, { costs, cap: { costs: [5, 9], most: 10 } })).toMatchObject([
      { pattern: { offer: 0 }, bars: 2 },
    ])
  })

  it('is not built where it would have too many arcs', () => {
    const sizes = [7, 5, 3].map((width) => ({ width, demand: 9 }))
    const problem = { sizes, offers: [{ capacity: 50, cost: 1, length: 1, available: null }] }
    expect(buildFlow(problem, { costs: [1], cap: null }, 10)).toBeNull()
  })
})
