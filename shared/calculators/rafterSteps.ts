import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { numberOf, optionalNumber, stepWriter, wordOf } from './values'

/** The worked solution of `rafter`. */
export function rafterSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const input = (name: string) => writer.plain(optionalNumber(values, name) ?? 0)
  const length = (name: string) => writer.length(numberOf(outputs, name))
  const ratio = numberOf(values, 'pitch') / 12
  const shown = writer.number(ratio, 4)
  const slope = writer.number(Math.hypot(1, ratio), 4)
  const plumb = writer.show(numberOf(outputs, 'plumbCut'), 'angle')
  return [
    {
      label: 'Rise over run',
      formula: 'rise in 12 ÷ 12',
      numbers: `${writer.number(12 * ratio)} ÷ 12`,
      result: shown,
    },
    {
      label: 'Rise',
      formula: 'run × ratio',
      numbers: `${input('run')} × ${shown}`,
      result: length('rise'),
      output: 'rise',
    },
    {
      label: 'Along the slope for each 1 of run',
      formula: '√(1 + ratio²)',
      numbers: `√(1 + ${shown}²)`,
      result: slope,
    },
    {
      label: 'Plate to middle of ridge, along the slope',
      formula: 'run × that',
      numbers: `${input('run')} × ${slope}`,
      result: length('lineLength'),
      output: 'lineLength',
    },
    {
      label: 'Rafter in all, tail to ridge',
      formula: '(run − half the ridge + overhang) × that',
      numbers: `(${input('run')} − ${input('ridge')} ÷ 2 + ${input('overhang')}) × ${slope}`,
      result: length('totalLength'),
      output: 'totalLength',
    },
    {
      label: 'Plumb cut, off square',
      formula: 'arctan(ratio)',
      numbers: `arctan(${shown})`,
      result: plumb,
      output: 'plumbCut',
    },
    {
      label: 'Level cut, off square',
      formula: '90° − plumb cut',
      numbers: `90° − ${plumb}`,
      result: writer.show(numberOf(outputs, 'levelCut'), 'angle'),
      output: 'levelCut',
    },
    {
      label: 'Heel cut, straight up',
      formula: 'seat × ratio',
      numbers: `${input('seat')} × ${shown}`,
      result: length('heelCut'),
      output: 'heelCut',
    },
    {
      label: 'Notch, square into the rafter',
      formula: 'seat × sin(plumb cut)',
      numbers: `${input('seat')} × sin(${plumb})`,
      result: length('birdsmouthDepth'),
      output: 'birdsmouthDepth',
    },
    {
      label: 'Notch no deeper than a third',
      formula: 'notch against depth ÷ 3',
      numbers: `${length('birdsmouthDepth')} against ${input('depth')} ÷ 3`,
      result: wordOf(outputs, 'notchFits') === 'yes' ? 'Yes' : 'No',
      output: 'notchFits',
    },
  ]
}
