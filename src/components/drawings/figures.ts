import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
import { formatNumber } from '../../../shared/units/number'

/** Writes a drawn length: bare millimetres as on any drawing, or feet and inches. */
export function formatDrawnLength(metres: number, system: UnitSystem): string {
  if (system === 'imperial') return formatQuantity(metres, 'length', 'imperial')
  const mm = metres * 1000
  return formatNumber(mm, Math.abs(mm) < 20 ? 1 : 0)
}

/** Writes a length that is given round in both systems, in millimetres and in inches. */
export type RoundFigure = (mm: number, inches: number) => string

/** Makes the writer of lengths that are round in this system. */
export function createRoundFigure(system: UnitSystem): RoundFigure {
  return (mm, inches) =>
    formatDrawnLength(system === 'imperial' ? inches * 0.0254 : mm / 1000, system)
}
