import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { PCF, PSF } from './snowCover'
import { numberOf, optionalNumber, stepWriter } from './values'

/** The worked solution of `snow`. */
export function snowSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const load = writer.show(numberOf(outputs, 'load'), 'pressure')
  const area = writer.show(numberOf(values, 'area'), 'area')
  return [
    ...coverSteps(values, outputs, system),
    {
      label: 'Weight of the snow',
      formula: system === 'metric' ? 'load × area, in newtons, ÷ 9.81' : 'load × area',
      numbers: system === 'metric' ? `${load} × 1000 × ${area} ÷ 9.81` : `${load} × ${area}`,
      result: writer.show(numberOf(outputs, 'weight'), 'mass'),
      output: 'weight',
    },
  ]
}

/** How dense, how deep and how heavy on every square metre, in the order in which they follow from what was said. */
function coverSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const metric = system === 'metric'
  const density = writer.show(numberOf(outputs, 'density'), 'massDensity')
  const depth = writer.length(numberOf(outputs, 'depth'))
  const load = writer.show(numberOf(outputs, 'load'), 'pressure')
  const first = densityStep(values, outputs, system)
  if (optionalNumber(values, 'depth') !== undefined) {
    return [
      ...first,
      {
        label: 'Load on the roof',
        formula: metric ? 'depth × density × 9.81' : 'depth in feet × density',
        numbers: metric
          ? `${writer.large(numberOf(outputs, 'depth'))} m × ${density} × 9.81 ÷ 1000`
          : `${writer.large(numberOf(outputs, 'depth'))} ft × ${density}`,
        result: load,
        output: 'load',
      },
    ]
  }
  return [
    ...first,
    {
      label: 'Load on the roof',
      formula: 'the ground snow load, nothing taken off',
      numbers: 'as your local code says',
      result: load,
      output: 'load',
    },
    {
      label: 'Depth of the snow',
      formula: metric ? 'load ÷ (density × 9.81)' : 'load ÷ density, in feet',
      numbers: metric ? `${load} × 1000 ÷ (${density} × 9.81)` : `${load} ÷ ${density}`,
      result: depth,
      output: 'depth',
    },
  ]
}

function densityStep(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const ground = optionalNumber(values, 'groundSnowLoad')
  if (ground === undefined || values['density'] !== undefined) return []
  const writer = stepWriter(system)
  const psf = writer.number(ground / PSF)
  const pcf = writer.number(numberOf(outputs, 'density') / PCF)
  return [
    {
      label: 'How dense it is',
      formula: '0.13 × ground snow load in psf + 14, at most 30 lb/ft³',
      numbers: `0.13 × ${psf} + 14 = ${pcf} lb/ft³`,
      result: writer.show(numberOf(outputs, 'density'), 'massDensity'),
      output: 'density',
    },
  ]
}
