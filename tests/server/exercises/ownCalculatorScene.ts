import { randomUUID } from 'node:crypto'
import { db } from '../../../server/db/client'
import { ownCalculators, ownCalculatorVersions } from '../../../server/db/schema'
import type { CalculatorDefinition, ExerciseInput } from '../../../shared/contracts/exercises'
import {
  ownCalculatorSchema,
  type OwnCalculatorDefinition,
  type OwnSnapshot,
} from '../../../shared/contracts/ownCalculators'
import { barrows } from '../../shared/ownCalculators/definitions'
import type { Agent, TestApp } from '../../support/app'
import { createCourse, createInstructor, nextNumber } from '../../support/factories'

/** An own calculator of a course, kept as version 1 and so ready to be attached. */
export async function createOwnCalculator(
  courseId: number,
  definition: OwnCalculatorDefinition = barrows(),
): Promise<OwnSnapshot> {
  const key = `barrows-${nextNumber()}`
  const [row] = await db
    .insert(ownCalculators)
    .values({ courseId, key, title: definition.title, definition, attachable: 1 })
    .$returningId()
  const calculatorId = row!.id
  await db.insert(ownCalculatorVersions).values({ calculatorId, number: 1, definition })
  return { key, version: 1, definition }
}

/** An exercise that asks for the loose stone of a trench of 12 × 0.4 × 0.15 m: 0.9 m³. */
export const ownDefinition = (
  own: OwnSnapshot,
  inputs: Record<string, ExerciseInput> = {},
): CalculatorDefinition => ({
  calculator: `own:${own.key}`,
  own,
  inputs: { length: { mode: 'fixed', value: '12 m' }, ...inputs },
  asked: 'loose',
  tolerance: { kind: 'percent', value: 1 },
  hints: [],
  slips: ['no-extra'],
})

export const pathOf = (courseId: number) => `/api/bench/courses/${courseId}/own-calculators`

/** A course and its owner on one device. */
export async function createBench(app: TestApp) {
  const owner = await createInstructor()
  const course = await createCourse({ owner })
  return { owner, course, agent: await app.asUser(owner), path: pathOf(course.id) }
}

/** Begins an own calculator over the API. */
export const create = (
  agent: Agent,
  path: string,
  definition: OwnCalculatorDefinition,
  key: string = randomUUID(),
) => agent.post(path).set('Idempotency-Key', key).send({ definition })

/** Saves its draft, and keeps it as a version when that is asked. */
export const save = (
  agent: Agent,
  path: string,
  version: number,
  definition: OwnCalculatorDefinition,
  keepsVersion = false,
) => agent.patch(path).send({ version, definition, keepsVersion })

/** What the API says of one calculator, by its contract. */
export const read = (body: unknown) => ownCalculatorSchema.parse(body)
