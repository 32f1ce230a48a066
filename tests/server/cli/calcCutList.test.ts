import { describe, expect, it } from 'vitest'
import { runCalc, runCalcCutList } from '../../../server/cli/calc'

const cut = async (request: object) => {
  const { text, exitCode } = await runCalcCutList(JSON.stringify(request))
  return { exitCode, body: JSON.parse(text) as Record<string, never> }
}

describe('calc cutlist', () => {
  it('says which bars to buy and what to cut from each', async () => {
    const { exitCode, body } = await cut({
      parts: [
        { label: 'rail', length: '1.2 m', count: 2, section: '38×89' },
        { label: 'post', length: 0.9, count: 1, section: '38×89' },
      ],
      stock: [{ length: '3600 mm', section: '38×89', price: '12.50' }],
      kerf: '3 mm',
    })
    expect(exitCode).toBe(0)
    expect(body).toMatchObject({
      id: 'cutlist',
      outputs: {
        bars: {
          value: [
            {
              stock: { length: 3.6, section: '38×89', price: 1250 },
              cuts: [
                { label: 'rail', length: 1.2 },
                { label: 'rail', length: 1.2 },
                { label: 'post', length: 0.9 },
              ],
              // 3600 − 1200 − 1200 − 900 and three cuts of 3.
              offcut: 0.291,
            },
          ],
          unit: 'm',
        },
        count: { value: 1, shown: { metric: '1' } },
        waste: { value: 0.3, unit: 'm', shown: { imperial: '11-13/16"' } },
        cost: { value: 1250, shown: { metric: '12.50' } },
        optimal: { value: 'optimal', shown: { metric: 'proved' } },
      },
    })
    expect(body).toHaveProperty('steps.1.output', 'count')
    expect(body).toHaveProperty('cautions.0.title', 'At the saw')
  })

  it('takes the least bought length where nothing has a price, and says no cost', async () => {
    const parts = [{ length: '1000 mm', count: 3 }]
    const stock = [{ length: '2400 mm' }, { length: '3600 mm' }]
    const { body } = await cut({ parts, stock })
    expect(body).toMatchObject({ outputs: { count: { value: 1 } } })
    expect(body).not.toHaveProperty('outputs.cost')
  })

  it.each([
    [{ parts: [], stock: [] }, 'parts'],
    [{ parts: [{ length: 'long', count: 1 }], stock: [{ length: 2 }] }, 'parts.0.length'],
    [{ parts: [{ length: 3, count: 1 }], stock: [{ length: 2 }] }, 'parts'],
    [{ parts: [{ length: 1, count: 1, colour: 'red' }], stock: [] }, 'parts.0'],
    [{ parts: [{ length: 1, count: 1 }], stock: [{ length: 2 }], kerf: '9 kg' }, 'kerf'],
  ])('refuses %j, naming %s', async (request, input) => {
    const { exitCode, body } = await cut(request)
    expect(exitCode).toBe(1)
    expect(body).toMatchObject({ error: { input } })
    expect(String(body['error']?.['message'])).not.toBe('')
  })

  it('refuses what is no JSON', async () => {
    const { text, exitCode } = await runCalcCutList('parts: 3')
    expect(exitCode).toBe(1)
    expect(JSON.parse(text)).toMatchObject({ error: { input: 'inputs' } })
  })

  it('stands in the list', () => {
    const { text } = runCalc(['list'], () => '')
    expect((JSON.parse(text) as { id: string }[]).map(({ id }) => id)).toContain('cutlist')
  })
})
