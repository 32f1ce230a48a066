import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { readLidSnow } from './lidSnow'
import { GRAVITY } from './snowCover'
import { snowDensityStep } from './snowDensityStep'
import { numberOf, optionalNumber, stepWriter } from './values'

/** The worked solution of `lid`. */
export function lidSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const depth = numberOf(values, 'depth')
  const handle = writer.length(numberOf(values, 'handleDistance'))
  const half = writer.length(depth / 2)
  const weight = numberOf(values, 'weight')
  const lift = (label: string, mass: number, output: string): Step => ({
    label,
    formula: 'pull down × half the depth ÷ from the hinge to the handle',
    numbers: `${writer.show(mass * GRAVITY, 'force')} × ${half} ÷ ${handle}`,
    result: writer.show(numberOf(outputs, output), 'force'),
    output,
  })
  const snowWeight = numberOf(outputs, 'snowWeight')
  return [
    {
      label: 'Where the weight pulls',
      formula: 'depth ÷ 2',
      numbers: `${writer.length(depth)} ÷ 2`,
      result: half,
    },
    pullDown('The lid pulls down', weight, system),
    lift('Pull to lift it', weight, 'liftForce'),
    ...snowSteps(values, outputs, system),
    pullDown('Lid and snow pull down', weight + snowWeight, system, [weight, snowWeight]),
    lift('Pull to lift it under snow', weight + snowWeight, 'liftForceWithSnow'),
  ]
}

/** What a mass, or several together, pull down with. */
function pullDown(label: string, mass: number, system: UnitSystem, parts = [mass]): Step {
  const writer = stepWriter(system)
  const sum = parts.map((part) => writer.show(part, 'mass')).join(' + ')
  const metric = system === 'metric'
  return {
    label,
    formula: metric ? 'weight in kg × 9.81' : 'a pound pulls with a pound',
    numbers: metric ? `${parts.length > 1 ? `(${sum})` : sum} × 9.81` : sum,
    result: writer.show(mass * GRAVITY, 'force'),
  }
}

function snowSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const snow = readLidSnow(values)
  const writer = stepWriter(system)
  const result = writer.show(numberOf(outputs, 'snowWeight'), 'mass')
  const step = { label: 'Weight of the snow', result, output: 'snowWeight' }
  if (!snow) return [{ ...step, formula: 'no snow', numbers: 'none given' }]
  const unit = system === 'metric' ? 'm' : 'ft'
  const sides = ['depth', 'width']
    .map((name) => `${writer.large(numberOf(values, name))} ${unit}`)
    .join(' × ')
  if (optionalNumber(values, 'snowDepth') === undefined) {
    const load = writer.show(snow.load, 'pressure')
    const numbers = system === 'metric' ? `${sides} × ${load} × 1000 ÷ 9.81` : `${sides} × ${load}`
    return [{ ...step, formula: 'depth × width × ground snow load', numbers }]
  }
  const dense = writer.show(snow.density, 'massDensity')
  const ground = optionalNumber(values, 'groundSnowLoad')
  return [
    ...(ground === undefined ? [] : [snowDensityStep(ground, system)]),
    {
      ...step,
      formula: 'depth × width × depth of snow × how dense',
      numbers: `${sides} × ${writer.large(snow.depth)} ${unit} × ${dense}`,
    },
  ]
}
