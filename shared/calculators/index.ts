import type { Calculator } from './calculator'
import { angleCut } from './angleCut'
import { batch } from './batch'
import { boards } from './boards'
import { coating } from './coating'
import { corner } from './corner'
import { diagonals } from './diagonals'
import { fall } from './fall'
import { fixings } from './fixings'
import { gravel } from './gravel'
import { joints } from './joints'
import { lid } from './lid'
import { lumberSize } from './lumberSize'
import { mix } from './mix'
import { pitch } from './pitch'
import { posthole } from './posthole'
import { postsOnFall } from './postsOnFall'
import { rafter } from './rafter'
import { sheets } from './sheets'
import { slab } from './slab'
import { snow } from './snow'
import { spacing } from './spacing'
import { square } from './square'
import { stairs } from './stairs'
import { taper } from './taper'

/** Every calculator there is; a new one is one file and one line here. */
export const calculators: readonly Calculator[] = [
  slab,
  mix,
  square,
  diagonals,
  pitch,
  sheets,
  fall,
  corner,
  snow,
  joints,
  taper,
  lid,
  gravel,
  coating,
  posthole,
  fixings,
  rafter,
  batch,
  boards,
  spacing,
  postsOnFall,
  angleCut,
  stairs,
  lumberSize,
]

/** The calculator of this id. */
export const findCalculator = (id: string): Calculator | undefined =>
  calculators.find((calculator) => calculator.id === id)

export { convertText, fieldUnit, showInput, showOutput } from './fields'
export { hideAnswer, runCalculator, type CalculatorRun } from './runCalculator'
