import { describe, expect, it } from 'vitest'
import { lumberSize } from '../../../../shared/calculators/lumberSize'
import { computeValues } from '../../../../shared/calculators/runCalculator'
import { drawLumberSizeSheet } from '../../../../src/components/drawings/lumberSizeSheet'
import { expectLabelsApart } from './anyNumbers'

function sheetFor(changed: Record<string, number | string> = {}, asked?: string) {
  const values = { nominal: '2x4', moisture: 'dry', length: 3.6576, ...changed }
  const run = computeValues(lumberSize, values, 'metric')
  if (!run.ok) throw new Error('the size is refused')
  return drawLumberSizeSheet({
    size: 'wide',
    system: 'metric',
    values,
    outputs: run.outputs,
    asked,
  })
}

describe('the drawing of a lumber size', () => {
  it('keeps its labels apart for every size', () => {
    expect(expectLabelsApart('lumber-size', drawLumberSizeSheet, 2500)).toBeGreaterThan(2000)
  })

  it('says what it measures, and its board feet', () => {
    expect(sheetFor()?.words).toBe(
      'The end of a board that measures 38 by 89 millimetres: ' +
        'named 2 × 4 in, dry, dashed: the named size, 3658 long: 8 board feet.',
    )
  })

  it('shows nothing that follows from the thickness that is asked', () => {
    const words = sheetFor({}, 'thickness')?.words
    expect(words).toContain('measures ? thick')
    expect(words).not.toMatch(/89|38|board feet/)
  })

  it.each([
    [0.0889, 'as wide as it should be'],
    [0.088, 'narrower by 0.9'],
    [0.09, 'wider by 1.1'],
  ])('compares a board of %d m: %s', (measuredWidth, words) => {
    expect(sheetFor({ measuredWidth })?.words).toContain(words)
  })

  it('gives null for a size that is none', () => {
    const values = { nominal: 'plank', moisture: 'dry' }
    const outputs = { thickness: 0.038, width: 0.089 }
    expect(drawLumberSizeSheet({ size: 'wide', system: 'metric', values, outputs })).toBeNull()
  })
})
