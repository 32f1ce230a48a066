import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, stepWriter } from './values'

const FIRST: Record<string, string> = {
  risePer12: 'rise in 12 ÷ 12',
  degrees: 'tan(degrees)',
  percent: 'per cent ÷ 100',
  ratio: 'rise ÷ run',
  rise: 'rise ÷ run',
}

/** The worked solution of `pitch`. */
export function pitchSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const output = (name: string) => numberOf(outputs, name)
  const given = Object.keys(FIRST).find((name) => values[name] !== undefined) ?? 'ratio'
  const ratio = writer.number(output('ratio'), 4)
  const first: Record<string, () => string> = {
    risePer12: () => `${writer.number(output('risePer12'))} ÷ 12`,
    degrees: () => `tan(${writer.show(output('degrees'), 'angle')})`,
    percent: () => `${writer.number(output('percent'))} ÷ 100`,
    ratio: () => writer.show(output('ratio'), 'ratio', { unit: '1:n' }),
    rise: () =>
      `${writer.length(numberOf(values, 'rise'))} ÷ ${writer.length(numberOf(values, 'run'))}`,
  }
  const said: Step[] = [
    {
      label: 'Degrees',
      formula: 'arctan(ratio)',
      numbers: `arctan(${ratio})`,
      result: writer.show(output('degrees'), 'angle'),
      output: 'degrees',
    },
    {
      label: 'Per cent',
      formula: 'ratio × 100',
      numbers: `${ratio} × 100`,
      result: writer.show(output('percent'), 'percent'),
      output: 'percent',
    },
    {
      label: 'Rise in 12',
      formula: 'ratio × 12',
      numbers: `${ratio} × 12`,
      result: writer.show(output('risePer12'), 'risePer12'),
      output: 'risePer12',
    },
    {
      label: 'Rafter for each unit of run',
      formula: '√(1 + ratio²)',
      numbers: `√(1 + ${ratio}²)`,
      result: writer.show(output('lengthPerRun'), 'ratio'),
      output: 'lengthPerRun',
    },
    {
      label: 'Hip or valley for each unit of common run',
      formula: '√(1 + 1 + ratio²)',
      numbers: `√(2 + ${ratio}²)`,
      result: writer.show(output('hipPerRun'), 'ratio'),
      output: 'hipPerRun',
    },
  ]
  return [
    {
      label: 'Ratio, rise to run',
      formula: FIRST[given] ?? '',
      numbers: `${first[given]?.() ?? ''} = ${ratio}`,
      result: writer.show(output('ratio'), 'ratio', { unit: '1:n' }),
      output: 'ratio',
    },
    ...said.filter((step) => step.output !== given),
  ]
}
