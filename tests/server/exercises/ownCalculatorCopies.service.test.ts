import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { ownCalculators } from '../../../server/db/schema'
import { copyableOwnCalculatorSchema } from '../../../shared/contracts/ownCalculators'
import { pageOf } from '../../../shared/contracts/pagination'
import { barrowsWith, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { startTestApp, type Agent, type TestApp } from '../../support/app'
import { addHelper, createCourse } from '../../support/factories'
import { create, createBench, createOwnCalculator, pathOf, read, save } from './ownCalculatorScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('copying from another course', () => {
  const copy = (agent: Agent, courseId: number, body: object, key = randomUUID()) =>
    agent
      .post(`/api/bench/courses/${courseId}/own-calculator-copies`)
      .set('Idempotency-Key', key)
      .send(body)

  it('offers those of courses on whose staff one is, and copies the kept version', async () => {
    const { owner, agent, course } = await createBench(app)
    const other = await createCourse({ owner })
    const helped = await createCourse()
    await addHelper(helped.id, owner.id)
    const strange = await createOwnCalculator((await createCourse()).id)
    const mine = await createOwnCalculator(other.id)
    const theirs = await createOwnCalculator(helped.id, barrowsWith({ title: 'Theirs' }))
    await createOwnCalculator(course.id)
    const { body } = await agent
      .get(`/api/bench/courses/${course.id}/copyable-own-calculators`)
      .expect(200)
    const offered = pageOf(copyableOwnCalculatorSchema).parse(body).items
    expect(offered.map(({ key, course: from }) => [key, from.id])).toEqual([
      [theirs.key, helped.id],
      [mine.key, other.id],
    ])

    await save(
      agent,
      `${pathOf(other.id)}/${mine.key}`,
      1,
      barrowsWith({ title: 'A draft' }),
    ).expect(200)
    const key = randomUUID()
    const wanted = { fromCourseId: other.id, key: mine.key }
    const made = read((await copy(agent, course.id, wanted, key).expect(201)).body)
    expect(made).toMatchObject({
      title: 'Barrows of stone',
      attachable: { version: 1 },
      hasUnkept: false,
    })
    expect(made.key).not.toBe(mine.key)
    const again = read((await copy(agent, course.id, wanted, key).expect(201)).body)
    expect(again.key).toBe(made.key)
    expect(await db.$count(ownCalculators, eq(ownCalculators.courseId, course.id))).toBe(2)

    await copy(agent, course.id, { fromCourseId: 999_999, key: mine.key }).expect(404)
    await copy(agent, course.id, { fromCourseId: other.id, key: 'not-there' }).expect(404)
    const [row] = await db.select().from(ownCalculators).where(eq(ownCalculators.key, strange.key))
    await copy(agent, course.id, { fromCourseId: row!.courseId, key: strange.key }).expect(404)
    await copy(agent, course.id, { fromCourseId: 'one' }).expect(400)
    await copy(agent, helped.id, wanted).expect(403)
    await copy(app.asVisitor(), course.id, wanted).expect(401)
  })

  it('copies a draft that was never kept as a draft', async () => {
    const { owner, agent, course } = await createBench(app)
    const other = await createCourse({ owner })
    const draft = barrowsWithFormula('loose', 'trench *')
    const made = read((await create(agent, pathOf(other.id), draft).expect(201)).body)
    const wanted = { fromCourseId: other.id, key: made.key }
    const copied = read((await copy(agent, course.id, wanted).expect(201)).body)
    expect(copied).toMatchObject({ attachable: null, definition: draft })
  })
})
