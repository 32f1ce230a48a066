import { describe, expect, it } from 'vitest'
import {
  questionVerdictSchema,
  type QuestionAnswer,
  type QuizQuestion,
} from '../../../shared/contracts/exercises'
import {
  findQuestionProblems,
  gradeQuestion,
  showQuestionAnswer,
  toLearnerQuestion,
} from '../../../shared/grading/questions'
import { questions } from './exercises'

const grade = (question: QuizQuestion, answer: QuestionAnswer) => {
  const verdict = gradeQuestion(question, answer)
  expect(questionVerdictSchema.safeParse(verdict).success).toBe(true)
  return verdict
}
const wrongKinds: Record<string, QuestionAnswer> = {
  single: { choices: ['a'] },
  several: { choice: 'a' },
  number: { order: [] },
  order: { value: '1', units: 'metric' },
}

describe('single choice', () => {
  it('shows the drawings, and keeps the written order where the video letters the choices', () => {
    const choices = questions.single.definition.choices.map((choice) => ({
      ...choice,
      drawing: 'furrow-rough-top' as const,
    }))
    const written = choices.map(({ id }) => id)
    for (let seed = 1; seed <= 20; seed++) {
      const shown = toLearnerQuestion(
        { ...questions.single, definition: { choices, keepsOrder: true } },
        seed,
      )
      expect(shown.choices?.map(({ id }) => id)).toEqual(written)
      expect(shown.choices?.[0]).toEqual({
        id: choices[0]?.id,
        text: choices[0]?.text,
        drawing: 'furrow-rough-top',
      })
    }
  })

  it('answers the tried choice alone', () => {
    expect(grade(questions.single, { choice: 'a' })).toEqual({
      right: true,
      message: 'That is the one.',
      feedback: { a: 'The float can finish it.' },
      rightIds: ['a'],
    })
    expect(grade(questions.single, { choice: 'b' })).toEqual({
      right: false,
      message: 'Not that one.',
      feedback: { b: 'It leaves hollows along the form.' },
      rightIds: [],
    })
  })

  it('does not read a choice that is none', () => {
    expect(grade(questions.single, { choice: 'z' })).toMatchObject({ right: false, unread: true })
  })

  it.each([
    ['none right', [false, false]],
    ['two right', [true, true]],
  ])('blocks %s', (_case, rights) => {
    const choices = rights.map((right, index) => ({
      id: String(index),
      text: `Choice ${String(index)}`,
      right,
      feedback: 'So.',
    }))
    const problems = findQuestionProblems({ ...questions.single, definition: { choices } })
    expect(problems).toMatchObject([{ path: 'definition.choices', blocking: true }])
  })
})

describe('several choices', () => {
  it.each([
    [['a', 'b'], true, 'Those are all.', ['a', 'b']],
    [['b', 'a', 'a'], true, 'Those are all.', ['a', 'b']],
    [['a'], false, 'What you ticked holds; something is missing.', ['a']],
    [['a', 'b', 'c'], false, 'Something you ticked does not hold.', ['a', 'b']],
    [['a', 'c'], false, 'Not all you ticked holds, and something is missing.', ['a']],
    [['c'], false, 'Not all you ticked holds, and something is missing.', []],
  ])('%j: %s', (choices, right, message, rightIds) => {
    expect(grade(questions.several, { choices })).toMatchObject({ right, message, rightIds })
  })

  it('gives feedback on what was ticked only', () => {
    expect(grade(questions.several, { choices: ['c'] }).feedback).toEqual({
      c: 'Cement in a shoe burns unseen.',
    })
    expect(grade(questions.several, { choices: ['a', 'b'] }).feedback).toEqual({
      a: 'Wet cement burns.',
    })
  })

  it('does not read an empty answer', () => {
    expect(grade(questions.several, { choices: [] }).unread).toBe(true)
    expect(grade(questions.several, { choices: ['z'] }).unread).toBe(true)
  })

  it('blocks none right, twins and empty choices', () => {
    const [first, second] = questions.several.definition.choices
    if (!first || !second) throw new Error('choices are missing')
    const check = (choices: typeof questions.several.definition.choices) =>
      findQuestionProblems({ ...questions.several, definition: { choices } })
        .filter(({ blocking }) => blocking)
        .map(({ path }) => path)
    expect(
      check([
        { ...first, right: false },
        { ...second, right: false },
      ]),
    ).toEqual(['definition.choices'])
    expect(check([first, { ...second, text: first.text }])).toEqual(['definition.choices.1'])
    expect(check([first, { ...second, text: ' ' }])).toEqual(['definition.choices.1'])
    expect(check([first, { ...second, id: first.id }])).toEqual(['definition.choices'])
  })
})

describe('number entry', () => {
  it.each([
    ['2.5 L', 'metric', true],
    ['2,55 L', 'metric', true],
    ['2.45 L', 'metric', true],
    ['2.56 L', 'metric', false],
    ['2.44 L', 'metric', false],
    ['2500 ml', 'metric', true],
    ['2.64 qt', 'imperial', true],
    ['2.5', 'metric', true],
    ['2.64', 'imperial', true],
    ['2.5 m³', 'metric', false],
  ] as const)('%s in %s: %s', (value, units, right) => {
    expect(grade(questions.number, { value, units }).right).toBe(right)
  })

  it.each([
    ['2.5 L', 'volume', 'L', 'qt'],
    ['900 mm', 'length', 'mm', 'in'],
    [`3' 6"`, 'length', 'mm', 'in'],
    ['12 ft', 'length', 'm', 'ft'],
    ['20 deg', 'angle', '°', '°'],
    ['4/12', 'ratio', '', ''],
    ['28', 'count', '', ''],
    ['10', 'percent', '%', '%'],
  ] as const)(
    'shows the field of %s in a unit of either system',
    (answer, quantity, metric, imperial) => {
      const definition = { ...questions.number.definition, answer, quantity }
      const learner = toLearnerQuestion({ ...questions.number, definition }, 1)
      expect(learner.unit).toEqual({ metric, imperial })
    },
  )

  it('says why, never the number', () => {
    const verdict = grade(questions.number, { value: '5 L', units: 'metric' })
    expect(verdict).toMatchObject({
      message: 'That does not fit.',
      feedback: { value: 'Begin with the least the bag says.' },
    })
    expect(JSON.stringify(verdict)).not.toContain('2.5')
  })

  it.each(['', 'NaN', '1e999', '2.5 kg', 'x'.repeat(10_000)])('does not read “%.12s”', (value) => {
    expect(grade(questions.number, { value, units: 'metric' })).toMatchObject({
      right: false,
      unread: true,
      rightIds: [],
    })
  })

  it.each(['much', '2.5', '2.5 kg', ''])('blocks a right answer of “%s”', (answer) => {
    const problems = findQuestionProblems({
      ...questions.number,
      definition: { ...questions.number.definition, answer },
    })
    expect(problems).toMatchObject([{ path: 'definition.answer', blocking: true }])
  })
})

describe('put in order', () => {
  it.each([
    [['wet', 'tip', 'strike', 'float'], true, 'All in their place.', {}],
    [
      ['wet', 'tip', 'float', 'strike'],
      false,
      '2 of 4 hold so far.',
      { strike: 'It comes before the float.', float: 'The board would open the surface again.' },
    ],
    [
      ['tip', 'wet', 'strike', 'float'],
      false,
      '2 of 4 hold so far.',
      { wet: 'Dry stone drinks from the mix.' },
    ],
    [
      ['float', 'wet', 'tip', 'strike'],
      false,
      '0 of 4 hold so far.',
      {
        wet: 'Dry stone drinks from the mix.',
        strike: 'It comes before the float.',
        float: 'The board would open the surface again.',
      },
    ],
  ])('%j: %s', (order, right, message, feedback) => {
    const verdict = grade(questions.order, { order })
    expect(verdict).toMatchObject({ right, message, feedback })
    expect(verdict.rightIds.length).toBe(
      4 - order.filter((id, index) => questions.order.definition.items[index]?.id !== id).length,
    )
  })

  it.each([
    [[]],
    [['wet', 'tip', 'strike']],
    [['wet', 'wet', 'strike', 'float']],
    [['wet', 'tip', 'strike', 'moon']],
  ])('does not read %j', (order) => {
    expect(grade(questions.order, { order }).unread).toBe(true)
  })

  it('blocks twins and empty lines', () => {
    const item = (id: string, text: string) => ({ id, text, feedback: '' })
    const check = (items: ReturnType<typeof item>[]) =>
      findQuestionProblems({ ...questions.order, definition: { items } }).map(({ path }) => path)
    expect(check([item('a', 'Float'), item('b', 'Float')])).toEqual(['definition.items.1'])
    expect(check([item('a', 'Float'), item('b', ' ')])).toEqual(['definition.items.1'])
    expect(check([item('a', 'Float'), item('a', 'Strike')])).toEqual(['definition.items'])
  })
})

describe('every kind', () => {
  it.each(Object.entries(questions))(
    '%s does not read the answer to another kind',
    (kind, question) => {
      const answer = wrongKinds[kind]
      if (!answer) throw new Error('no answer of another kind')
      expect(grade(question, answer)).toMatchObject({ right: false, unread: true })
    },
  )

  it.each([
    ['single', 'Stands, top closes'],
    ['several', 'Waterproof gloves; Eye protection'],
    ['number', '2.5 L'],
    ['order', 'Wet the stone; Tip from the far corner; Strike off; Float'],
  ] as const)('%s shows its answer at last', (kind, text) => {
    expect(showQuestionAnswer(questions[kind], 'metric').replaceAll(/\s/g, ' ')).toBe(text)
  })
})
