import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { cutListAtOnce } from '../../../../shared/cutlist/solveCutList'
import type { CutRequest } from '../../../../shared/cutlist/cutRequest'
import type { UnitSystem } from '../../../../shared/contracts/exercises'
import { gatherCutGroups } from '../../../../src/components/drawings/cutListGroups'
import {
  drawCutListSheets,
  type CutListSheetSize,
} from '../../../../src/components/drawings/cutListSheet'
import type { Mark } from '../../../../src/components/drawings/marks'
import { findFaults } from './labelFaults'

const sizes: CutListSheetSize[] = ['wide', 'middle', 'narrow']
const systems: UnitSystem[] = ['metric', 'imperial']

const flat = (marks: readonly Mark[]): Mark[] =>
  marks.flatMap((mark) => (mark.tag === 'g' ? flat(mark.marks) : [mark]))

const drawRequest = (request: CutRequest, size: CutListSheetSize, system: UnitSystem) => {
  const list = cutListAtOnce(request)
  if (!list) return null
  const groups = gatherCutGroups(list)
  const sheets = drawCutListSheets({
    ...{ groups, saw: request, system, size },
    nameSection: (section) => section,
  })
  return { list, groups, sheets }
}

const slats: CutRequest = {
  parts: [
    { label: 'Slat', lengthMm: 895, count: 8, section: '19×140' },
    { label: 'Rail', lengthMm: 2390, count: 1, section: '19×140' },
    { label: 'Post', lengthMm: 1500, count: 1, section: '89×89' },
  ],
  stock: [
    { lengthMm: 3600, section: '19×140' },
    { lengthMm: 3000, section: '89×89' },
  ],
  kerfMm: 3,
  endTrimMm: 10,
}

const label = fc.oneof(fc.constantFrom('Slat', 'Front post', 'W'.repeat(30), 'ij'), fc.string())
const part = fc.record({
  label: label.map((text) => text.slice(0, 30)),
  lengthMm: fc.oneof(fc.integer({ min: 5, max: 60 }), fc.integer({ min: 60, max: 6000 })),
  count: fc.integer({ min: 1, max: 30 }),
  section: fc.constantFrom('38×89', 'round 75 with a long name of its own'),
})
const request = fc.record({
  parts: fc.array(part, { minLength: 1, maxLength: 12 }),
  lengths: fc.array(fc.integer({ min: 20, max: 30_000 }), { minLength: 1, maxLength: 4 }),
  kerfMm: fc.constantFrom(0, 1.6, 3, 3.175, 10, 25),
  endTrimMm: fc.constantFrom(0, 10, 12.7, 150),
})

describe('drawing of a cut list', () => {
  it('draws bars cut alike once, with every length and every name on them', () => {
    const drawn = drawRequest(slats, 'wide', 'metric')
    expect(drawn?.groups).toEqual([
      {
        ...{ section: '19×140', stockMm: 3600, bars: 2, offcutMm: 0 },
        runs: [{ label: 'Slat', lengthMm: 895, count: 4 }],
      },
      {
        ...{ section: '19×140', stockMm: 3600, bars: 1, offcutMm: 1197 },
        runs: [{ label: 'Rail', lengthMm: 2390, count: 1 }],
      },
      {
        ...{ section: '89×89', stockMm: 3000, bars: 1, offcutMm: 1487 },
        runs: [{ label: 'Post', lengthMm: 1500, count: 1 }],
      },
    ])
    const texts = drawn?.sheets[0]?.drawing.labels.map(({ text }) => text) ?? []
    expect(texts.filter((text) => text === '895 Slat')).toHaveLength(4)
    expect(texts).toEqual(
      expect.arrayContaining([
        '2 × 3600',
        'no offcut',
        'offcut 1197',
        '2390 Rail',
        '89×89',
        '3000',
      ]),
    )
    expect(drawn?.sheets[0]?.words).toBe(
      'Bars drawn to scale with their saw cuts of 3 millimetres: 2 bars of 19×140, 3600 millimetres long, cut into 4 × 895 Slat, no offcut; one bar of 19×140, 3600 millimetres long, cut into 2390 Rail, offcut 1197 millimetres; one bar of 89×89, 3000 millimetres long, cut into 1500 Post, offcut 1487 millimetres.',
    )
  })

  it('draws pieces, cuts and offcut to scale', () => {
    const drawn = drawRequest(slats, 'wide', 'metric')
    const pieces = flat(drawn?.sheets[0]?.drawing.marks ?? []).filter(
      (mark) => mark.tag === 'rect' && mark.attributes.class === 'p2 m-timber',
    )
    const [, second, third] = pieces.map(({ attributes }) => Number(attributes['x']))
    // Two slats begin a slat and a saw cut apart; the scale is set by the longest bar, 3600 mm on 678 px.
    expect((third ?? 0) - (second ?? 0)).toBeCloseTo(((895 + 3) * 678) / 3600, 0)
    // Four slats, drawn once for two bars, a rail and a post.
    expect(pieces).toHaveLength(6)
  })

  it('names the pieces under a bar that has no room for their names', () => {
    const parts = slats.parts.map((part) => ({ ...part, label: `${part.label} of the side` }))
    const drawn = drawRequest({ ...slats, parts }, 'narrow', 'metric')
    const texts = drawn?.sheets[0]?.drawing.labels.map(({ text }) => text) ?? []
    expect(texts).toContain('4 × 895 Slat of the side')
    expect(texts.filter((text) => text === '895')).toHaveLength(4)
  })

  it('says so where a bar is drawn longer than it is', () => {
    const short = { lengthMm: 100, section: '89×89' }
    const post = { label: 'Cap', lengthMm: 80, count: 1, section: '89×89' }
    const stock = [...slats.stock.slice(0, 1), short]
    const drawn = drawRequest(
      { ...slats, parts: [...slats.parts.slice(0, 2), post], stock },
      'narrow',
      'metric',
    )
    const texts = drawn?.sheets[0]?.drawing.labels.map(({ text }) => text).join(' ') ?? ''
    expect(texts).toContain('drawn longer than they are')
  })

  it('takes several sheets for a hundred bars that are all cut differently', () => {
    const parts = Array.from({ length: 40 }, (_, at) => ({
      ...{ label: `Part ${at + 1}`, lengthMm: 700 + 31 * at, count: 6, section: '38×89' },
    }))
    const stock = [{ lengthMm: 2400, section: '38×89' }]
    const drawn = drawRequest({ parts, stock, kerfMm: 3, endTrimMm: 10 }, 'narrow', 'imperial')
    expect(drawn?.list.count).toBeGreaterThan(100)
    expect(drawn?.sheets.length).toBeGreaterThan(1)
    const bars = drawn?.groups.reduce((sum, group) => sum + group.bars, 0)
    expect(bars).toBe(drawn?.list.count)
    for (const { drawing } of drawn?.sheets ?? []) expect(findFaults(drawing)).toEqual([])
  })

  it('keeps its labels apart and on the sheet, whatever is cut from whatever', () => {
    let drawnSheets = 0
    fc.assert(
      fc.property(
        request,
        fc.constantFrom(...sizes),
        fc.constantFrom(...systems),
        ({ parts, lengths, kerfMm, endTrimMm }, size, system) => {
          const longest = Math.max(...lengths)
          const fitting = parts.filter(({ lengthMm }) => lengthMm + endTrimMm <= longest)
          if (fitting.length === 0) return
          const sections = [...new Set(fitting.map(({ section }) => section))]
          const stock = sections.flatMap((section) =>
            lengths.map((lengthMm) => ({ lengthMm, section })),
          )
          const drawn = drawRequest({ parts: fitting, stock, kerfMm, endTrimMm }, size, system)
          for (const { drawing, words } of drawn?.sheets ?? []) {
            drawnSheets += 1
            expect(findFaults(drawing)).toEqual([])
            const told = [drawing.marks.map((mark) => mark.tag), drawing.height, words.length]
            expect(JSON.stringify(told)).not.toMatch(/NaN|Infinity|null/)
            expect(JSON.stringify(drawing.marks)).not.toMatch(/NaN|Infinity/)
          }
        },
      ),
      { numRuns: 300 },
    )
    expect(drawnSheets).toBeGreaterThan(150)
  })
})
