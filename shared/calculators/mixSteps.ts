import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { findBag } from './bags'
import { CEMENT_SHARE, RIGHT_SLUMP, slumpClasses } from './slump'
import { numberOf, optionalNumber, stepWriter, wordOf } from './values'

const verdicts: Record<string, string> = { stiff: 'Too stiff', right: 'Right', wet: 'Too wet' }

/** The worked solution of `mix`. */
export function mixSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const liquid = { unit: system === 'metric' ? 'L' : 'qt' }
  const bag = findBag(wordOf(values, 'bag'))
  const added = numberOf(values, 'waterAdded')
  const slump = optionalNumber(values, 'slump')
  const waterText = (value: number) => writer.show(value, 'volume', liquid)
  const limit = (label: string, name: 'waterMin' | 'waterMax', own: string): Step => ({
    label,
    formula: values[own] === undefined ? 'usual for this bag' : 'as your bag says',
    numbers: bag.value,
    result: waterText(numberOf(outputs, name)),
    output: name,
  })
  const cone: Step[] =
    slump === undefined
      ? []
      : [
          {
            label: 'Slump class',
            formula: 'EN 206, to the nearest 10 mm',
            numbers: writer.length(slump),
            result: slumpClasses.find(({ value }) => value === outputs['slumpClass'])?.label ?? '',
            output: 'slumpClass',
          },
        ]
  const range = `${waterText(numberOf(outputs, 'waterMin'))} to ${waterText(numberOf(outputs, 'waterMax'))}`
  const right = `${writer.length(RIGHT_SLUMP.least / 1000)} to ${writer.length(RIGHT_SLUMP.most / 1000)}`
  return [
    limit('Water a bag, at least', 'waterMin', 'bagWaterMin'),
    limit('Water a bag, at most', 'waterMax', 'bagWaterMax'),
    {
      label: 'Water to cement, about',
      formula: `weight of water ÷ (weight of bag × ${writer.number(CEMENT_SHARE)})`,
      numbers: `${writer.show(added * 1000, 'mass')} ÷ (${writer.show(bag.mass, 'mass')} × ${writer.number(CEMENT_SHARE)})`,
      result: writer.show(numberOf(outputs, 'waterCementRatio'), 'ratio'),
      output: 'waterCementRatio',
    },
    ...cone,
    {
      label: 'The mix is',
      formula:
        slump === undefined
          ? `right from ${range}`
          : `never over ${waterText(numberOf(outputs, 'waterMax'))}; right from ${right} of slump`,
      numbers:
        slump === undefined ? waterText(added) : `${waterText(added)}, ${writer.length(slump)}`,
      result: verdicts[wordOf(outputs, 'verdict')] ?? '',
      output: 'verdict',
    },
  ]
}
