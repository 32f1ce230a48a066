import { randomUUID } from 'node:crypto'
import {
  catchUpSchema,
  lessonThreadsSchema,
  threadSchema,
  type Thread,
} from '../../../shared/contracts/fence'
import type { Agent, TestApp } from '../../support/app'
import { addHelper, createIssuedCourse, createUser, enrol } from '../../support/factories'

/** An issued course of one lesson with its owner, a helper and two learners, each on a device. */
export async function createScene(app: TestApp, options: { isSample?: boolean } = {}) {
  const course = await createIssuedCourse(options)
  const [helper, asker, neighbour, stranger] = await Promise.all([
    createUser({ displayName: 'Petra' }),
    createUser({ displayName: 'Jo Varga' }),
    createUser({ displayName: 'Anke' }),
    createUser({ displayName: 'Bram' }),
  ])
  await addHelper(course.id, helper.id)
  await enrol(asker.id, course)
  await enrol(neighbour.id, course)
  return {
    course,
    room: { courseSlug: course.slug, lessonKey: course.lesson.key },
    path: `/api/courses/${course.slug}/lessons/${course.lesson.key}`,
    people: { owner: { id: course.ownerId }, helper, asker, neighbour, stranger },
    owner: await app.asUser({ id: course.ownerId }),
    helper: await app.asUser(helper),
    asker: await app.asUser(asker),
    neighbour: await app.asUser(neighbour),
    stranger: await app.asUser(stranger),
    visitor: app.asVisitor(),
  }
}
export type Scene = Awaited<ReturnType<typeof createScene>>

interface Asked {
  title?: string
  markdown?: string
  atMs?: number | null
}

/** Asks a question and returns its thread, checked by the contract. */
export async function ask(agent: Agent, path: string, asked: Asked = {}): Promise<Thread> {
  const answer = await agent
    .post(`${path}/questions`)
    .set('Idempotency-Key', randomUUID())
    .send({ title: 'Inside or outside of the boards?', markdown: '', atMs: 392_000, ...asked })
    .expect(201)
  return threadSchema.parse(answer.body)
}

/** Answers a question and returns its thread, checked by the contract. */
export async function reply(
  agent: Agent,
  questionId: number,
  markdown = 'Inside faces.',
): Promise<Thread> {
  const answer = await agent
    .post(`/api/questions/${questionId}/answers`)
    .set('Idempotency-Key', randomUUID())
    .send({ markdown })
    .expect(201)
  return threadSchema.parse(answer.body)
}

/** A page of a lesson's threads, checked by the contract. */
export const readThreads = async (agent: Agent, path: string, query = '') =>
  lessonThreadsSchema.parse((await agent.get(`${path}/questions${query}`).expect(200)).body)
/** What followed a number, checked by the contract. */
export const readEvents = async (agent: Agent, path: string, after: number) =>
  catchUpSchema.parse((await agent.get(`${path}/events?after=${after}`).expect(200)).body)
/** One thread, checked by the contract. */
export const readThread = async (agent: Agent, id: number) =>
  threadSchema.parse((await agent.get(`/api/questions/${id}`).expect(200)).body)
