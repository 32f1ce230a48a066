import { describe, expect, it } from 'vitest'
import type { OwnCalculatorRow, OwnSnapshot } from '../../../../shared/contracts/ownCalculators'
import { findExerciseProblems } from '../../../../shared/grading'
import type { Exercise } from '../../../../shared/contracts/exercises'
import { newOwnExercise, takeVersion } from '../../../../src/components/exercises/newExercises'
import {
  findBenchFace,
  keyOfOwn,
  newerVersion,
  ownChoices,
} from '../../../../src/components/exercises/ownCalculatorChoice'
import { barrows, barrowsWith } from '../../../shared/ownCalculators/definitions'

const snapshot = (version = 1, definition = barrows()): OwnSnapshot => ({
  key: 'barrows',
  version,
  definition,
})
const row = (attachable: number): OwnCalculatorRow => ({
  key: 'barrows',
  title: 'Barrows of stone',
  question: '',
  attachable,
  hasUnkept: false,
  stops: 0,
  savedAt: '2026-01-01T00:00:00.000Z',
})

describe('the choice of a calculator', () => {
  it('knows built-in and own ones apart', () => {
    expect(findBenchFace({ calculator: 'slab' })?.title).toBeTruthy()
    expect(findBenchFace({ calculator: 'own:barrows', own: snapshot() })?.slips[0]?.id).toBe(
      'no-extra',
    )
    expect(findBenchFace({ calculator: 'own:other', own: snapshot() })).toBeUndefined()
    expect(keyOfOwn('own:barrows')).toBe('barrows')
    expect(keyOfOwn('slab')).toBeUndefined()
  })
  it('keeps the one in use, whatever became of it', () => {
    expect(ownChoices([], snapshot())).toEqual([
      { value: 'own:barrows', label: 'Barrows of stone (own)' },
    ])
    expect(ownChoices([row(2)], snapshot())).toHaveLength(1)
  })
  it('tells of a newer version only', () => {
    expect(newerVersion([row(2)], snapshot(1))).toBe(2)
    expect(newerVersion([row(2)], snapshot(2))).toBeNull()
    expect(newerVersion([], snapshot(1))).toBeNull()
    expect(newerVersion([row(2)], undefined)).toBeNull()
  })
})

describe('an exercise of an own calculator', () => {
  it('can be used as it is begun', () => {
    const exercise = {
      kind: 'calculator',
      prompt: 'How much stone?',
      tries: 3,
      definition: { ...newOwnExercise(snapshot(), 'metric'), asked: 'loose', slips: ['no-extra'] },
    } as Exercise
    expect(findExerciseProblems(exercise)).toEqual([])
  })

  const written = () => ({
    ...newOwnExercise(snapshot(), 'metric'),
    inputs: {
      ...newOwnExercise(snapshot(), 'metric').inputs,
      depth: { mode: 'own' as const, value: '200 mm' },
    },
    asked: 'loose',
    tolerance: { kind: 'percent' as const, value: 3 },
    hints: ['Think of settling.'],
    slips: ['no-extra'],
  })
  it('takes a newer version and keeps what that still has', () => {
    const taken = takeVersion(written(), snapshot(2), 'metric')
    expect(taken).toEqual({ ...written(), own: snapshot(2) })
  })
  it('begins anew what measures something else now', () => {
    const { inputs } = barrows()
    const changed = barrowsWith({
      inputs: inputs.map((input) =>
        input.name === 'depth' ? { ...input, quantity: 'count' as const } : input,
      ),
    })
    const taken = takeVersion(written(), snapshot(2, changed), 'metric')
    expect(taken.inputs['depth']?.mode).toBe('fixed')
    expect(taken.asked).toBe('loose')
  })
  it('asks for something else where the answer is gone, and names no slip that is gone', () => {
    const { outputs } = barrows()
    const without = barrowsWith({
      outputs: outputs.filter(({ name }) => name !== 'loose'),
      slips: [],
    })
    const taken = takeVersion(written(), snapshot(2, without), 'metric')
    expect(taken).toMatchObject({ asked: 'trench', slips: [], hints: ['Think of settling.'] })
    expect(takeVersion(written(), snapshot(2, barrowsWith({ slips: [] })), 'metric').slips).toEqual(
      [],
    )
  })
})
