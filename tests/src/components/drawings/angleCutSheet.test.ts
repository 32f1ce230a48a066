import { describe, expect, it } from 'vitest'
import { drawAngleCutSheet } from '../../../../src/components/drawings/angleCutSheet'
import { expectLabelsApart } from './anyNumbers'

const values = { boardWidth: 0.14, angle: Math.PI / 6, longPoint: 0.895 }
const outputs = { offset: 0.080829, shortPoint: 0.814171 }
const shape = { size: 'wide', system: 'metric' } as const

describe('the drawing of an angle cut', () => {
  it('keeps its labels apart for pieces of every size and angle', () => {
    expect(expectLabelsApart('angle-cut', drawAngleCutSheet, 1500)).toBeGreaterThan(300)
  })

  it('says both points and how far they lie apart', () => {
    expect(drawAngleCutSheet({ ...shape, values, outputs })?.words).toBe(
      'A board 140 millimetres wide, cut 30° off square: 895 to its long point, 814 to its short point; ' +
        'the points lie 81 apart along the board.',
    )
  })

  it('keeps the short point back while the slant is asked', () => {
    const words = drawAngleCutSheet({ ...shape, values, outputs, asked: 'offset' })?.words
    expect(words).toContain('the points lie ? apart')
    expect(words).not.toContain('814')
  })

  it('draws the end true to its angle', () => {
    const sheet = drawAngleCutSheet({ ...shape, values, outputs })
    const marks = sheet?.drawing.marks.flatMap((mark) => (mark.tag === 'g' ? mark.marks : []))
    const piece = marks?.find((mark) => mark.tag === 'polygon')
    const points = String(piece?.attributes.points)
      .split(' ')
      .map((point) => point.split(',').map(Number))
    const [, long, short] = points
    const along = (long?.[0] ?? 0) - (short?.[0] ?? 0)
    const across = (short?.[1] ?? 0) - (long?.[1] ?? 0)
    expect(along / across).toBeCloseTo(Math.tan(Math.PI / 6), 2)
  })

  it('gives null where no short point is left', () => {
    const none = { ...values, longPoint: 0.08 }
    expect(drawAngleCutSheet({ ...shape, values: none, outputs: null })).toBeNull()
  })
})
