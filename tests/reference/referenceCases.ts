import concreteBatch from './concrete-batch.json'
import lumber from './lumber.json'
import postFooting from './post-footing.json'
import controlJoints from './control-joints.json'
import concreteVolume from './concrete-volume.json'
import corrugatedRoofing from './corrugated-roofing.json'
import drainageFall from './drainage-fall.json'
import fastenersPaint from './fasteners-paint.json'
import mixConsistency from './mix-consistency.json'
import pitchRafter from './pitch-rafter.json'
import safety from './safety.json'
import snowLoad from './snow-load.json'
import squaring from './squaring.json'
import stairs from './stairs.json'

/** One check value from outside the project, in the words and units of its source. */
export interface ReferenceCase {
  id: string
  inputs: Record<string, number | string | undefined>
  expected: number | string | (number | null)[]
  unit: string
  tolerance: number
  source: string
  /** `printed` stands in the source; what is computed from a rule checks arithmetic only. */
  valueOrigin: string
  note: string
}

const files = {
  concreteVolume,
  controlJoints,
  corrugatedRoofing,
  drainageFall,
  fastenersPaint,
  mixConsistency,
  pitchRafter,
  safety,
  snowLoad,
  squaring,
  postFooting,
  concreteBatch,
  stairs,
  lumber,
} as const

/** Every case whose id matches; a pattern that matches none is an error, so that no table runs empty. */
export function findCases(file: keyof typeof files, id: RegExp): ReferenceCase[] {
  const all = files[file] as unknown as ReferenceCase[]
  const found = all.filter((one) => id.test(one.id))
  if (found.length === 0) throw new Error(`No case of ${file} matches ${String(id)}`)
  return found
}

/** A number among the inputs of a case. */
export function given(reference: ReferenceCase, name: string): number {
  const value = reference.inputs[name]
  if (typeof value !== 'number') throw new Error(`${reference.id} gives no ${name}`)
  return value
}

/** The distance from the expected number; what is not a number is endlessly far. */
export const distance = (reference: ReferenceCase, value: number): number =>
  typeof reference.expected === 'number' ? Math.abs(value - reference.expected) : Infinity

/** The tolerance of a case, with what binary arithmetic adds to a number printed exactly. */
export const allowed = (reference: ReferenceCase): number => reference.tolerance + 1e-9
