import type { UnitSystem } from '../contracts/exercises'

/**
 * What a number measures; decides its SI unit, its parser and how it is shown.
 * Not SI, because nobody thinks so: `percent` is the number of per cent, `risePer12` the rise over a run of 12,
 * `money` the number of hundredths.
 */
export type Quantity =
  | 'length'
  | 'area'
  | 'volume'
  | 'angle'
  | 'ratio'
  | 'risePer12'
  | 'mass'
  | 'massDensity'
  | 'pressure'
  | 'force'
  | 'count'
  | 'money'
  | 'percent'
  | 'time'

/** One value of an input or output: a number in SI (angles in radians), a row of them, or a word such as a bag or a verdict. */
export type Value = number | string | boolean | readonly number[]
export type Values = Record<string, Value | undefined>

interface InputBase {
  name: string
  label: string
  /** One line under the field: what to measure, or why. */
  help?: string
  /** May stay empty; `compute` then gets undefined. */
  optional?: boolean
  /** Left out of a call, it takes its initial value (waste, a tolerance); an emptied field is still an error. */
  assumed?: boolean
  /** Default as text, one for each system, so that it reads round in both; empty where nothing is assumed. */
  initial: Record<UnitSystem, string>
}
/** An input that is measured, bounded in SI. */
export interface QuantityInput extends InputBase {
  quantity: Quantity
  /** The unit a bare number takes and the field shows; default the site unit of the quantity (mm, in). */
  unit?: Record<UnitSystem, string>
  /** A row of numbers, written with semicolons between them; each keeps the bounds. */
  isList?: boolean
  min: number
  max: number
}
/** An input that is chosen from words. */
export interface ChoiceInput extends InputBase {
  quantity: 'choice'
  choices: { value: string; label: string }[]
}
export type CalculatorInput = QuantityInput | ChoiceInput

export interface CalculatorOutput {
  name: string
  label: string
  quantity: Quantity | 'choice'
  /** The words a `choice` output can take. */
  choices?: { value: string; label: string }[]
  /** Lengths read on site in mm or along a run in m; default `site`. */
  scale?: 'site' | 'run'
  /** The unit it is shown in and a bare answer takes, where `scale` does not say it (L and qt for water). */
  unit?: Record<UnitSystem, string>
  /** A row of numbers, such as the marks along a board; it is shown, never asked for. */
  isList?: boolean
}

/** One line of the worked solution. */
export interface Step {
  label: string
  formula: string
  /** The formula with the learner's numbers put in. */
  numbers: string
  result: string
  /** The output this step gives; its result is hidden while that output is asked for. */
  output?: string
}

/** A known way to get a number wrong. */
export interface Slip {
  id: string
  title: string
  /** The output this slip spoils. */
  output: string
  /**
   * The wrong value it gives, in the output's SI unit (or the wrong word of a choice); undefined where it cannot happen.
   * The system decides what a forgotten unit would have been: mm or in.
   */
  wrong: (values: Values, outputs: Values, system: UnitSystem) => number | string | undefined
  /** One sentence that names the slip; it never contains the right number. */
  sentence: string
  /** One plain sentence: the way back. */
  wayBack: string
}

export interface Caution {
  title: string
  text: string
}
export interface Source {
  title: string
  /** Edition and section or table. */
  detail?: string
  kind: 'published' | 'common practice, no source' | 'from memory'
}

/** One calculator: the only place where its numbers are computed. */
export interface Calculator {
  id: string
  version: number
  title: string
  /** One plain sentence: the question it answers on site. */
  question: string
  /** Why it matters on site, in plain words; at most five lines of a phone, 320 characters. */
  help: string
  inputs: CalculatorInput[]
  outputs: CalculatorOutput[]
  /**
   * Pure; SI in, SI out; throws CalculatorInputError when inputs contradict each other.
   * The system only says in which whole steps the trade buys or marks (0.1 m³ or 1/4 yd³, 50 mm or 1 in).
   */
  compute: (values: Values, system: UnitSystem) => Values
  steps: (values: Values, outputs: Values, system: UnitSystem) => Step[]
  slips: Slip[]
  cautions: Caution[]
  sources: Source[]
  /** Checked by a test, in metric; numbers to six significant figures. */
  example: { inputs: Record<string, string>; outputs: Record<string, Value> }
}

/** Says which input cannot be used and why, in a sentence a person can act on. */
export class CalculatorInputError extends Error {
  constructor(
    readonly input: string,
    message: string,
  ) {
    super(message)
    this.name = 'CalculatorInputError'
  }
}
