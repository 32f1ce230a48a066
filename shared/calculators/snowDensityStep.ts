import type { Step } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { PSF, snowDensity } from './snowCover'
import { stepWriter } from './values'

/** How the density of settled snow follows from the ground snow load (Pa), stopping at 30 lb/ft³. */
export function snowDensityStep(groundSnowLoad: number, system: UnitSystem): Step {
  const writer = stepWriter(system)
  const psf = groundSnowLoad / PSF
  const loose = writer.number(0.13 * psf + 14)
  const most = 0.13 * psf + 14 > 30 ? ', at most 30' : ''
  return {
    label: 'How dense the snow is',
    formula: '0.13 × ground snow load in psf + 14, at most 30 lb/ft³',
    numbers: `0.13 × ${writer.number(psf)} + 14 = ${loose}${most} lb/ft³`,
    result: writer.show(snowDensity(groundSnowLoad), 'massDensity'),
  }
}
