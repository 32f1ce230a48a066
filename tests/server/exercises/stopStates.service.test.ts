import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { stopStates } from '../../../server/db/schema'
import { stopStateSchema, type CalculatorDefinition } from '../../../shared/contracts/exercises'
import { startTestApp, type TestApp } from '../../support/app'
import { createUser, slabDefinition } from '../../support/factories'
import { createLearnerIn, createStopCourse } from './stopScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('GET …/stops/:stopKey', () => {
  it('draws a person’s numbers once, the same on every device, others for another person', async () => {
    const definition: CalculatorDefinition = {
      ...slabDefinition,
      inputs: {
        ...slabDefinition.inputs,
        length: { mode: 'ranged', min: 1, max: 9, step: 0.001 },
      },
    }
    const { course, path } = await createStopCourse({ definition })
    const { learner, agent } = await createLearnerIn(app, course)
    const other = await app.asUser(learner)
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, n) => (n % 2 ? agent : other).get(path).expect(200)),
    )
    const shown = answers.map(({ body }) => JSON.stringify(stopStateSchema.parse(body).exercise))
    expect(new Set(shown).size).toBe(1)
    const rows = await db.select().from(stopStates).where(eq(stopStates.userId, learner.id))
    expect(rows).toHaveLength(1)

    const lengths = new Set<string>()
    for (let n = 0; n < 4; n++) {
      const { agent: another } = await createLearnerIn(app, course)
      lengths.add((await another.get(path)).body.exercise.inputs.length.value)
    }
    expect(lengths.size).toBeGreaterThan(1)
  })

  it('begins with no try used, no hint and no answer', async () => {
    const { course, path, stopKey } = await createStopCourse()
    const { agent } = await createLearnerIn(app, course)
    const { body } = await agent.get(path).expect(200)
    expect(stopStateSchema.parse(body)).toMatchObject({
      stopKey,
      solved: false,
      triesUsed: 0,
      exercise: { calculator: 'slab', asked: 'volume', hints: [] },
      lastAnswer: null,
      lastVerdict: null,
      shownAnswer: null,
    })
  })

  it('says given numbers in the units that are asked for', async () => {
    const { course, path } = await createStopCourse()
    const { agent } = await createLearnerIn(app, course)
    const imperial = (await agent.get(`${path}?units=imperial`).expect(200)).body
    expect(imperial.exercise.inputs.thickness.value).toContain('"')
    const metric = (await agent.get(`${path}?units=metric`).expect(200)).body
    expect(metric.exercise.inputs.thickness.value).toBe('100 mm')
    await agent.get(`${path}?units=cubits`).expect(400)
  })

  it('refuses whoever is not enrolled and finds no stop that is not there', async () => {
    const { course, path } = await createStopCourse()
    await app.asVisitor().get(path).expect(401)
    await (await app.asUser(await createUser())).get(path).expect(403)
    const { agent } = await createLearnerIn(app, course)
    await agent.get(`${path}-gone`).expect(404)
  })
})
