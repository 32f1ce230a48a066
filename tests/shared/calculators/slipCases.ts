import { describe, expect, it } from 'vitest'
import { findCalculator } from '../../../shared/calculators/index'
import { gradeExercise } from '../../../shared/grading/index'
import type { Exercise, UnitSystem } from '../../../shared/contracts/exercises'

/** One slip: what a person who makes it would type, and what is right, both worked out by hand. */
export interface SlipRow {
  asked: string
  slip: string
  typed: string
  right: string
  /** Inputs that differ from the usual ones. */
  texts?: Record<string, string>
  /** Whose units bare numbers have; metric where it is not said. */
  system?: UnitSystem
  /** Absolute tolerance in SI, where the usual one does not fit what is asked. */
  within?: number
}

/** A wrong answer that no slip explains, so that none may be named. */
export type UnexplainedRow = Omit<SlipRow, 'slip'>

/** Absolute tolerance in SI: a fifth of a millimetre, a hundredth of a degree. Counts and words must be met. */
const WITHIN = 0.0002

function gradeRow(id: string, usual: Record<string, string>, row: UnexplainedRow, answer: string) {
  const texts = { ...usual, ...row.texts }
  const calculator = findCalculator(id)
  const exercise: Exercise = {
    kind: 'calculator',
    prompt: 'What comes out?',
    tries: 3,
    definition: {
      calculator: id,
      asked: row.asked,
      inputs: Object.fromEntries(
        Object.entries(texts).map(([name, value]) => [name, { mode: 'own' as const, value }]),
      ),
      tolerance: { kind: 'absolute', value: row.within ?? WITHIN },
      hints: [],
      slips: calculator?.slips.map((slip) => slip.id) ?? [],
    },
  }
  const { system = 'metric' } = row
  return gradeExercise(exercise, { kind: 'calculator', inputs: texts, answer, units: system }, 1)
}

/** Whether a text holds this figure by itself, not as a part of a longer one; words of a choice may be said. */
function tells(text: string, right: string): boolean {
  if (!/^\d/.test(right)) return false
  const escaped = right.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')
  return new RegExp(`(?<![\\w.,/-])${escaped}(?![\\w/-]|[.,]\\d)`).test(text)
}

/** Grades what a person would type for each slip, what is right, and what no slip explains; no slip of the calculator may be left out. */
export function describeSlips(
  id: string,
  usual: Record<string, string>,
  rows: readonly SlipRow[],
  unexplained: readonly UnexplainedRow[] = [],
): void {
  describe(`the slips of ${id}`, () => {
    it.each(rows)('$slip: $typed instead of $right', (row) => {
      const verdict = gradeRow(id, usual, row, row.typed)
      expect(verdict).toMatchObject({ right: false, outcome: 'slip', slip: { id: row.slip } })
      expect(tells(`${verdict.message} ${verdict.wayBack}`, row.right)).toBe(false)
    })

    it.each(rows)('$slip is silent for the right $right', (row) => {
      const verdict = gradeRow(id, usual, row, row.right)
      expect(verdict).toMatchObject({ right: true, outcome: 'right', slip: null })
    })

    it.each(unexplained)('are silent for $typed instead of $right', (row) => {
      expect(gradeRow(id, usual, row, row.right).outcome).toBe('right')
      expect(gradeRow(id, usual, row, row.typed).outcome).toBe('wrong')
    })

    it('are all tried', () => {
      const tried = rows.map(({ slip }) => slip)
      const all = findCalculator(id)?.slips.map((slip) => slip.id) ?? []
      expect(all.filter((slip) => !tried.includes(slip))).toEqual([])
    })
  })
}
