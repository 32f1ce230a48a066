import type { CalculatorRun } from '../calculators/runCalculator'
import type { OwnCalculatorSheet, OwnCheck } from '../contracts/ownCalculators'

/** One sentence for whoever meets a formula that was ended. */
export const tookTooLong = 'The formula took too long to work out.'

/** The run of a calculator that was ended: one sentence at its first input. */
export const endedRun = (
  { inputs }: Pick<OwnCalculatorSheet, 'inputs'>,
  sentence: string,
): CalculatorRun => ({
  ok: false,
  values: {},
  errors: { [inputs[0]?.name ?? 'answer']: sentence },
})

/** The check of a definition that was ended. */
export const endedCheck = (sentence: string): OwnCheck => ({
  problems: [
    {
      path: 'outputs',
      output: null,
      column: null,
      length: 0,
      message: sentence,
      wayOut: 'Shorten the formulas.',
    },
  ],
  examples: [],
})
