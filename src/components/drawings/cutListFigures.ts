import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
import { formatNumber } from '../../../shared/units/number'
import type { Drawing } from './drawing'

/** A cut length: bare millimetres to a tenth, or feet and inches to a sixteenth. */
export function formatCutLength(mm: number, system: UnitSystem): string {
  return system === 'imperial'
    ? formatQuantity(mm / 1000, 'length', 'imperial')
    : formatNumber(mm, 1)
}

/** A text as far as there is room for it, in pixels. */
export function fitText(drawing: Drawing, text: string, room: number): string {
  if (drawing.textWidth(text) <= room) return text
  const letters = Array.from(text)
  while (letters.length > 0 && drawing.textWidth(`${letters.join('')}…`) > room) letters.pop()
  return `${letters.join('').trimEnd()}…`
}

/** Parts of a sentence on as many lines as they need; none is broken, one too long for a line is cut short. */
export function wrapParts(drawing: Drawing, parts: readonly string[], room: number): string[] {
  const lines: string[] = []
  for (const part of parts) {
    const last = lines.at(-1)
    const joined = last === undefined ? part : `${last} ${part}`
    if (last !== undefined && drawing.textWidth(joined) <= room) lines[lines.length - 1] = joined
    else lines.push(fitText(drawing, part, room))
  }
  return lines
}
