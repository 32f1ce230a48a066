import type { Step, Values } from './calculator'
import type { UnitSystem } from '../contracts/exercises'
import { listOf, numberOf, stepWriter, wordOf } from './values'

/** The worked solution of `boards`. */
export function boardsSteps(values: Values, outputs: Values, system: UnitSystem): Step[] {
  const writer = stepWriter(system)
  const count = writer.number(numberOf(outputs, 'count'))
  const gap = writer.length(numberOf(outputs, 'gap'))
  const isEven = wordOf(values, 'mode') === 'even-gap'
  const counted = isEven ? countEvenly(values, writer) : countFixed(values, writer)
  return [
    { ...counted.count, label: 'Boards', result: count, output: 'count' },
    {
      ...counted.gap(count),
      label: 'Gap',
      result: gap,
      output: 'gap',
    },
    {
      ...counted.last(count),
      label: 'Last board, ripped to',
      result: writer.length(numberOf(outputs, 'lastRip')),
      output: 'lastRip',
    },
    markStep(outputs, writer, `${writer.length(numberOf(values, 'boardWidth'))} + ${gap}`),
  ]
}

/** How the marks follow from each other. */
function markStep(outputs: Values, writer: Writer, step: string): Step {
  const marks = listOf(outputs, 'marks').map((mark) => writer.length(mark))
  return {
    label: 'Marks on the stick, near edge of each board',
    formula: 'from the first mark on, a board and a gap each time',
    numbers: `${marks[0] ?? ''}, then ${step} each`,
    result: marks.join('; '),
    output: 'marks',
  }
}

type Writer = ReturnType<typeof stepWriter>
type Line = Pick<Step, 'formula' | 'numbers'>
interface Lines {
  count: Line
  gap: (count: string) => Line
  last: (count: string) => Line
}

const isGapAtEnds = (values: Values) => wordOf(values, 'ends') === 'gap'

function countFixed(values: Values, writer: Writer): Lines {
  const [opening, width, gap] = ['opening', 'boardWidth', 'gap'].map((name) =>
    writer.plain(numberOf(values, name)),
  ) as [string, string, string]
  const room = isGapAtEnds(values) ? `(${opening} − 2 × ${gap})` : opening
  const inWords = isGapAtEnds(values) ? '(opening − 2 × gap)' : 'opening'
  return {
    count: {
      formula: `${inWords} ÷ (board + gap), up to a whole board`,
      numbers: `${room} ÷ (${width} + ${gap})`,
    },
    gap: () => ({ formula: 'as you chose', numbers: gap }),
    last: (count) => ({
      formula: `${inWords} − (boards − 1) × (board + gap), at most a whole board`,
      numbers: `${room} − (${count} − 1) × (${width} + ${gap})`,
    }),
  }
}

function countEvenly(values: Values, writer: Writer): Lines {
  const [opening, width, gap] = ['opening', 'boardWidth', 'gap'].map((name) =>
    writer.plain(numberOf(values, name)),
  ) as [string, string, string]
  const sign = isGapAtEnds(values) ? '−' : '+'
  const gaps = isGapAtEnds(values) ? '+ 1' : '− 1'
  return {
    count: {
      formula: `(opening ${sign} gap) ÷ (board + gap), to the whole number whose gap is nearest`,
      numbers: `(${opening} ${sign} ${gap}) ÷ (${width} + ${gap})`,
    },
    gap: (count) => ({
      formula: `(opening − boards × board) ÷ (boards ${gaps})`,
      numbers: `(${opening} − ${count} × ${width}) ÷ (${count} ${gaps})`,
    }),
    last: () => ({ formula: 'whole, like all others', numbers: width }),
  }
}
