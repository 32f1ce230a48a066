import { describe, expect, it } from 'vitest'
import { findCalculator } from '../../../shared/calculators/index'
import { gradeExercise } from '../../../shared/grading/index'
import type { Exercise } from '../../../shared/contracts/exercises'

/** One slip: what a person who makes it would type, and what is right, both worked out by hand, in metric units. */
export interface SlipRow {
  asked: string
  slip: string
  typed: string
  right: string
  /** Inputs that differ from the usual ones. */
  texts?: Record<string, string>
}

/** Absolute tolerance in SI: a fifth of a millimetre, a hundredth of a degree. Counts and words must be met. */
const WITHIN = 0.0002

function gradeRow(id: string, usual: Record<string, string>, row: SlipRow, answer: string) {
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
        Object.entries(texts).map(([name, value]) => [name, { mode: 'fixed' as const, value }]),
      ),
      tolerance: { kind: 'absolute', value: WITHIN },
      hints: [],
      slips: calculator?.slips.map((slip) => slip.id) ?? [],
    },
  }
  return gradeExercise(exercise, { kind: 'calculator', inputs: {}, answer, units: 'metric' }, 1)
}

/** Grades what a person would type for each slip, and what is right; no slip of the calculator may be left out. */
export function describeSlips(
  id: string,
  usual: Record<string, string>,
  rows: readonly SlipRow[],
): void {
  describe(`the slips of ${id}`, () => {
    it.each(rows)('$slip: $typed instead of $right', (row) => {
      const verdict = gradeRow(id, usual, row, row.typed)
      expect(verdict).toMatchObject({ right: false, outcome: 'slip', slip: { id: row.slip } })
    })

    it.each(rows)('$slip is silent for the right $right', (row) => {
      const verdict = gradeRow(id, usual, row, row.right)
      expect(verdict).toMatchObject({ right: true, outcome: 'right', slip: null })
    })

    it('are all tried', () => {
      const tried = rows.map(({ slip }) => slip)
      const all = findCalculator(id)?.slips.map((slip) => slip.id) ?? []
      expect(all.filter((slip) => !tried.includes(slip))).toEqual([])
    })
  })
}
