import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import {
  attempts,
  exercises,
  ownCalculators,
  ownCalculatorVersions,
} from '../../../server/db/schema'
import { benchStopSchema } from '../../../shared/contracts/benchCourses'
import { gradedAttemptSchema } from '../../../shared/contracts/exercises'
import { ownCalculatorRowSchema } from '../../../shared/contracts/ownCalculators'
import { pageOf } from '../../../shared/contracts/pagination'
import { barrows, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { startTestApp, type TestApp } from '../../support/app'
import {
  createCourse,
  createLesson,
  createStage,
  createStop,
  createUser,
  enrol,
  issueRevision,
} from '../../support/factories'
import { fieldsOf } from '../../support/problems'
import { createBench, createOwnCalculator, ownDefinition, read, save } from './ownCalculatorScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('an own calculator at a stop', () => {
  async function setUpStop() {
    const scene = await createBench(app)
    const lesson = await createLesson(await createStage(scene.course.revisionId))
    const stop = await createStop(lesson.id, { atMs: 1000 })
    const own = await createOwnCalculator(scene.course.id)
    const exercise = (definition: object) => ({
      kind: 'calculator',
      prompt: 'How much loose stone?',
      tries: 3,
      definition,
    })
    const attach = (definition: object, version = 1) =>
      scene.agent
        .patch(`/api/bench/stops/${stop.id}`)
        .send({ version, exercise: exercise(definition) })
    return { ...scene, lesson, stop, own, attach }
  }

  it('is attached as the course has kept it, whatever was sent', async () => {
    const { own, stop, attach, agent, path } = await setUpStop()
    const forged = { ...own, definition: barrowsWithFormula('loose', 'trench * 99') }
    const saved = benchStopSchema.parse((await attach(ownDefinition(forged)).expect(200)).body)
    expect(saved.exercise).toMatchObject({ definition: { own } })
    const [row] = await db.select().from(exercises).where(eq(exercises.stopId, stop.id))
    expect(row?.definition?.own).toEqual(own)
    const [listed] = pageOf(ownCalculatorRowSchema).parse((await agent.get(path)).body).items
    expect(listed?.stops).toBe(1)
  })

  it('is refused when the course has no such version, or another name is given for it', async () => {
    const { own, attach } = await setUpStop()
    const elsewhere = await createOwnCalculator((await createCourse()).id)
    for (const definition of [
      ownDefinition({ ...own, version: 2 }),
      ownDefinition(elsewhere),
      { ...ownDefinition(own), calculator: 'slab' },
      { ...ownDefinition(own), calculator: 'own:other' },
    ]) {
      const { body } = await attach(definition).expect(400)
      expect(fieldsOf(body)).toEqual(['exercise.definition.calculator'])
    }
  })

  it('stays as long as a stop is made of it', async () => {
    const { own, attach, stop, agent, path } = await setUpStop()
    const [calculator] = await db
      .select()
      .from(ownCalculators)
      .where(eq(ownCalculators.key, own.key))
    await attach(ownDefinition(own)).expect(200)
    const { body } = await agent.delete(`${path}/${own.key}`).expect(409)
    expect(body).toMatchObject({ code: 'attached' })
    await agent
      .patch(`/api/bench/stops/${stop.id}`)
      .send({ version: 2, exercise: null })
      .expect(200)
    await agent.delete(`${path}/${own.key}`).expect(204)
    await agent.get(`${path}/${own.key}`).expect(404)
    await agent.delete(`${path}/${own.key}`).expect(404)
    const left = eq(ownCalculatorVersions.calculatorId, calculator!.id)
    expect(await db.$count(ownCalculatorVersions, left)).toBe(0)
  })

  it('is graded as it was when it was attached, after it was changed and kept anew', async () => {
    const { own, attach, agent, path, course, lesson, stop } = await setUpStop()
    await attach(ownDefinition(own)).expect(200)
    await issueRevision(course.revisionId)
    const examples = barrows().examples.map((example, index) => ({
      ...example,
      expected:
        index === 0
          ? { ...example.expected, loose: '1.44 m³', barrows: '24', weight: '2304 kg' }
          : { barrows: '6' },
    }))
    const changed = { ...barrowsWithFormula('loose', 'trench * 2 * (1 + 0 * extra)'), examples }
    const kept = read((await save(agent, `${path}/${own.key}`, 1, changed, true).expect(200)).body)
    expect(kept.attachable?.version).toBe(2)

    const learner = await createUser()
    await enrol(learner.id, course)
    const learning = await app.asUser(learner)
    const stopPath = `/api/courses/${course.slug}/lessons/${lesson.key}/stops/${stop.key}`
    const { body: state } = await learning.get(stopPath).expect(200)
    expect(state.exercise.own).toMatchObject({ key: own.key, version: 1 })
    expect(JSON.stringify(state)).not.toMatch(/examples|no-extra|1440/)
    const hand = async (text: string) =>
      gradedAttemptSchema.parse(
        (
          await learning
            .post(`${stopPath}/attempts`)
            .set('Idempotency-Key', randomUUID())
            .send({ kind: 'calculator', inputs: {}, answer: text, units: 'metric' })
            .expect(201)
        ).body,
      )
    expect((await hand('1.44 m³')).verdict.outcome).toBe('wrong')
    expect((await hand('0.72 m³')).verdict).toMatchObject({
      outcome: 'slip',
      slip: { id: 'no-extra' },
    })
    const right = await hand('0.9 m³')
    expect(right.verdict.outcome).toBe('right')
    expect(right.state.shownAnswer?.metric).toBe('0.9\u00a0m³')
    const rows = await db.select().from(attempts).where(eq(attempts.userId, learner.id))
    expect(rows.map(({ outcome }) => outcome)).toEqual(['wrong', 'slip', 'right'])

    const entry = {
      lessonKey: lesson.key,
      stopKey: stop.key,
      atMs: 1000,
      calculator: `own:${own.key}`,
      inputs: barrows().examples[0]!.inputs,
      units: 'metric',
    }
    const put = (body: object) =>
      learning
        .post(`/api/courses/${course.slug}/field-book-entries`)
        .set('Idempotency-Key', randomUUID())
        .send(body)
    const { body: written } = await put(entry).expect(201)
    expect(written).toMatchObject({ calculatorVersion: 1, outputs: { barrows: 15 } })
    expect(fieldsOf((await put({ ...entry, stopKey: null }).expect(400)).body)).toEqual([
      'calculator',
    ])
    const tooLong = { ...entry, inputs: { ...entry.inputs, length: '900 m' } }
    expect(fieldsOf((await put(tooLong).expect(400)).body)).toEqual(['inputs.length'])
    const { body: build } = await learning.get(`/api/courses/${course.slug}/build`).expect(200)
    expect(build.lately[0].text).toBe('“Barrows of stone” put in the field book')
  })

  it('keeps a course from being issued while what is attached has a problem', async () => {
    const { agent, course, lesson, attach } = await setUpStop()
    const broken = await createOwnCalculator(
      course.id,
      barrowsWithFormula('loose', 'trench * extr'),
    )
    await attach(ownDefinition(broken)).expect(200)
    const { body } = await agent.get(`/api/bench/lessons/${lesson.id}`).expect(200)
    expect(body.snags).toContainEqual(
      expect.objectContaining({
        weight: 'must',
        code: 'exercise',
        message: expect.stringContaining('Barrows of stone: Nothing is called extr.') as string,
      }),
    )
    const refused = await agent
      .post(`/api/bench/courses/${course.id}/issue`)
      .send({ changeNote: '' })
      .expect(409)
    expect(refused.body.code).toBe('snags')
  })
})
