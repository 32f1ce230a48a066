import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { findEnds, topFall } from './postsOnFallLengths'
import { listOf, numberOf, stepWriter } from './values'

/** The longest or the shortest post: how far surface and top have sunk where it stands. */
function endSteps(
  values: Values,
  outputs: Values,
  system: UnitSystem,
  name: 'longest' | 'shortest',
): Step[] {
  const { length, show, number } = stepWriter(system)
  const slope = { unit: system === 'metric' ? 'mm/m' : 'in/ft' }
  const at = findEnds(values)[name]
  const roof = topFall(values)
  const lower = length(at * numberOf(values, 'fall'))
  const moved = length(at * Math.abs(roof))
  const [sign, way] = roof > 0 ? ['−', 'lower'] : ['+', 'higher']
  const top: Step = {
    label: `Top ${way} there`,
    formula: 'from the high edge × tan(pitch)',
    numbers: `${length(at)} × ${number(Math.abs(roof), 4)}`,
    result: moved,
  }
  return [
    {
      label: `Surface lower at the ${name} post`,
      formula: 'from the high edge × fall',
      numbers: `${length(at)} × ${show(numberOf(values, 'fall'), 'ratio', slope)}`,
      result: lower,
    },
    ...(roof === 0 ? [] : [top]),
    {
      label: name === 'longest' ? 'Longest post' : 'Shortest post',
      formula: `top + surface lower${roof === 0 ? '' : ` ${sign} top ${way}`}`,
      numbers: `${length(numberOf(values, 'topHeight'))} + ${lower}${roof === 0 ? '' : ` ${sign} ${moved}`}`,
      result: length(numberOf(outputs, name)),
      output: name,
    },
  ]
}

/** The row of all lengths. */
function listStep(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const write = (metres: number) => stepWriter(system).length(metres)
  return [
    {
      label: 'Posts, in order',
      formula: 'the same for every post',
      numbers: `at ${listOf(values, 'positions').map(write).join('; ')}`,
      result: listOf(outputs, 'lengths').map(write).join('; '),
      output: 'lengths',
    },
  ]
}

/** The worked solution of `posts-on-fall`: the ends first, for the row tells them. */
export function postsOnFallSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const { length } = stepWriter(system)
  const output = (name: string) => length(numberOf(outputs, name))
  return [
    ...endSteps(values, outputs, system, 'longest'),
    ...endSteps(values, outputs, system, 'shortest'),
    {
      label: 'They differ by',
      formula: 'longest − shortest',
      numbers: `${output('longest')} − ${output('shortest')}`,
      result: output('difference'),
      output: 'difference',
    },
    ...listStep(values, outputs, system),
  ]
}
