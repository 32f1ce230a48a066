import { describe, expect, it } from 'vitest'
import { rafter } from '../../../../shared/calculators/rafter'
import { computeValues } from '../../../../shared/calculators/runCalculator'
import { drawRafterSheet } from '../../../../src/components/drawings/rafterSheet'
import { expectLabelsApart } from './anyNumbers'

function sheetFor(changed: Record<string, number> = {}, asked?: string) {
  const usual = { run: 1.5, pitch: 4, overhang: 0.2, ridge: 0, depth: 0.14, seat: 0.075 }
  const values = { ...usual, ...changed }
  const run = computeValues(rafter, values, 'metric')
  if (!run.ok) throw new Error('the rafter is refused')
  return drawRafterSheet({ size: 'wide', system: 'metric', values, outputs: run.outputs, asked })
}

describe('the drawing of a rafter', () => {
  it('keeps its labels apart for rafters of every size and pitch', () => {
    expect(expectLabelsApart('rafter', drawRafterSheet, 1500)).toBeGreaterThan(500)
  })

  it('says its lengths, cuts and notch', () => {
    expect(sheetFor()?.words.replaceAll('\u00a0', ' ')).toBe(
      'A rafter from the side, run 1500 millimetres, overhang 200: rise 500, plate to middle of ridge 1581, ' +
        'seat 75, heel cut 25, pitch 4 in 12, in all, tail to ridge 1792, plumb cut 18.43° off square, ' +
        'level cut 71.57° off square, notch 24 into 140.',
    )
  })

  it('shows nothing that follows from what is asked', () => {
    const words = sheetFor({}, 'lineLength')?.words ?? ''
    expect(words).toContain('plate to middle of ridge ?')
    expect(words).not.toMatch(/1792|1581|18\.43|heel/)
  })

  it('warns of a notch that is too deep, and leaves it out where there is no seat', () => {
    expect(sheetFor({ pitch: 12, seat: 0.1 })?.words).toContain('the notch is too deep')
    expect(sheetFor({ seat: 0 })?.words).not.toMatch(/notch|seat/)
  })

  it('gives null without a run', () => {
    const values = { pitch: 4, depth: 0.14 }
    expect(drawRafterSheet({ size: 'wide', system: 'metric', values, outputs: null })).toBeNull()
  })
})
