import { describe, expect, it } from 'vitest'
import { AppError } from '../../../server/errors'
import { findCutList } from '../../../server/builds/cutlist.service'
import type { CutRequest } from '../../../shared/cutlist/cutRequest'
import type { CutProgress } from '../../../shared/cutlist/solveCutList'

const section = '47 × 100'
const small: CutRequest = {
  parts: [
    { label: 'post', lengthMm: 1150, count: 4, section },
    { label: 'rail', lengthMm: 870, count: 6, section },
  ],
  stock: [{ lengthMm: 2400, section }],
  kerfMm: 3,
  endTrimMm: 0,
}
/** Prices so near to each other that the proof takes seconds. */
const hard: CutRequest = {
  parts: [
    [572, 2],
    [883, 2],
    [221, 8],
    [530, 8],
    [871, 2],
    [1181, 7],
    [2365, 5],
    [642, 3],
  ].map(([lengthMm = 0, count = 0]) => ({ label: `${lengthMm}`, lengthMm, count, section })),
  stock: [
    { lengthMm: 2400, section, price: 899 },
    { lengthMm: 3000, section, price: 1149 },
    { lengthMm: 3600, section, price: 1325 },
    { lengthMm: 4800, section, price: 1899 },
  ],
  kerfMm: 3.2,
  endTrimMm: 10,
}
const piecesOf = ({ parts }: CutRequest) => parts.reduce((sum, { count }) => sum + count, 0)

describe('findCutList', () => {
  it('finds the best list in a thread and tells how far it has come', async () => {
    const told: CutProgress[] = []
    const list = await findCutList(small, { onProgress: (progress) => told.push(progress) })
    expect(list).toMatchObject({ count: 5, proof: 'optimal', boughtMm: 12_000 })
    expect(list.bars.flatMap(({ cuts }) => cuts)).toHaveLength(10)
    expect(told.at(-1)).toEqual({ sectionsDone: 1, sections: 1, list })
    expect(told[0]).toMatchObject({ sectionsDone: 0, sections: 1 })
  })

  it('leaves the process free while it searches', async () => {
    let ticks = 0
    const ticking = setInterval(() => ticks++, 10)
    await findCutList(hard, { millisecondsLimit: 700 })
    clearInterval(ticking)
    expect(ticks).toBeGreaterThan(15)
  })

  it('ends at the time limit with the best so far and its gap', async () => {
    const started = Date.now()
    const list = await findCutList(hard, { millisecondsLimit: 1 })
    expect(list.proof).toEqual({ gapPercent: expect.any(Number) })
    expect(list.bars.flatMap(({ cuts }) => cuts)).toHaveLength(piecesOf(hard))
    expect(Date.now() - started).toBeLessThan(20_000)
  })

  it('ends with the best so far once it is cancelled', async () => {
    const controller = new AbortController()
    const list = await findCutList(hard, {
      signal: controller.signal,
      onProgress: () => controller.abort(),
    })
    expect(list.proof).toEqual({ gapPercent: expect.any(Number) })
    expect(list.bars.flatMap(({ cuts }) => cuts)).toHaveLength(piecesOf(hard))
  })

  it('makes a third list wait for one of two threads, and none for ever', async () => {
    const lists = await Promise.all([small, small, small, small].map((one) => findCutList(one)))
    expect(lists.map(({ count }) => count)).toEqual([5, 5, 5, 5])
  })

  it('refuses with the sentence and its field what cannot be cut, before and after the search', async () => {
    const tooLong = { ...small, stock: [{ lengthMm: 1000, section }] }
    const tooFew = {
      ...small,
      parts: [{ label: 'rail', lengthMm: 700, count: 3, section }],
      stock: [{ lengthMm: 1300, section, available: 2 }],
    }
    const refusals = [
      { request: tooLong, field: 'parts', sentence: /longer than every/ },
      { request: tooFew, field: 'stock', sentence: /not enough/ },
    ]
    for (const { request, field, sentence } of refusals) {
      const refused = await findCutList(request).catch((error: unknown) => error)
      expect(refused).toBeInstanceOf(AppError)
      expect(refused).toMatchObject({
        status: 400,
        errors: [{ field, message: expect.stringMatching(sentence) }],
      })
    }
  })
})
