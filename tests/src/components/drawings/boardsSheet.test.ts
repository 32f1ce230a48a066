import { describe, expect, it } from 'vitest'
import { boards } from '../../../../shared/calculators/boards'
import { computeValues } from '../../../../shared/calculators/runCalculator'
import { drawBoardsSheet } from '../../../../src/components/drawings/boardsSheet'
import { expectLabelsApart } from './anyNumbers'

function sheetFor(changed: Record<string, number | string> = {}, asked?: string) {
  const choices = { mode: 'fixed-gap', ends: 'board' }
  const usual = { opening: 2.45, boardWidth: 0.145, gap: 0.005, ...choices }
  const values = { ...usual, ...changed }
  const run = computeValues(boards, values, 'metric')
  if (!run.ok) throw new Error('the boards are refused')
  return drawBoardsSheet({ size: 'wide', system: 'metric', values, outputs: run.outputs, asked })
}

describe('the drawing of boards', () => {
  it('keeps its labels apart for openings of every size', () => {
    expect(expectLabelsApart('boards', drawBoardsSheet, 1500)).toBeGreaterThan(200)
  })

  it('says how many, the gap and the last one, with the marks', () => {
    expect(sheetFor()?.words).toBe(
      'Boards side by side in an opening of 2450 millimetres, each 145, gap 5, the last one 50: ' +
        '17 boards; marks: 0, 150, 300, …, 2400.',
    )
  })

  it('tells neither the asked count nor the marks that it follows from', () => {
    const words = sheetFor({}, 'count')?.words
    expect(words).toContain('? boards')
    expect(words).not.toMatch(/17|marks/)
  })

  it('cuts a long row short and says so, and warns of a thin strip', () => {
    expect(sheetFor({ opening: 9 })?.words).toContain('row cut short')
    expect(sheetFor({ opening: 2.42 })?.words).toContain('thin strip')
    expect(sheetFor()?.words).not.toMatch(/cut short|thin/)
  })

  it('gives null before there is a count', () => {
    const values = { opening: 1, boardWidth: 0.1, gap: 0 }
    expect(drawBoardsSheet({ size: 'wide', system: 'metric', values, outputs: null })).toBeNull()
  })
})
