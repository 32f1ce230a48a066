import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { snowDensityStep } from './snowDensityStep'
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
  const ground =
    values['density'] === undefined ? optionalNumber(values, 'groundSnowLoad') : undefined
  const first: Step[] =
    ground === undefined ? [] : [{ ...snowDensityStep(ground, system), output: 'density' }]
  const isMeasured = optionalNumber(values, 'depth') !== undefined
  return [...first, ...(isMeasured ? loadOfDepth(outputs, system) : depthOfLoad(outputs, system))]
}

/** What a measured depth presses with. */
function loadOfDepth(outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const metric = system === 'metric'
  const density = writer.show(numberOf(outputs, 'density'), 'massDensity')
  const depth = writer.large(numberOf(outputs, 'depth'))
  return [
    {
      label: 'Load on the roof',
      formula: metric ? 'depth × density × 9.81' : 'depth in feet × density',
      numbers: metric ? `${depth} m × ${density} × 9.81 ÷ 1000` : `${depth} ft × ${density}`,
      result: writer.show(numberOf(outputs, 'load'), 'pressure'),
      output: 'load',
    },
  ]
}

/** How deep the snow lies that presses with the ground snow load. */
function depthOfLoad(outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const metric = system === 'metric'
  const density = writer.show(numberOf(outputs, 'density'), 'massDensity')
  const load = writer.show(numberOf(outputs, 'load'), 'pressure')
  return [
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
      result: writer.length(numberOf(outputs, 'depth')),
      output: 'depth',
    },
  ]
}
