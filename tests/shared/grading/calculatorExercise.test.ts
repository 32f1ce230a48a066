import { describe, expect, it } from 'vitest'
import { verdictSchema } from '../../../shared/contracts/exercises'
import { gradeExercise, shownAnswer } from '../../../shared/grading/index'
import { buildCalculatorExercise, buildQuiz, gradeTyped } from './exercises'

const exercise = buildCalculatorExercise()
const own = buildCalculatorExercise({
  inputs: {
    sideA: { mode: 'own', value: '2600 mm' },
    sideB: { mode: 'own', value: '1100 mm' },
    unit: { mode: 'fixed', value: '300 mm' },
  },
})

describe('gradeExercise on a calculator stop', () => {
  it.each([
    ['1500', 'right'],
    ['1500 mm', 'right'],
    ['1,5 m', 'right'],
    ['150 cm', 'right'],
    ['1501', 'right'],
    ['1499', 'right'],
    ['1501.01', 'wrong'],
    ['1498.99', 'wrong'],
    ['-1500', 'wrong'],
    ['0', 'wrong'],
    ['2100', 'slip'],
    ['', 'unread'],
    ['NaN', 'unread'],
    ['Infinity', 'unread'],
    ['1e999', 'unread'],
    ['1500 kg', 'unread'],
    ['1500 deg', 'unread'],
    ['fifteen hundred', 'unread'],
    ['9'.repeat(10_000), 'unread'],
  ])('%.20s is %s', (answer, outcome) => {
    const verdict = gradeTyped(exercise, answer)
    expect(verdictSchema.safeParse(verdict).success).toBe(true)
    expect(verdict.outcome).toBe(outcome)
    expect(verdict.right).toBe(outcome === 'right')
    expect(verdict.field).toBe(outcome === 'unread' ? 'answer' : null)
  })

  it.each([
    ['1500', 'right'],
    ['1500 mm', 'right'],
    [`4' 11-1/16"`, 'right'],
    ['59.055 in', 'right'],
    ['1.5 m', 'unread'],
    ['150 cm', 'unread'],
  ])('takes %s, told in which units to answer: %s', (answer, outcome) => {
    const narrow = buildCalculatorExercise({ acceptedUnits: ['mm', 'in'] })
    const verdict = gradeTyped(narrow, answer)
    expect(verdict.outcome).toBe(outcome)
    if (outcome === 'unread') expect(verdict.message).toContain('taken in mm, in.')
  })

  it('reads a bare number in inches for who works in feet', () => {
    const feet = buildCalculatorExercise({
      inputs: {
        sideA: { mode: 'fixed', value: "8'" },
        sideB: { mode: 'fixed', value: "4'" },
        unit: { mode: 'fixed', value: "1'" },
      },
    })
    expect(gradeTyped(feet, '60', 'imperial').right).toBe(true)
    expect(gradeTyped(feet, `5'`, 'imperial').right).toBe(true)
    expect(gradeTyped(feet, '1524', 'metric').right).toBe(true)
    expect(gradeTyped(feet, '60', 'metric').right).toBe(false)
  })

  it('counts a tolerance in per cent of the right answer', () => {
    const loose = buildCalculatorExercise({ tolerance: { kind: 'percent', value: 2 }, slips: [] })
    expect(
      ['1530', '1470', '1530.1', '1469.9'].map((text) => gradeTyped(loose, text).right),
    ).toEqual([true, true, false, false])
  })

  it.each([
    ['1500', '1500 mm is right.'],
    ['1,5 m', '1,5 m is right.'],
    ['1480', '1480 mm does not fit.'],
    [`4' 10"`, `4' 10" does not fit.`],
  ])('says back %s with the unit it was taken in', (typed, message) => {
    expect(gradeTyped(exercise, typed).message).toBe(message)
  })

  it('never tells the right number to who does not have it', () => {
    for (const answer of ['1400', '2100', '2 250 000', '150', 'x', '7 kg']) {
      const { message, wayBack, slip } = gradeTyped(exercise, answer)
      expect(JSON.stringify([message, wayBack, slip]).replaceAll(/\s/g, '')).not.toMatch(
        /1500|1\.5|4'11|59-1/,
      )
    }
  })

  it('works with the learner’s own numbers, and ignores what they say of given ones', () => {
    const inputs = { sideA: '4 m', sideB: '3 m', unit: '1 m' }
    expect(gradeTyped(own, '1500', 'metric', inputs).right).toBe(true)
    const free = buildCalculatorExercise({
      inputs: { sideA: { mode: 'own', value: '' }, sideB: { mode: 'own', value: '' } },
    })
    expect(gradeTyped(free, '5 m', 'metric', inputs).right).toBe(true)
    expect(gradeTyped(free, '1750', 'metric', { sideA: '2600', sideB: '1100' }).right).toBe(true)
  })

  it.each([
    ['sideA', '400 m', /^Long side: 400.000.mm is out of range\. Give 300.mm to 30.000.mm\.$/],
    ['sideB', '-1 m', /^Short side: −1000.mm is out of range/],
    ['sideB', 'short', /^Short side: “short” cannot be read as a length/],
    ['sideB', '', /^Short side is empty/],
    ['sideB', '500 mm', /^One unit of 300.mm does not fit these sides/],
  ])('names the own input %s of “%s” and costs no try', (name, text, sentence) => {
    const verdict = gradeTyped(own, '1500', 'metric', { [name]: text })
    expect(verdict.outcome).toBe('unread')
    expect(verdict.field).toBe(text === '500 mm' ? 'unit' : name)
    expect(verdict.message).toMatch(sentence)
    expect(verdict.wayBack).toBe('This costs no try.')
  })

  it('asks for a word as well as for a number', () => {
    const judge = buildCalculatorExercise({
      calculator: 'mix',
      asked: 'verdict',
      inputs: {
        bag: { mode: 'fixed', value: '25 kg' },
        waterAdded: { mode: 'fixed', value: '3.5 L' },
      },
      slips: [],
    })
    expect(gradeTyped(judge, 'wet').right).toBe(true)
    expect(gradeTyped(judge, 'Too wet').right).toBe(true)
    expect(gradeTyped(judge, 'right').outcome).toBe('wrong')
    expect(gradeTyped(judge, 'porridge')).toMatchObject({ outcome: 'unread', field: 'answer' })
    expect(shownAnswer(judge, 1, null)).toEqual({ metric: 'Too wet', imperial: 'Too wet' })
  })

  it('does not grade the answer to another kind of stop, nor one that asks for nothing', () => {
    const quizAnswer = { kind: 'quiz' as const, answers: {} }
    expect(gradeExercise(exercise, quizAnswer, 1).outcome).toBe('unread')
    expect(gradeTyped(buildQuiz([]), '5').outcome).toBe('unread')
    expect(gradeTyped(buildCalculatorExercise({ calculator: 'moon' }), '5').outcome).toBe('unread')
    expect(gradeTyped(buildCalculatorExercise({ asked: 'moon' }), '5').outcome).toBe('unread')
  })
})

describe('shownAnswer on a calculator stop', () => {
  it('says it in both systems', () => {
    const shown = shownAnswer(exercise, 1, null)
    expect(shown.metric).toBe('1500\u00a0mm')
    expect(shown.imperial).toBe(`4' 11-1/16"`)
  })

  it('follows the learner’s own numbers, in whichever system they were typed', () => {
    const free = buildCalculatorExercise({
      inputs: { sideA: { mode: 'own', value: '' }, sideB: { mode: 'own', value: '' } },
    })
    const answer = {
      kind: 'calculator' as const,
      inputs: { sideA: '96', sideB: '48' },
      answer: '',
      units: 'imperial' as const,
    }
    expect(shownAnswer(free, 1, answer)).toEqual({ metric: '2000\u00a0mm', imperial: `6' 8"` })
  })

  it('is empty where nothing can be computed', () => {
    expect(shownAnswer(buildCalculatorExercise({ calculator: 'moon' }), 1, null)).toEqual({
      metric: '',
      imperial: '',
    })
  })
})
