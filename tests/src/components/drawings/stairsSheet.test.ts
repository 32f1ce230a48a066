import { describe, expect, it } from 'vitest'
import { stairs } from '../../../../shared/calculators/stairs'
import { computeValues } from '../../../../shared/calculators/runCalculator'
import { drawStairsSheet } from '../../../../src/components/drawings/stairsSheet'
import { expectLabelsApart } from './anyNumbers'

function sheetFor(changed: Record<string, number> = {}, asked?: string) {
  const values = { totalRise: 0.52, maxRise: 0.18, tread: 0.3, ...changed }
  const run = computeValues(stairs, values, 'metric')
  if (!run.ok) throw new Error('the steps are refused')
  return drawStairsSheet({ size: 'wide', system: 'metric', values, outputs: run.outputs, asked })
}

describe('the drawing of steps', () => {
  it('keeps its labels apart for flights of every height', () => {
    expect(expectLabelsApart('stairs', drawStairsSheet, 1500)).toBeGreaterThan(1000)
  })

  it('says the steps and their sizes', () => {
    expect(sheetFor()?.words).toBe(
      'Steps from the side, 520 millimetres in all, each 173, tread 300, first riser to last 600: ' +
        '3 risers, all the same, two rises and a tread 647.',
    )
  })

  it('neither counts nor measures them while their number is asked', () => {
    const sheet = sheetFor({ totalRise: 0.9 }, 'risers')
    expect(sheet?.words).not.toMatch(/180|each|1200/)
    expect(sheet?.drawing.labels.map(({ text }) => text)).toContain(
      'drawn with four steps, however many there are',
    )
  })

  it('says when the limits are passed', () => {
    expect(sheetFor({ tread: 0.2 })?.words).toContain('beyond 7 3/4 in rise or 10 in tread')
    expect(sheetFor()?.words).not.toContain('beyond')
  })

  it('gives null before there are risers', () => {
    const values = { totalRise: 0.52, maxRise: 0.18, tread: 0.3 }
    expect(drawStairsSheet({ size: 'wide', system: 'metric', values, outputs: null })).toBeNull()
  })
})
