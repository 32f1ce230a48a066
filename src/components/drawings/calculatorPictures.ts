import { drawLumberSizePicture } from './lumberSizePicture'
import { drawStairsPicture } from './stairsPicture'
import { drawAngleCutPicture } from './angleCutPicture'
import { drawCutListPicture } from './cutListPicture'
import { drawPostsOnFallPicture } from './postsOnFallSheet'
import { drawSpacingPicture } from './spacingPicture'
import { drawBoardsPicture } from './boardsPicture'
import { drawBatchPicture } from './batchSheet'
import { drawRafterPicture } from './rafterPicture'
import { drawPostholePicture } from './postholeSheet'
import { drawGravelPicture } from './gravelSheet'
import { drawTaperPicture } from './taperPicture'
import { drawJointsPicture } from './jointsSheet'
import { drawCornerPicture } from './cornerPicture'
import { drawFallPicture } from './fallSheet'
import { drawDiagonalsPicture, drawPitchPicture, drawSquarePicture } from './settingOutPictures'
import { dimensionColumn, dimensionRow } from './dimensions'
import { Drawing } from './drawing'
import { createRoundFigure, type RoundFigure } from './figures'
import { drawSheetsPicture } from './sheetsSheet'
import { drawSnowPicture } from './snowSheet'
import { drawLidPicture } from './lidSheet'
import { drawCoatingPicture } from './coatingSheet'
import { drawFixingsPicture } from './fixingsSheet'
import type { UnitSystem } from '../../../shared/contracts/exercises'

/** Draws one small picture; a figure is given round in both systems, in millimetres and in inches. */
type DrawPicture = (drawing: Drawing, figure: RoundFigure) => void

function drawSlabPicture(drawing: Drawing, figure: RoundFigure): void {
  let stones = ''
  for (let index = 0; index < 12; index++) {
    const x = 30 + index * 13
    const y = 74 + 16 * (index % 2 ? 0.35 : 0.7)
    stones += `M${x - 4} ${y + 2.4}L${x} ${y - 3.2}L${x + 4} ${y + 2.4}Z`
  }
  drawing.coloured(() => {
    drawing.rect(30, -74, 150, 22, 'p3 m-concrete')
    drawing.rect(22, -90, 166, 16, 'p1b m-stonebed')
    drawing.path(stones, 'p1 m-stone')
  })
  dimensionRow(drawing, 30, 180, 46, 28, figure(2600, 102))
  dimensionColumn(drawing, 52, 74, 186, 196, figure(100, 4), { level: true })
  drawing.text(105, 69, '? bags', 'ask1', 'middle', 17)
}

function drawMixPicture(drawing: Drawing): void {
  drawing.coloured(() =>
    drawing.path('M70 90C74 58 84 34 96 34H124C136 34 146 58 150 90Z', 'p2 m-concrete'),
  )
  drawing.path('M84 90L98 16H122L136 90', 'p1b dash nofill')
  drawing.path('M8 90H212', 'p3')
  dimensionColumn(drawing, 16, 34, 150, 166, '?', { chalk: true, level: true })
}

/** The small picture of each calculator by its id. */
const PICTURES: Readonly<Record<string, DrawPicture>> = {
  slab: drawSlabPicture,
  mix: drawMixPicture,
  square: drawSquarePicture,
  diagonals: drawDiagonalsPicture,
  pitch: drawPitchPicture,
  sheets: drawSheetsPicture,
  fall: drawFallPicture,
  corner: drawCornerPicture,
  snow: drawSnowPicture,
  joints: drawJointsPicture,
  taper: drawTaperPicture,
  lid: drawLidPicture,
  gravel: drawGravelPicture,
  coating: drawCoatingPicture,
  posthole: drawPostholePicture,
  fixings: drawFixingsPicture,
  rafter: drawRafterPicture,
  batch: drawBatchPicture,
  boards: drawBoardsPicture,
  spacing: drawSpacingPicture,
  'posts-on-fall': drawPostsOnFallPicture,
  'angle-cut': drawAngleCutPicture,
  cutlist: drawCutListPicture,
  stairs: drawStairsPicture,
  'lumber-size': drawLumberSizePicture,
}

/** Draws the small picture of a calculator, a chalk “?” at the number it answers; undefined where it has none. */
export function drawCalculatorPicture(calculator: string, system: UnitSystem): Drawing | undefined {
  const draw = Object.hasOwn(PICTURES, calculator) ? PICTURES[calculator] : undefined
  if (!draw) return undefined
  const drawing = new Drawing(238, 122)
  draw(drawing, createRoundFigure(system))
  return drawing
}
