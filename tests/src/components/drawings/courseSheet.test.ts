import { describe, expect, it } from 'vitest'
import type { CourseSheetSize } from '../../../../src/components/drawings/courseSheet'
import { drawDeckSheet } from '../../../../src/components/drawings/deckSheet'
import { formatDrawnLength } from '../../../../src/components/drawings/figures'
import { drawLogStoreSheet } from '../../../../src/components/drawings/logStoreSheet'
import { drawPicketFenceSheet } from '../../../../src/components/drawings/picketFenceSheet'
import { STAGES } from '../../../../src/components/drawings/stages'
import { findFaults } from './labelFaults'

const sheets = [
  ['log store', drawLogStoreSheet],
  ['deck', drawDeckSheet],
  ['picket fence', drawPicketFenceSheet],
] as const
const sizes: CourseSheetSize[] = ['full', 'wide', 'narrow', 'mini']
const numbered = STAGES.map((stage, index) => ({ stage, number: index + 1 }))

describe.each(sheets)('the sheet of the %s', (_name, draw) => {
  for (const size of sizes)
    for (const system of ['metric', 'imperial'] as const)
      for (const bubbles of [[], numbered])
        it(`keeps its labels apart and on the sheet: ${size}, ${system}, ${bubbles.length} numbers`, () => {
          const figure = (mm: number) => formatDrawnLength(mm / 1000, system)
          const { drawing } = draw({ size, bubbles, figure })
          expect(findFaults(drawing)).toEqual([])
        })
})
