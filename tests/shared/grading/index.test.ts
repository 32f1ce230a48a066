import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findCalculator } from '../../../shared/calculators/index'
import { learnerExerciseSchema } from '../../../shared/contracts/exercises'
import {
  drawInputs,
  findExerciseProblems,
  gradeExercise,
  shownAnswer,
  toLearnerExercise,
} from '../../../shared/grading/index'
import { buildCalculatorExercise, buildQuiz, gradeTyped, questions } from './exercises'

const ranged = buildCalculatorExercise({
  inputs: {
    sideA: { mode: 'ranged', min: 1.8, max: 3.2, step: 0.05 },
    sideB: { mode: 'ranged', min: 0.75, max: 1.5, step: 0.05 },
    unit: { mode: 'fixed', value: '200 mm' },
  },
})
const square = findCalculator('square')
if (!square) throw new Error('square is missing')
const seeds = fc.integer({ min: 0, max: 2 ** 32 - 1 })
const plain = (text: string | undefined) => text?.replaceAll(/\s/g, ' ') ?? ''

describe('drawInputs', () => {
  it('gives the same numbers for the same seed, for ever', () => {
    const drawn = drawInputs(ranged.definition, square, 20_261_201)
    expect(Object.values(drawn).map(plain)).toEqual(
      Object.values(drawInputs(ranged.definition, square, 20_261_201)).map(plain),
    )
    expect(
      [1, 2, 3].map((seed) => plain(drawInputs(ranged.definition, square, seed)['sideA'])),
    ).toEqual(['2400 mm', '3050 mm', '2650 mm'])
  })

  it('stays on the grid, reaches both ends and is not always the same', () => {
    const seen = new Set<number>()
    for (let seed = 0; seed < 500; seed += 1) {
      const millimetres = Number.parseFloat(
        drawInputs(ranged.definition, square, seed)['sideA'] ?? '',
      )
      expect(millimetres % 50).toBe(0)
      seen.add(millimetres)
    }
    expect([Math.min(...seen), Math.max(...seen), seen.size]).toEqual([1800, 3200, 29])
  })

  it('draws each input by itself: another input changes nothing', () => {
    const fewer = buildCalculatorExercise({
      inputs: { sideB: { mode: 'ranged', min: 0.75, max: 1.5, step: 0.05 } },
    })
    expect(drawInputs(fewer.definition, square, 7)['sideB']).toBe(
      drawInputs(ranged.definition, square, 7)['sideB'],
    )
  })

  it('says what was typed in the other system in the person’s own', () => {
    expect(plain(drawInputs(ranged.definition, square, 1, 'imperial')['unit'])).toBe('7-7/8"')
    expect(drawInputs(ranged.definition, square, 1, 'metric')['unit']).toBe('200 mm')
  })

  it('grades by the numbers that were shown, in both systems', () => {
    fc.assert(
      fc.property(
        seeds,
        fc.constantFrom('metric' as const, 'imperial' as const),
        (seed, system) => {
          const shown = shownAnswer(ranged, seed, null)[system]
          const answer = { kind: 'calculator' as const, inputs: {}, answer: shown, units: system }
          expect(gradeExercise(ranged, answer, seed).outcome).toBe('right')
        },
      ),
    )
  })
})

describe('toLearnerExercise', () => {
  it('shows given and own inputs, and hints only as they are earned', () => {
    const learner = toLearnerExercise(ranged, 1, 0, false)
    expect(learnerExerciseSchema.safeParse(learner).success).toBe(true)
    expect(learner).toMatchObject({ kind: 'calculator', asked: 'diagonal', hints: [] })
    const hints = [0, 1, 2, 5]
      .map((tries) => toLearnerExercise(ranged, 1, tries, false))
      .map((one) => (one.kind === 'calculator' ? one.hints.length : -1))
    expect(hints).toEqual([0, 1, 2, 2])
  })

  it('marks the learner’s own inputs', () => {
    const own = buildCalculatorExercise({
      inputs: {
        sideA: { mode: 'own', value: '2600 mm' },
        sideB: { mode: 'fixed', value: '1100 mm' },
      },
    })
    expect(toLearnerExercise(own, 1, 0, false)).toMatchObject({
      inputs: {
        sideA: { mode: 'own', value: '2600 mm' },
        sideB: { mode: 'given', value: '1100 mm' },
      },
    })
  })

  it('sends nothing of a quiz that tells the answer', () => {
    const quiz = buildQuiz(Object.values(questions))
    const learner = toLearnerExercise(quiz, 1, 3, false)
    expect(learnerExerciseSchema.safeParse(learner).success).toBe(true)
    expect(JSON.stringify(learner)).not.toMatch(/"right"|feedback|2\.5 L|tolerance|hollows/)
  })

  it('shuffles by the seed, never into the right order', () => {
    const orders = new Set<string>()
    fc.assert(
      fc.property(seeds, (seed) => {
        const learner = toLearnerExercise(buildQuiz([questions.order]), seed, 0, false)
        if (learner.kind !== 'quiz') throw new Error('not a quiz')
        const order = learner.questions[0]?.items?.map(({ id }) => id) ?? []
        expect([...order].sort()).toEqual(['float', 'strike', 'tip', 'wet'])
        expect(order).not.toEqual(['wet', 'tip', 'strike', 'float'])
        expect(toLearnerExercise(buildQuiz([questions.order]), seed, 0, false)).toEqual(learner)
        orders.add(order.join())
      }),
    )
    expect(orders.size).toBeGreaterThan(10)
  })

  it('has the first choice right for few learners only', () => {
    const firsts = Array.from({ length: 300 }, (_, seed) => {
      const learner = toLearnerExercise(buildQuiz([questions.single]), seed, 0, false)
      return learner.kind === 'quiz' ? learner.questions[0]?.choices?.[0]?.id : undefined
    })
    const share = firsts.filter((id) => id === 'a').length / firsts.length
    expect(share).toBeGreaterThan(0.2)
    expect(share).toBeLessThan(0.5)
  })
})

describe('findExerciseProblems', () => {
  const blocking = (exercise: Parameters<typeof findExerciseProblems>[0]) =>
    findExerciseProblems(exercise).filter((problem) => problem.blocking)
  const inputs = buildCalculatorExercise().definition.inputs

  it('finds nothing wrong with sound exercises', () => {
    expect(findExerciseProblems(buildCalculatorExercise())).toEqual([])
    expect(findExerciseProblems(ranged)).toEqual([])
    expect(blocking(buildQuiz(Object.values(questions)))).toEqual([])
  })

  it.each([
    ['an unknown calculator', { calculator: 'moon' }, 'definition.calculator'],
    ['an unknown answer', { asked: 'moon' }, 'definition.asked'],
    ['an unknown slip', { slips: ['moon'] }, 'definition.slips.0'],
    ['a unit of something else', { acceptedUnits: ['mm', 'kg'] }, 'definition.acceptedUnits'],
    [
      'an unknown input',
      { inputs: { ...inputs, moon: { mode: 'fixed', value: '1' } } },
      'definition.inputs.moon',
    ],
    [
      'an input that cannot be read',
      { inputs: { ...inputs, sideA: { mode: 'fixed', value: 'wide' } } },
      'definition.inputs.sideA',
    ],
    [
      'an input out of bounds',
      { inputs: { ...inputs, sideA: { mode: 'fixed', value: '400 m' } } },
      'definition.inputs.sideA',
    ],
    [
      'an empty input',
      { inputs: { ...inputs, sideA: { mode: 'own', value: '' } } },
      'definition.inputs.sideA',
    ],
    [
      'a unit that does not fit',
      { inputs: { ...inputs, unit: { mode: 'fixed', value: '400 mm' } } },
      'definition.inputs.unit',
    ],
    [
      'a range out of bounds',
      { inputs: { ...inputs, sideA: { mode: 'ranged', min: 0.1, max: 3, step: 0.1 } } },
      'definition.inputs.sideA',
    ],
    [
      'a range turned round',
      { inputs: { ...inputs, sideA: { mode: 'ranged', min: 3, max: 2, step: 0.1 } } },
      'definition.inputs.sideA',
    ],
    [
      'a range whose far end cannot be computed',
      { inputs: { ...inputs, sideB: { mode: 'ranged', min: 0.89, max: 1.5, step: 0.0001 } } },
      'definition.inputs.unit',
    ],
    [
      'a tolerance that takes anything',
      { tolerance: { kind: 'percent', value: 100 } },
      'definition.tolerance',
    ],
  ] as const)('blocks %s', (_case, changes, path) => {
    const problems = blocking(buildCalculatorExercise(structuredClone(changes) as never))
    expect(problems.map((problem) => problem.path)).toContain(path)
    expect(problems[0]?.message).toMatch(/\.$/)
  })

  it('blocks an answer that these inputs never give', () => {
    const noCone = buildCalculatorExercise({
      calculator: 'mix',
      asked: 'slumpClass',
      slips: [],
      inputs: { waterAdded: { mode: 'fixed', value: '2.8 L' } },
    })
    expect(blocking(noCone).map(({ path }) => path)).toEqual(['definition.asked'])
  })

  it('blocks a choice that the calculator does not know', () => {
    const odd = buildCalculatorExercise({
      calculator: 'mix',
      asked: 'verdict',
      slips: [],
      inputs: {
        bag: { mode: 'fixed', value: '35 kg' },
        waterAdded: { mode: 'fixed', value: '2.8 L' },
      },
    })
    expect(blocking(odd).map(({ path }) => path)).toEqual(['definition.inputs.bag'])
  })

  it('blocks an empty prompt, of an exercise and of a question', () => {
    expect(blocking({ ...buildCalculatorExercise(), prompt: ' ' }).map(({ path }) => path)).toEqual(
      ['prompt'],
    )
    expect(
      blocking(buildQuiz([{ ...questions.single, prompt: '' }])).map(({ path }) => path),
    ).toEqual(['questions.0.prompt'])
  })

  it('only mentions what is worth mending', () => {
    const bare = buildCalculatorExercise({
      inputs: { ...inputs, unit: { mode: 'fixed', value: '300' } },
      slips: ['legs-swapped-long'],
    })
    const problems = findExerciseProblems(bare)
    expect(problems.map(({ path, blocking: stops }) => [path, stops])).toEqual([
      ['definition.slips.0', false],
      ['definition.inputs.unit', false],
    ])
    expect(gradeTyped(bare, '1500').right).toBe(true)
  })

  const posts = {
    run: { mode: 'fixed' as const, value: '1100 mm' },
    fall: { mode: 'fixed' as const, value: '10 mm/m' },
    positions: { mode: 'fixed' as const, value: '50 mm; 550 mm; 1050 mm' },
    topHeight: { mode: 'fixed' as const, value: '1480 mm' },
  }
  const ofPosts = (changes: object) =>
    buildCalculatorExercise({
      ...{ calculator: 'posts-on-fall', asked: 'longest', inputs: posts, slips: [] },
      ...changes,
    })

  it('takes a row of numbers as it is typed, and says so where it cannot be read', () => {
    expect(blocking(ofPosts({}))).toEqual([])
    const wrong = { ...posts, positions: { mode: 'fixed', value: '50 mm; wide' } }
    expect(blocking(ofPosts({ inputs: wrong })).map(({ path }) => path)).toEqual([
      'definition.inputs.positions',
    ])
    const ranged = { ...posts, positions: { mode: 'ranged', min: 0.1, max: 0.2, step: 0.1 } }
    expect(blocking(ofPosts({ inputs: ranged }))[0]?.message).toContain('has no range')
  })

  it('shows a row of numbers in the units of who reads it, and grades by it', () => {
    const { definition } = ofPosts({})
    const calculator = findCalculator('posts-on-fall')
    if (!calculator) throw new Error('the calculator is not there')
    expect(drawInputs(definition, calculator, 1, 'imperial')['positions']).toBe(
      `1-15/16"; 1' 9-5/8"; 3' 5-5/16"`,
    )
    expect(gradeTyped(ofPosts({}), '1490.5').right).toBe(true)
    expect(gradeTyped(ofPosts({}), `4' 10-11/16"`, 'imperial').right).toBe(true)
  })

  it('never lets a row of numbers be asked for', () => {
    expect(blocking(ofPosts({ asked: 'lengths' }))[0]?.message).toContain('cannot be asked for')
  })

  it('warns of a whole number that a hair decides', () => {
    const bags = buildCalculatorExercise({
      calculator: 'slab',
      asked: 'bags',
      inputs: {
        length: { mode: 'ranged', min: 5, max: 5.2, step: 0.2 },
        width: { mode: 'fixed', value: '2 m' },
        thickness: { mode: 'fixed', value: '100 mm' },
        waste: { mode: 'fixed', value: '0 %' },
        bag: { mode: 'fixed', value: '25 kg' },
        bagYield: { mode: 'fixed', value: '20 L' },
      },
      tolerance: { kind: 'absolute', value: 0 },
      slips: ['bags-rounded-down'],
    })
    const found = findExerciseProblems(bags).find(({ message }) => message.includes('on an edge'))
    expect(found).toMatchObject({ path: 'definition.asked', blocking: false })
    expect(found?.message.replaceAll(/\s/g, ' ')).toContain('as with length 5000 mm')
  })

  it('blocks a quiz without questions, and two with one key', () => {
    expect(blocking(buildQuiz([])).map(({ path }) => path)).toEqual(['questions'])
    expect(
      blocking(buildQuiz([questions.single, questions.single])).map(({ path }) => path),
    ).toEqual(['questions'])
  })
})
