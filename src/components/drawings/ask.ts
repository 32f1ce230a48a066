import type { Drawing } from './drawing'
import { tenth } from './marks'

/** A chip in chalk that asks for a number or gives it, turned about its middle. */
export function drawChip(
  drawing: Drawing,
  px: number,
  py: number,
  text: string,
  degrees = 0,
  size = drawing.figure,
): void {
  const width = drawing.textWidth(text, size) + 14
  const height = size + 9
  const turn = `translate(${tenth(px)} ${tenth(py)}) rotate(${tenth(degrees)})`
  drawing.group({ transform: turn }, () => {
    const place = { x: tenth(-width / 2), y: tenth(-height / 2), width: tenth(width), height }
    drawing.add({ tag: 'rect', attributes: { ...place, class: 'askbox' } })
  })
  drawing.textTurned(px, py, degrees, text, 'askt', size)
}

/** The question for an output that no line of the drawing carries. */
const QUESTIONS: Record<string, string> = {
  volume: '? volume',
  volumeWithWaste: '? with waste',
  bags: '? bags',
  readyMix: '? ready mix',
  mass: '? weight',
  waterMin: '? water',
  waterMax: '? water',
  meanThickness: '? mean thickness',
  waterCementRatio: '? water to cement',
  slumpClass: '? slump class',
  largestUnit: '? biggest unit',
  expected: '? each diagonal if square',
  cornerError: '? out of square',
  square: '? square or not',
}

/** Words of the chip for an asked output, or undefined where the drawing has a place for it. */
export function questionFor(asked: string | undefined): string | undefined {
  return asked === undefined ? undefined : QUESTIONS[asked]
}
