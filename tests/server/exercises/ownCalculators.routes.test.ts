import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { db } from '../../../server/db/client'
import { ownCalculators } from '../../../server/db/schema'
import {
  ownCalculatorRowSchema,
  ownCalculatorVersionSchema,
} from '../../../shared/contracts/ownCalculators'
import { pageOf } from '../../../shared/contracts/pagination'
import { barrows, barrowsWith, barrowsWithFormula } from '../../shared/ownCalculators/definitions'
import { startTestApp, type TestApp } from '../../support/app'
import { addHelper, createInstructor, createUser } from '../../support/factories'
import { fieldsOf } from '../../support/problems'
import { create, createBench, createOwnCalculator, pathOf, read, save } from './ownCalculatorScene'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.close())

describe('POST and GET bench/courses/:courseId/own-calculators', () => {
  it('begins a draft under a readable key, checked and not yet to be attached', async () => {
    const { agent, course, path } = await createBench(app)
    const definition = barrowsWithFormula('barrows', 'ceil(loose / barow)')
    const made = read((await create(agent, path, definition).expect(201)).body)
    expect(made).toMatchObject({
      title: 'Barrows of stone',
      version: 1,
      attachable: null,
      hasUnkept: true,
      stops: 0,
      definition,
      check: { problems: [{ path: 'outputs.2.expression', output: 'barrows', column: 14 }] },
      can: { edit: true, remove: true },
      course: { id: course.id, title: 'A bench by the pond' },
    })
    expect(made.key).toMatch(/^barrows-of-stone-[a-z0-9]{5}$/)
    const again = read((await agent.get(`${path}/${made.key}`).expect(200)).body)
    expect(again).toEqual(made)
  })

  it('begins one only for the same key', async () => {
    const { agent, course, path } = await createBench(app)
    const key = randomUUID()
    const first = read((await create(agent, path, barrows(), key).expect(201)).body)
    const second = read((await create(agent, path, barrows(), key).expect(201)).body)
    expect(second.key).toBe(first.key)
    expect(await db.$count(ownCalculators, eq(ownCalculators.courseId, course.id))).toBe(1)
    await create(agent, path, barrowsWith({ title: 'Another' }), key).expect(422)
  })

  it('keeps the keys of long and odd titles where ids of calculators are kept', async () => {
    const { agent, path } = await createBench(app)
    for (const title of ['Ein sehr langer Titel mit Ümläuten und noch viel mehr', '石', '']) {
      const made = read((await create(agent, path, barrowsWith({ title })).expect(201)).body)
      expect(`own:${made.key}`.length).toBeLessThanOrEqual(40)
      await agent.get(`${path}/${made.key}`).expect(200)
    }
  })

  it('lists them by the page, the newest first', async () => {
    const { agent, course, path } = await createBench(app)
    const keys = []
    for (let number = 0; number < 3; number++) keys.push((await createOwnCalculator(course.id)).key)
    const pageSchema = pageOf(ownCalculatorRowSchema)
    const first = pageSchema.parse((await agent.get(`${path}?limit=2`).expect(200)).body)
    const second = pageSchema.parse(
      (await agent.get(`${path}?limit=2&cursor=${first.nextCursor}`).expect(200)).body,
    )
    expect([...first.items, ...second.items].map(({ key }) => key)).toEqual(keys.reverse())
    expect(first.items[0]).toMatchObject({ attachable: 1, hasUnkept: false, stops: 0 })
    expect(second.nextCursor).toBeNull()
    await agent.get(`${path}?cursor=x`).expect(400)
  })

  it('refuses what is too large or not of its shape', async () => {
    const { agent, path } = await createBench(app)
    const { body } = await create(agent, path, {
      ...barrows(),
      outputs: [{ ...barrows().outputs[0]!, expression: 'x'.repeat(301) }],
      help: 'x'.repeat(321),
    }).expect(400)
    expect(fieldsOf(body)).toEqual(['definition.help', 'definition.outputs.0.expression'])
    await agent.post(path).send({ definition: barrows() }).expect(400)
    await agent.post(path).set('Idempotency-Key', randomUUID()).send({}).expect(400)
  })

  it('is for staff to see and for the owner to write', async () => {
    const { course, path } = await createBench(app)
    const helper = await createInstructor()
    await addHelper(course.id, helper.id)
    const helping = await app.asUser(helper)
    const { key } = await createOwnCalculator(course.id)
    await app.asVisitor().get(path).expect(401)
    await (await app.asUser(await createUser())).get(path).expect(403)
    const seen = read((await helping.get(`${path}/${key}`).expect(200)).body)
    expect(seen.can).toEqual({ edit: false, remove: false })
    await create(helping, path, barrows()).expect(403)
    await save(helping, `${path}/${key}`, 1, barrows()).expect(403)
    await helping.delete(`${path}/${key}`).expect(403)
    await helping.get(`${path}/not-there`).expect(404)
    await helping.get(pathOf(999_999)).expect(404)
  })
})

describe('PATCH bench/courses/:courseId/own-calculators/:ownKey', () => {
  it('saves a draft without touching what can be attached', async () => {
    const { agent, course, path } = await createBench(app)
    const { key } = await createOwnCalculator(course.id)
    const draft = barrowsWithFormula('weight', 'loose * 1500 kg/m^3')
    const saved = read((await save(agent, `${path}/${key}`, 1, draft).expect(200)).body)
    expect(saved).toMatchObject({ version: 2, hasUnkept: true, attachable: { version: 1 } })
    expect(saved.definition).toEqual(draft)
    expect(saved.attachable?.definition).toEqual(barrows())
    expect(saved.check.problems.map(({ path: at }) => at)).toEqual(['examples.0.expected.weight'])
  })

  it('keeps a version when it is asked and nothing is wrong, and none twice', async () => {
    const { agent, path } = await createBench(app)
    const made = read((await create(agent, path, barrows()).expect(201)).body)
    const one = `${path}/${made.key}`
    const first = read((await save(agent, one, 1, barrows(), true).expect(200)).body)
    expect(first).toMatchObject({ version: 2, hasUnkept: false, attachable: { version: 1 } })
    const same = read((await save(agent, one, 2, barrows(), true).expect(200)).body)
    expect(same.attachable?.version).toBe(1)
    const renamed = barrowsWith({ question: 'How many barrows?' })
    const second = read((await save(agent, one, 3, renamed, true).expect(200)).body)
    expect(second.attachable).toEqual({ key: made.key, version: 2, definition: renamed })
    const { body } = await agent.get(`${one}/versions`).expect(200)
    const versions = pageOf(ownCalculatorVersionSchema).parse(body).items
    expect(versions.map(({ version, definition }) => [version, definition.question])).toEqual([
      [2, 'How many barrows?'],
      [1, 'How many barrows fill the trench?'],
    ])
  })

  it('refuses to keep what has an error or an example that disagrees, and says which', async () => {
    const { agent, course, path } = await createBench(app)
    const { key } = await createOwnCalculator(course.id)
    const wrong = barrowsWithFormula('loose', 'trench + extra')
    const { body } = await save(agent, `${path}/${key}`, 1, wrong, true).expect(409)
    expect(body).toMatchObject({
      code: 'not-attachable',
      current: { problems: [{ path: 'outputs.1.expression', column: 8 }] },
    })
    const unchanged = read((await agent.get(`${path}/${key}`).expect(200)).body)
    expect(unchanged).toMatchObject({ version: 1, hasUnkept: false })
    const off = barrowsWithFormula('loose', 'trench * (1 + 2 * extra)')
    await save(agent, `${path}/${key}`, 1, off, true).expect(409)
    const few = barrowsWith({ examples: barrows().examples.slice(0, 1) })
    await save(agent, `${path}/${key}`, 1, few, true).expect(409)
  })

  it('gives the calculator as it is when someone else was first', async () => {
    const { agent, course, path } = await createBench(app)
    const { key } = await createOwnCalculator(course.id)
    const titles = ['First', 'Second']
    const answers = await Promise.all(
      titles.map((title) => save(agent, `${path}/${key}`, 1, barrowsWith({ title }))),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
    const refused = answers.find(({ status }) => status === 409)?.body
    expect(refused).toMatchObject({ code: 'stale', current: { version: 2 } })
    await save(agent, `${path}/not-there`, 1, barrows()).expect(404)
    await agent.patch(`${path}/${key}`).send({ version: 0 }).expect(400)
  })
})
