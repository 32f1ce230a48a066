import type { Calculator, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { jointsCautions, jointsSources } from './jointsSources'
import { jointsSlips } from './jointsSlips'
import { jointsSteps } from './jointsSteps'
import { depthAtLeast, factorOf, MOST_ASPECT, MOST_SPACING, mixChoices } from './jointsRules'
import { numberOf, wordOf } from './values'
import { roundUp } from '../units/number'

/** Panels along and across: no wider than the spacing, then cut again until none is too long for its width. */
function countPanels(length: number, width: number, maxSpacing: number): [number, number] {
  let long = roundUp(length / maxSpacing)
  let wide = roundUp(width / maxSpacing)
  const aspect = () => length / long / (width / wide)
  while (aspect() > MOST_ASPECT + 1e-9) long += 1
  while (1 / aspect() > MOST_ASPECT + 1e-9) wide += 1
  return [long, wide]
}

function compute(values: Values, system: UnitSystem): Values {
  const length = numberOf(values, 'length')
  const width = numberOf(values, 'width')
  const thickness = numberOf(values, 'thickness')
  const maxSpacing = Math.min(factorOf(wordOf(values, 'mix')) * thickness, MOST_SPACING)
  const [panelsLong, panelsWide] = countPanels(length, width, maxSpacing)
  return {
    maxSpacing,
    panelsLong,
    panelsWide,
    panelLength: length / panelsLong,
    panelWidth: width / panelsWide,
    jointDepth: Math.max(thickness / 4, depthAtLeast[system]),
  }
}

/**
 * Control joints: farthest apart = 24 to 36 × thickness by the mix, at most 18 ft; panels = side ÷ spacing, rounded up,
 * none longer than 1.5 times its width; depth = thickness ÷ 4, at least 25 mm or 1 in. In m.
 * 7 × 4 m, 120 mm thick, factor 24: 2.88 m, so 3 × 2 panels of 2333 × 2000 mm, cut 30 mm deep.
 */
export const joints: Calculator = {
  id: 'joints',
  version: 1,
  title: 'Joints: where it may crack',
  question: 'Where do I cut, so that it cracks where I choose?',
  help: 'Concrete shrinks as it dries, and a slab that shrinks will crack. You cannot stop it, but you can choose the place: a groove a quarter of the way down, made the same day, and the crack hides in it. Near-square panels crack least.',
  inputs: [
    {
      name: 'length',
      label: 'Length',
      quantity: 'length',
      help: 'Inside face to inside face of the form.',
      initial: { metric: '5000', imperial: "16'" },
      min: 0.3,
      max: 30,
    },
    {
      name: 'width',
      label: 'Width',
      quantity: 'length',
      initial: { metric: '3000', imperial: "10'" },
      min: 0.3,
      max: 30,
    },
    {
      name: 'thickness',
      label: 'Thickness',
      quantity: 'length',
      help: 'At the thinnest place.',
      initial: { metric: '100', imperial: '4"' },
      min: 0.05,
      max: 0.3,
    },
    {
      name: 'mix',
      label: 'The mix',
      quantity: 'choice',
      help: 'Not sure: bagged.',
      initial: { metric: 'small-stone', imperial: 'small-stone' },
      choices: mixChoices,
    },
  ],
  outputs: [
    { name: 'maxSpacing', label: 'Joints, at most apart', quantity: 'length' },
    { name: 'panelsLong', label: 'Panels along the length', quantity: 'count' },
    { name: 'panelsWide', label: 'Panels across the width', quantity: 'count' },
    { name: 'panelLength', label: 'One panel is long', quantity: 'length' },
    { name: 'panelWidth', label: 'One panel is wide', quantity: 'length' },
    { name: 'jointDepth', label: 'Cut, at least deep', quantity: 'length' },
  ],
  compute,
  steps: jointsSteps,
  slips: jointsSlips,
  cautions: jointsCautions,
  sources: jointsSources,
  example: {
    inputs: { length: '7 m', width: '4 m', thickness: '120 mm' },
    outputs: {
      maxSpacing: 2.88,
      panelsLong: 3,
      panelsWide: 2,
      panelLength: 2.33333,
      panelWidth: 2,
      jointDepth: 0.03,
    },
  },
}
