import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { leastFall, SAID } from './fallSaid'
import { numberOf, stepWriter, wordOf } from './values'

const FIRST: Record<(typeof SAID)[number], string> = {
  perMetre: 'millimetres for each metre ÷ 1000',
  perFoot: 'inches for each foot ÷ 12',
  percent: 'per cent ÷ 100',
  ratio: 'drop ÷ run',
  angle: 'tan(angle)',
}

/** The fall as drop over run, from the way it was said. */
function ratioStep(values: Values, ratio: number, system: UnitSystem): Step {
  const writer = stepWriter(system)
  const said = SAID.find((name) => values[name] !== undefined) ?? 'ratio'
  const numbers: Record<(typeof SAID)[number], () => string> = {
    perMetre: () => `${writer.number(ratio * 1000)} ÷ 1000`,
    perFoot: () => `${writer.number(ratio * 12, 4)} ÷ 12`,
    percent: () => `${writer.number(ratio * 100)} ÷ 100`,
    ratio: () => writer.show(ratio, 'ratio', { unit: '1:n' }),
    angle: () => `tan(${writer.show(numberOf(values, 'angle'), 'angle')})`,
  }
  const one = ratio > 0 ? `, ${writer.show(ratio, 'ratio', { unit: '1:n' })}` : ''
  return {
    label: 'Fall, drop over run',
    formula: FIRST[said],
    numbers: numbers[said](),
    result: `${writer.number(ratio, 5)}${one}`,
  }
}

/** The drop: metres times millimetres, or feet times inches, where it was said so. */
function dropStep(values: Values, ratio: number, drop: number, system: UnitSystem): Step {
  const writer = stepWriter(system)
  const run = numberOf(values, 'run')
  const step = { label: 'Far edge lower by', result: writer.length(drop), output: 'drop' }
  if (system === 'metric' && values['perMetre'] !== undefined) {
    const numbers = `${writer.large(run)} × ${writer.number(ratio * 1000)} mm`
    return { ...step, formula: 'run in metres × fall for each metre', numbers }
  }
  if (system === 'imperial' && values['perFoot'] !== undefined) {
    const numbers = `${writer.large(run)} × ${writer.number(ratio * 12, 4)} in`
    return { ...step, formula: 'run in feet × fall for each foot', numbers }
  }
  const numbers = `${writer.length(run)} × ${writer.number(ratio, 5)}`
  return { ...step, formula: 'run × fall', numbers }
}

/** The worked solution of `fall`. */
export function fallSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const percent = numberOf(outputs, 'percent')
  const ratio = percent / 100
  const beside = wordOf(values, 'besideBuilding')
  const least = writer.show(leastFall(beside) * 100, 'percent')
  const place = beside === 'yes' ? 'within 3 m (10 ft) of a building' : 'in the open'
  return [
    ratioStep(values, ratio, system),
    dropStep(values, ratio, numberOf(outputs, 'drop'), system),
    {
      label: 'Per cent',
      formula: 'fall × 100',
      numbers: `${writer.number(ratio, 5)} × 100`,
      result: writer.show(percent, 'percent'),
      output: 'percent',
    },
    {
      label: 'Angle',
      formula: 'arctan(fall)',
      numbers: `arctan(${writer.number(ratio, 5)})`,
      result: writer.show(numberOf(outputs, 'angle'), 'angle'),
      output: 'angle',
    },
    {
      label: 'Enough to drain',
      formula: `at least ${least} ${place}`,
      numbers: `${writer.show(percent, 'percent')} against ${least}`,
      result: outputs['enoughToDrain'] === 'yes' ? 'Yes, water runs off' : 'No, too flat',
      output: 'enoughToDrain',
    },
  ]
}
