import { describe, expect, it } from 'vitest'
import { spacing } from '../../../../shared/calculators/spacing'
import { computeValues } from '../../../../shared/calculators/runCalculator'
import { drawSpacingSheet } from '../../../../src/components/drawings/spacingSheet'
import { expectLabelsApart } from './anyNumbers'

function sheetFor(changed: Record<string, number> = {}, asked?: string) {
  const values = { run: 3.6, maxCentres: 0.4, memberWidth: 0.045, ...changed }
  const run = computeValues(spacing, values, 'metric')
  if (!run.ok) throw new Error('the spacing is refused')
  return drawSpacingSheet({ size: 'wide', system: 'metric', values, outputs: run.outputs, asked })
}

describe('the drawing of equal spacing', () => {
  it('keeps its labels apart for runs of every length', () => {
    expect(expectLabelsApart('spacing', drawSpacingSheet, 1500)).toBeGreaterThan(200)
  })

  it('says how many, how far apart and where', () => {
    expect(sheetFor()?.words).toBe(
      'A run of 3600 millimetres outside to outside, each 45 wide, centre to centre 395, clear 350: ' +
        '10 in all; centres at most 400; marks: 0, 395, 790, …, 3555.',
    )
  })

  it('keeps back what follows from the asked count', () => {
    const words = sheetFor({}, 'count')?.words
    expect(words).toContain('? in all')
    expect(words).not.toMatch(/395|350|marks/)
  })

  it('cuts a long row short and says so', () => {
    expect(sheetFor({ run: 40 })?.words).toContain('row cut short')
  })

  it('gives null before there is a count', () => {
    const values = { run: 1, maxCentres: 0.4, memberWidth: 0.1 }
    expect(drawSpacingSheet({ size: 'wide', system: 'metric', values, outputs: null })).toBeNull()
  })
})
