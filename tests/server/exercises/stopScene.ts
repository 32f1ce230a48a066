import { randomUUID } from 'node:crypto'
import type { Answer, CalculatorDefinition } from '../../../shared/contracts/exercises'
import type { Agent, TestApp } from '../../support/app'
import {
  createCalculatorExercise,
  createIssuedCourse,
  createQuiz,
  createStop,
  createUser,
  enrol,
  singleQuestion,
  slabDefinition,
} from '../../support/factories'

/** Of the slab exercise: 2.6 × 1.1 × 0.1 m, computed by hand. */
export const rightNumber = '0.286'
/** An answer to the slab exercise. */
export const volume = (answer: string): Answer => ({
  kind: 'calculator',
  inputs: {},
  answer,
  units: 'metric',
})
/** An answer to the quiz. */
export const choice = (id: string): Answer => ({
  kind: 'quiz',
  answers: { 'which-mix': { choice: id } },
})

interface Options {
  tries?: number | null
  isSample?: boolean
  definition?: CalculatorDefinition
  quiz?: boolean
}
/** An issued course of one lesson with one stop, by default the slab exercise. */
export async function createStopCourse({ tries = 3, isSample, definition, quiz }: Options = {}) {
  let exerciseId = 0
  let stopKey = ''
  const course = await createIssuedCourse({
    isSample: isSample ?? false,
    furnish: async (lesson) => {
      const stop = await createStop(lesson.id, { atMs: 5000 })
      stopKey = stop.key
      const made = quiz
        ? await createQuiz(stop.id, { questions: [singleQuestion()], tries })
        : await createCalculatorExercise(stop.id, {
            definition: definition ?? slabDefinition,
            tries,
          })
      exerciseId = made.id
    },
  })
  const lessonPath = `/api/courses/${course.slug}/lessons/${course.lesson.key}`
  return { course, exerciseId, stopKey, lessonPath, path: `${lessonPath}/stops/${stopKey}` }
}

/** Somebody enrolled, on one device. */
export async function createLearnerIn(app: TestApp, course: { id: number; revisionId: number }) {
  const learner = await createUser()
  await enrol(learner.id, course)
  return { learner, agent: await app.asUser(learner) }
}

/** Hands an answer in. */
export const answer = (agent: Agent, path: string, given: Answer, key: string = randomUUID()) =>
  agent.post(`${path}/attempts`).set('Idempotency-Key', key).send(given)
