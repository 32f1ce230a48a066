import type { UnitSystem } from '../../../shared/contracts/exercises'
import { formatQuantity } from '../../../shared/units/format'
import { formatNumber } from '../../../shared/units/number'

/** Writes a drawn length: bare millimetres as on any drawing, or feet and inches. */
export function formatDrawnLength(metres: number, system: UnitSystem): string {
  if (system === 'imperial') return formatQuantity(metres, 'length', 'imperial')
  const mm = metres * 1000
  return formatNumber(mm, Math.abs(mm) < 20 ? 1 : 0)
}
