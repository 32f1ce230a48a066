import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { depthAtLeast, factorOf, MOST_ASPECT, MOST_SPACING } from './jointsRules'
import { numberOf, stepWriter, wordOf } from './values'

/** The worked solution of `joints`. */
export function jointsSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const { length, number } = stepWriter(system)
  const value = (name: string) => numberOf(values, name)
  const output = (name: string) => numberOf(outputs, name)
  const factor = factorOf(wordOf(values, 'mix'))
  const thickness = length(value('thickness'))
  const least = length(depthAtLeast[system])
  const spacing = output('maxSpacing')
  const panels = (name: string, side: string, other: string): Step => {
    const label = side === 'length' ? 'Panels along the length' : 'Panels across the width'
    const parts = value(side) / spacing
    const isCutAgain = output(name) > Math.ceil(parts - 1e-9)
    return {
      label,
      formula: isCutAgain
        ? `${side} ÷ spacing, up to whole ones, then more until no panel is over ${number(MOST_ASPECT)} times its ${other}`
        : `${side} ÷ spacing, up to whole ones`,
      numbers: `${length(value(side))} ÷ ${length(spacing)} = ${number(parts)}`,
      result: number(output(name)),
      output: name,
    }
  }
  const panel = (name: string, side: string, count: string, label: string): Step => ({
    label,
    formula: `${side} ÷ panels`,
    numbers: `${length(value(side))} ÷ ${number(output(count))}`,
    result: length(output(name)),
    output: name,
  })
  return [
    {
      label: 'Joints, at most apart',
      formula: `${String(factor)} × thickness, at most ${length(MOST_SPACING)}`,
      numbers: `${String(factor)} × ${thickness}`,
      result: length(spacing),
      output: 'maxSpacing',
    },
    panels('panelsLong', 'length', 'width'),
    panels('panelsWide', 'width', 'length'),
    panel('panelLength', 'length', 'panelsLong', 'One panel is long'),
    panel('panelWidth', 'width', 'panelsWide', 'One panel is wide'),
    {
      label: 'Cut, at least deep',
      formula: `thickness ÷ 4, at least ${least}`,
      numbers: `${thickness} ÷ 4`,
      result: length(output('jointDepth')),
      output: 'jointDepth',
    },
  ]
}
