import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { CEMENT_DENSITY, LOOSE_FOR_ONE, readParts } from './batchTables'
import { numberOf, stepWriter, wordOf } from './values'

function looseSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const { show, number } = stepWriter(system)
  const parts = readParts(wordOf(values, 'proportions'))
  const loose = (cubic: number) =>
    show(cubic, 'volume', { unit: system === 'metric' ? 'L' : 'ft³' })
  const factor = 1 + numberOf(values, 'waste') / 100
  const volume = numberOf(values, 'volume') * factor
  const part = (LOOSE_FOR_ONE * volume) / parts.all
  const density = show(CEMENT_DENSITY, 'massDensity', {
    unit: system === 'metric' ? 'kg/L' : 'lb/ft³',
  })
  const heap = (name: 'sand' | 'stone', label: string): Step => ({
    label,
    formula: `${name} parts × one part`,
    numbers: `${number(parts[name])} × ${loose(part)}`,
    result: loose(numberOf(outputs, name)),
    output: name,
  })
  return [
    {
      label: 'Concrete, with waste',
      formula: 'concrete × (1 + waste ÷ 100)',
      numbers: `${loose(numberOf(values, 'volume'))} × ${number(factor, 3)}`,
      result: loose(volume),
    },
    {
      label: 'One part, loose',
      formula: `${number(LOOSE_FOR_ONE)} × concrete ÷ all parts`,
      numbers: `${number(LOOSE_FOR_ONE)} × ${loose(volume)} ÷ ${number(parts.all)}`,
      result: loose(part),
    },
    {
      label: 'Cement',
      formula: 'one part × what loose cement weighs',
      numbers: `${loose(part * parts.cement)} × ${density}`,
      result: show(numberOf(outputs, 'cement'), 'mass'),
      output: 'cement',
    },
    heap('sand', 'Sand'),
    heap('stone', 'Stone'),
  ]
}

function waterSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const { show, number, length } = stepWriter(system)
  const metric = system === 'metric'
  const output = (name: string) => numberOf(outputs, name)
  const content = { unit: metric ? 'kg/m³' : 'lb/yd³' }
  const liquid = { unit: metric ? 'L' : 'qt' }
  const volume = numberOf(values, 'volume') * (1 + numberOf(values, 'waste') / 100)
  const air = wordOf(values, 'airEntrained') === 'yes' ? 'with air' : 'without added air'
  const place = `stone up to ${length(numberOf(values, 'maxAggregate'))}, slump ${length(numberOf(values, 'slump'))}, ${air}`
  const mass = output('waterContent') * volume
  return [
    {
      label: 'Water in the concrete',
      formula: 'from the table, by stone, slump and air',
      numbers: place,
      result: show(output('waterContent'), 'massDensity', content),
      output: 'waterContent',
    },
    {
      label: 'Water',
      formula: metric ? 'water in a cubic metre × concrete' : 'water in a cubic yard × concrete',
      numbers: `${show(output('waterContent'), 'massDensity', content)} × ${show(volume, 'volume', { unit: metric ? 'm³' : 'yd³' })}`,
      result: show(output('water'), 'volume', liquid),
      output: 'water',
    },
    {
      label: 'Water to cement',
      formula: 'weight of water ÷ weight of cement',
      numbers: `${show(mass, 'mass')} ÷ ${show(output('cement'), 'mass')}`,
      result: number(output('waterCementRatio'), 4),
      output: 'waterCementRatio',
    },
    {
      label: 'Air in it',
      formula: 'from the table, by stone and air',
      numbers: place,
      result: show(output('airTarget'), 'percent'),
      output: 'airTarget',
    },
  ]
}

/** The worked solution of `batch`. */
export function batchSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const { show, number } = stepWriter(system)
  const strength = outputs['strengthEstimate']
  const unit = { unit: system === 'metric' ? 'MPa' : 'psi' }
  return [
    ...looseSteps(values, outputs, system),
    ...waterSteps(values, outputs, system),
    {
      label: 'Strength in a laboratory, no promise',
      formula: 'from the table, by water to cement',
      numbers: number(numberOf(outputs, 'waterCementRatio'), 2),
      result:
        typeof strength === 'number'
          ? show(strength, 'pressure', unit)
          : 'weaker than the table goes',
      output: 'strengthEstimate',
    },
  ]
}
