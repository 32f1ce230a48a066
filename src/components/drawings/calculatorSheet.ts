import type { Values } from '../../../shared/calculators/calculator'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import type { Drawing } from './drawing'
import { formatDrawnLength } from './figures'

export type CalculatorSheetSize = 'wide' | 'narrow'

/** What every drawing of a calculator takes. */
export interface CalculatorDrawingProps {
  /** Inputs by name, in SI: metres, radians, cubic metres. */
  values: Values
  /** Results by name, in SI; null while the inputs give none. */
  outputs: Values | null
  system: UnitSystem
  /** Name of the input or output that is being asked for: its figure is a chalk “?”. */
  asked?: string
  /** `auto` picks the layout by the room there is. */
  size?: CalculatorSheetSize | 'auto'
}

export interface CalculatorSheetInput extends CalculatorDrawingProps {
  size: CalculatorSheetSize
}

/** A drawn calculation: the sheet, and what it shows in words. */
export interface CalculatorSheet {
  drawing: Drawing
  words: string
}

/** Draws a calculation, or gives null where its numbers cannot be drawn. */
export type DrawCalculatorSheet = (input: CalculatorSheetInput) => CalculatorSheet | null

/** A figure on the drawing: its text, and whether it is the one asked for. */
export interface Figure {
  text: string
  chalk: boolean
}

/** A positive number by name, from the inputs. */
export function readPositive(values: Values | null, name: string): number | undefined {
  const value = values?.[name]
  return typeof value === 'number' && Number.isFinite(value) && value > 0 ? value : undefined
}

/** A number by name, zero where there is none. */
export function readNumber(values: Values | null, name: string): number {
  const value = values?.[name]
  return typeof value === 'number' && Number.isFinite(value) ? value : 0
}

/** The figure of a named value: a chalk “?” where it is asked for. */
export function figureOf(input: CalculatorSheetInput, name: string, text: string): Figure {
  return input.asked === name ? { text: '?', chalk: true } : { text, chalk: false }
}

/** The figure of a named length in metres. */
export function lengthFigure(input: CalculatorSheetInput, name: string, metres: number): Figure {
  return figureOf(input, name, formatDrawnLength(metres, input.system))
}
