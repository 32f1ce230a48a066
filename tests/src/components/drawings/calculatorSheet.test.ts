import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type {
  CalculatorSheetInput,
  CalculatorSheetSize,
} from '../../../../src/components/drawings/calculatorSheet'
import { drawDiagonalsSheet } from '../../../../src/components/drawings/diagonalsSheet'
import { drawMixSheet } from '../../../../src/components/drawings/mixSheet'
import { drawPitchSheet } from '../../../../src/components/drawings/pitchSheet'
import { drawSlabSheet } from '../../../../src/components/drawings/slabSheet'
import { drawSquareSheet } from '../../../../src/components/drawings/squareSheet'
import { findFaults } from './labelFaults'

const sizes: CalculatorSheetSize[] = ['wide', 'narrow']
const systems = ['metric', 'imperial'] as const
const layouts = sizes.flatMap((size) => systems.map((system) => ({ size, system })))
const layout = fc.constantFrom(...layouts)
const side = fc.double({ min: 0.3, max: 40, noNaN: true })

type Case = Pick<CalculatorSheetInput, 'values' | 'outputs' | 'asked'>

const square = (sideA: number, sideB: number, unit: number): Case => ({
  values: { sideA, sideB },
  outputs: { unit, legShort: 3 * unit, legLong: 4 * unit, diagonal: 5 * unit },
})
const diagonals = (length: number, width: number, off: number, isSquare: boolean): Case => {
  const expected = Math.hypot(length, width)
  return {
    values: { length, width, diagonal1: expected + off, diagonal2: expected - off },
    outputs: {
      expected,
      difference: 2 * off,
      moveBy: Math.abs(off),
      square: isSquare ? 'yes' : 'no',
    },
  }
}
const pitch = (angle: number): Case => {
  const ratio = Math.tan(angle)
  return {
    values: { degrees: angle },
    outputs: {
      degrees: angle,
      ratio,
      percent: ratio * 100,
      risePer12: ratio * 12,
      lengthPerRun: Math.hypot(1, ratio),
      hipPerRun: Math.hypot(Math.SQRT2, ratio),
    },
  }
}
const mix = (least: number, most: number, waterAdded: number, slump?: number): Case => ({
  values: { waterAdded, slump },
  outputs: { waterMin: least, waterMax: most, verdict: waterAdded > most ? 'wet' : 'right' },
})
const DEGREE = Math.PI / 180

describe.each(layouts)('calculator drawings, $size, $system', (shape) => {
  it.each([
    ['the usual pad', { length: 2.6, width: 1.1, thickness: 0.1, fall: 0.01 }],
    ['a strip', { length: 40, width: 0.3, thickness: 0.1, fall: 0.02 }],
    ['a strip the other way', { length: 0.3, width: 40, thickness: 0.1, fall: 0.02 }],
    ['a thick block', { length: 0.3, width: 0.3, thickness: 0.6, fall: 0 }],
    [
      'a pad on a level base',
      { length: 3, width: 2, thickness: 0.08, fall: 0.02, flatBase: 'yes' },
    ],
    ['a steep pad', { length: 12, width: 12, thickness: 0.05, fall: 0.1 }],
  ])('keeps the labels of a slab apart: %s', (_name, values) => {
    for (const asked of [undefined, 'length', 'thickness', 'bags', 'drop']) {
      const sheet = drawSlabSheet({ ...shape, values, outputs: null, asked })
      expect(sheet && findFaults(sheet.drawing)).toEqual([])
    }
  })

  it.each([
    ['square', drawSquareSheet, square(2.6, 1.1, 0.3)],
    ['square in a strip', drawSquareSheet, square(40, 0.3, 0.1)],
    ['square in a field', drawSquareSheet, square(40, 40, 0.3)],
    ['diagonals', drawDiagonalsSheet, diagonals(2.6, 1.1, 0.003, false)],
    ['diagonals of a strip', drawDiagonalsSheet, diagonals(40, 0.3, -0.05, false)],
    ['square diagonals', drawDiagonalsSheet, diagonals(0.3, 40, 0, true)],
    ['pitch of 18 degrees', drawPitchSheet, pitch(18.43 * DEGREE)],
    ['pitch of 1 degree', drawPitchSheet, pitch(DEGREE)],
    ['pitch of 80 degrees', drawPitchSheet, pitch(80 * DEGREE)],
    ['mix', drawMixSheet, mix(0.0025, 0.003, 0.0027)],
    ['mix with a slump', drawMixSheet, mix(0.0025, 0.00251, 0.006, 0.18)],
  ])('keeps the labels of %s apart', (_name, draw, given) => {
    const names = [undefined, ...Object.keys(given.values), ...Object.keys(given.outputs ?? {})]
    for (const asked of names) {
      const sheet = draw({ ...shape, ...given, asked })
      expect(sheet && findFaults(sheet.drawing)).toEqual([])
    }
  })
})

describe('calculator drawings of any size', () => {
  it('keeps the labels of every slab apart', () => {
    const thickness = fc.double({ min: 0.03, max: 1, noNaN: true })
    const fall = fc.double({ min: 0, max: 0.2, noNaN: true })
    const base = fc.constantFrom('yes', 'no')
    fc.assert(
      fc.property(
        layout,
        side,
        side,
        thickness,
        fall,
        base,
        (shape, length, width, depth, slope, flatBase) => {
          const values = { length, width, thickness: depth, fall: slope, flatBase }
          const sheet = drawSlabSheet({ ...shape, values, outputs: null })
          expect(sheet && findFaults(sheet.drawing)).toEqual([])
        },
      ),
    )
  })

  it('keeps the labels of every triangle and rectangle apart', () => {
    const share = fc.double({ min: 0.2, max: 1, noNaN: true })
    const off = fc.double({ min: -0.05, max: 0.05, noNaN: true })
    fc.assert(
      fc.property(layout, side, side, share, off, (shape, a, b, part, lean) => {
        const unit = Math.min(Math.min(a, b) / 3, Math.max(a, b) / 4) * part
        const set = drawSquareSheet({ ...shape, ...square(a, b, unit) })
        expect(set && findFaults(set.drawing)).toEqual([])
        const checked = drawDiagonalsSheet({ ...shape, ...diagonals(a, b, lean, false) })
        expect(checked && findFaults(checked.drawing)).toEqual([])
      }),
    )
  })

  it('keeps the labels of every slope and mix apart', () => {
    const degrees = fc.double({ min: 0.2, max: 84, noNaN: true })
    const litres = fc.double({ min: 0.5, max: 12, noNaN: true })
    fc.assert(
      fc.property(layout, degrees, litres, litres, (shape, angle, least, added) => {
        const slope = drawPitchSheet({ ...shape, ...pitch(angle * DEGREE) })
        expect(slope && findFaults(slope.drawing)).toEqual([])
        const given = mix(least / 1000, (least * 1.1) / 1000, added / 1000, 0.09)
        const mixed = drawMixSheet({ ...shape, ...given })
        expect(mixed && findFaults(mixed.drawing)).toEqual([])
      }),
    )
  })
})

describe('what a calculator drawing says', () => {
  it('hides the figure that is asked for from drawing and words alike', () => {
    const given = { ...square(2.6, 1.1, 0.3), asked: 'diagonal' }
    const sheet = drawSquareSheet({ ...given, size: 'wide', system: 'metric' })
    const lettering = sheet?.drawing.labels.map(({ text }) => text).join('|')
    expect(lettering).toContain('5 × 300 = ?')
    expect(lettering).not.toContain('1500')
    expect(sheet?.words).not.toContain('1500')
    expect(sheet?.words).toContain('what the tape reads is asked')
  })

  it('shows of a slope only what was given while another way is asked for', () => {
    const { outputs } = pitch(0.3)
    const given = { values: { risePer12: 4 }, outputs, asked: 'percent' }
    const sheet = drawPitchSheet({ ...given, size: 'wide', system: 'metric' })
    const lettering = sheet?.drawing.labels.map(({ text }) => text)
    expect(lettering).toContain('3.71 in 12  ·  ? %')
    expect(sheet?.words).not.toContain('30.93')
    expect(sheet?.words).not.toContain('1:')
  })

  it('sends the back of a leaning rectangle away from its longer diagonal', () => {
    const shape = { size: 'wide', system: 'metric' } as const
    const first = drawDiagonalsSheet({ ...shape, ...diagonals(2.6, 1.1, 0.01, false) })
    const second = drawDiagonalsSheet({ ...shape, ...diagonals(2.6, 1.1, -0.01, false) })
    expect(first?.words).toContain('move A and B 10 toward B')
    expect(second?.words).toContain('move A and B 10 toward A')
  })

  it('draws to scale: a pad twice as long as wide', () => {
    const values = { length: 2, width: 1, thickness: 0.1 }
    const sheet = drawSlabSheet({ values, outputs: null, size: 'wide', system: 'metric' })
    const top = sheet?.drawing.marks.flatMap((mark) => (mark.tag === 'g' ? mark.marks : []))
    const pad = top?.find((mark) => mark.attributes.class === 'p3 m-concrete')
    expect(Number(pad?.attributes.width) / Number(pad?.attributes.height)).toBeCloseTo(2, 1)
  })

  it('gives null where the numbers cannot be drawn', () => {
    const shape = { outputs: null, size: 'wide', system: 'metric' } as const
    expect(drawSlabSheet({ ...shape, values: { length: -1, width: 1, thickness: 0.1 } })).toBeNull()
    expect(drawSquareSheet({ ...shape, values: { sideA: 1 } })).toBeNull()
    expect(drawDiagonalsSheet({ ...shape, values: { length: 1, width: 1 } })).toBeNull()
    expect(drawPitchSheet({ ...shape, values: { degrees: 0.3 } })).toBeNull()
    expect(drawMixSheet({ ...shape, values: { waterAdded: 0.003 } })).toBeNull()
  })
})
