import { describe, expect, it } from 'vitest'
import { drawTaperSheet } from '../../../../src/components/drawings/taperSheet'
import { expectLabelsApart } from './anyNumbers'

const values = {
  openingStart: 0.118,
  openingEnd: 0.103,
  gap: 0.005,
  gapAtStop: 'no',
  boardWidth: 0.14,
  length: 2.4,
}
const outputs = { cutStart: 0.113, cutEnd: 0.098, wasteStart: 0.027, angle: 0.00625, fits: 'yes' }
const shape = { size: 'wide', system: 'metric' } as const

describe('the drawing of a taper', () => {
  it('keeps its labels apart for openings of every size', () => {
    expect(expectLabelsApart('taper', drawTaperSheet, 1500)).toBeGreaterThan(500)
  })

  it('says what it gives, start and far end apart', () => {
    const sheet = drawTaperSheet({ ...shape, values, outputs })
    expect(sheet?.words).toContain('at the start the opening is 118 and the board 113')
    expect(sheet?.words).toContain('at the far end the opening is 103 and the board 98')
    expect(sheet?.words).toContain('27 off at the start, rip at 0.36°')
  })

  it('tells nothing that the asked width follows from', () => {
    const sheet = drawTaperSheet({ ...shape, values, outputs, asked: 'cutStart' })
    expect(sheet?.words).toContain('the opening is 118 and the board ?')
    expect(sheet?.words).not.toContain('27')
  })

  it('says that a board is too narrow', () => {
    const narrow = { ...shape, values: { ...values, boardWidth: 0.1 } }
    const sheet = drawTaperSheet({ ...narrow, outputs: { ...outputs, fits: 'no' } })
    expect(sheet?.words).toContain('this board is too narrow')
  })

  it('gives null where no room is left', () => {
    const full = { ...shape, values: { ...values, openingEnd: 0.004 }, outputs: null }
    expect(drawTaperSheet(full)).toBeNull()
  })
})
