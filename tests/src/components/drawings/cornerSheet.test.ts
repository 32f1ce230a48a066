import { describe, expect, it } from 'vitest'
import type { CalculatorSheetInput } from '../../../../src/components/drawings/calculatorSheet'
import { drawCornerSheet } from '../../../../src/components/drawings/cornerSheet'
import { computeValues } from '../../../../shared/calculators/runCalculator'
import { corner } from '../../../../shared/calculators/corner'
import { expectLabelsApart } from './anyNumbers'

function sheetFor(diagonal: number, shape: Partial<CalculatorSheetInput> = {}) {
  const values = { legA: 2.4, legB: 1.8, diagonal, tolerance: 0.005 }
  const run = computeValues(corner, values, 'metric')
  if (!run.ok) throw new Error('the corner is refused')
  return drawCornerSheet({ size: 'wide', system: 'metric', values, outputs: run.outputs, ...shape })
}
const lettering = (sheet: ReturnType<typeof sheetFor>) =>
  (sheet?.drawing.labels ?? []).map(({ text }) => text)

describe('the drawing of a corner', () => {
  it('keeps its labels apart for corners of every shape', () => {
    expect(expectLabelsApart('corner', drawCornerSheet, 3000)).toBeGreaterThan(100)
  })

  it('sends the end of leg B in where the corner is wide, out where it is narrow', () => {
    expect(lettering(sheetFor(3.01))).toContain('swing the end of B 12.5 toward A')
    expect(lettering(sheetFor(2.99))).toContain('swing the end of B 12.5 away from A')
    expect(lettering(sheetFor(3.001))).toContain('square: the end of B 1.3 off')
  })

  it('tells of the corner nothing that follows from the angle that is asked', () => {
    const sheet = sheetFor(3.01, { asked: 'angle' })
    expect(lettering(sheet)).toContain('corner ?°')
    expect(sheet?.words).not.toMatch(/0\.4|90|12\.5|toward/)
  })

  it('says when the lean is drawn larger than it is, and draws a large one true', () => {
    expect(lettering(sheetFor(3.01))).toContain('lean drawn larger than it is')
    expect(lettering(sheetFor(3.4)).join()).not.toContain('drawn larger')
  })

  it('gives null for three lengths that are no triangle', () => {
    const values = { legA: 1, legB: 1, diagonal: 2 }
    expect(drawCornerSheet({ size: 'wide', system: 'metric', values, outputs: null })).toBeNull()
  })
})
