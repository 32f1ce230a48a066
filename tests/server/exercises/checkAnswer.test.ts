import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { checkAnswer } from '../../../server/exercises/checkAnswer'
import type { Answer, Exercise } from '../../../shared/contracts/exercises'
import { startTestApp, type TestApp } from '../../support/app'
import {
  createIssuedCourse,
  createQuiz,
  createStop,
  singleQuestion,
  slabDefinition,
} from '../../support/factories'
import { fieldsOf } from '../../support/problems'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

const shared = { prompt: '', tries: 3 }
const slab: Exercise = { ...shared, kind: 'calculator', definition: slabDefinition }
const quiz: Exercise = { ...shared, kind: 'quiz', passMark: 100, questions: [singleQuestion()] }
const typed = (inputs: Record<string, string>): Answer => ({
  kind: 'calculator',
  inputs,
  answer: '1',
  units: 'metric',
})

describe('an answer', () => {
  it('may name what the stop asks, and nothing else', () => {
    expect(() => checkAnswer(slab, typed({ length: '2 m' }))).not.toThrow()
    expect(() => checkAnswer(slab, typed({ constructor: '2 m' }))).toThrow()
    const chosen: Answer = { kind: 'quiz', answers: { 'which-mix': { choice: 'wet' } } }
    expect(() => checkAnswer(quiz, chosen)).not.toThrow()
    expect(() => checkAnswer(slab, chosen)).toThrow()
  })

  it('5.2.1 of thousands of made-up questions is refused and named in short', async () => {
    const course = await createIssuedCourse({
      isSample: true,
      furnish: async ({ id }) => {
        const stop = await createStop(id, { key: 'which-mix' })
        await createQuiz(stop.id, { questions: [singleQuestion()] })
      },
    })
    const path = `/api/courses/${course.slug}/lessons/${course.lesson.key}/stops/which-mix/attempts`
    const made = Array.from({ length: 5000 }, (_, n) => [`q${n}`, { choice: 'wet' }] as const)
    const many = { kind: 'quiz', answers: Object.fromEntries(made) }
    const { body } = await app.asVisitor().post(path).send(many).expect(400)
    expect(fieldsOf(body)).toEqual(['answers.q0', 'answers.q1'])

    const right = { kind: 'quiz', answers: { 'which-mix': { choice: 'wet' } } }
    const endless = app.asVisitor().post(path).set('Idempotency-Key', 'x'.repeat(8000))
    expect(fieldsOf((await endless.send(right).expect(400)).body)).toEqual(['Idempotency-Key'])
    await app.asVisitor().post(path).send(right).expect(201)
  })
})
