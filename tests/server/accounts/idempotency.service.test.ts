import { describe, expect, it } from 'vitest'
import { answerOnce } from '../../../server/accounts/idempotency.service'
import { AppError } from '../../../server/errors'
import { createUser } from '../../support/factories'

const long = 'x'.repeat(120)

function countingWork() {
  let done = 0
  const work = async () => ({ status: 201, response: { number: ++done } })
  return { work }
}

describe('a write that is sent again', () => {
  it('2.3.3 is done once by fifty copies at once, which all hear the same', async () => {
    const { id: userId } = await createUser()
    const { work } = countingWork()
    const copy = { userId, route: 'POST things', key: 'fifty-copies', payload: { a: 1 } }
    const given = await Promise.all(Array.from({ length: 50 }, () => answerOnce(copy, work)))
    expect(given.filter(({ isFirst }) => isFirst)).toHaveLength(1)
    expect(new Set(given.map(({ response }) => JSON.stringify(response))).size).toBe(1)
  })

  it('is known however long its route is, and told apart from its neighbour', async () => {
    const { id: userId } = await createUser()
    const { work } = countingWork()
    const write = (route: string) =>
      answerOnce({ userId, route, key: 'long-route', payload: {} }, work)
    const first = await write(`POST ${long}/one`)
    expect(await write(`POST ${long}/one`)).toEqual({ ...first, isFirst: false })
    expect((await write(`POST ${long}/two`)).isFirst).toBe(true)
  })

  it('8.2.2 is nobody else’s: the same key of another person is another write', async () => {
    const [one, two] = [await createUser(), await createUser()]
    const { work } = countingWork()
    const write = (userId: number) =>
      answerOnce({ userId, route: 'POST things', key: 'same-key-of-two', payload: {} }, work)
    expect((await write(one.id)).isFirst).toBe(true)
    expect((await write(two.id)).isFirst).toBe(true)
  })

  it('is refused when its key was used for something else, and when it has none', async () => {
    const { id: userId } = await createUser()
    const { work } = countingWork()
    const write = (key: string | undefined, payload: unknown) =>
      answerOnce({ userId, route: 'POST things', key, payload }, work).catch((error: unknown) =>
        error instanceof AppError ? error.status : 0,
      )
    await write('one-for-all', 1)
    expect(await write('one-for-all', 2)).toBe(422)
    for (const key of [undefined, '', 'short', 'with space in it', 'x'.repeat(65), 'añadido-ñ']) {
      expect(await write(key, 1)).toBe(400)
    }
  })

  it('leaves nothing behind when the work fails', async () => {
    const { id: userId } = await createUser()
    const copy = { userId, route: 'POST things', key: 'fails-at-first', payload: {} }
    await expect(
      answerOnce(copy, () => Promise.reject(new Error('in the middle'))),
    ).rejects.toThrow('in the middle')
    expect((await answerOnce(copy, countingWork().work)).isFirst).toBe(true)
  })
})
