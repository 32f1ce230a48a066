import { z } from 'zod'
import { ownCalculatorLimits } from '../ownCalculators/limits'

export { OWN_PREFIX } from '../ownCalculators/limits'

/** Names the calculator in every course; with `own:` before it, it is the calculator's id in an exercise. */
export const ownCalculatorKeySchema = z.string().regex(/^[a-z0-9-]{3,36}$/)

/** What an own calculator can measure; a rise in 12 is said as a ratio or an angle. */
export const ownQuantitySchema = z.enum([
  'length',
  'area',
  'volume',
  'angle',
  'ratio',
  'mass',
  'massDensity',
  'pressure',
  'force',
  'count',
  'money',
  'percent',
  'time',
])
export type OwnQuantity = z.infer<typeof ownQuantitySchema>

const text = (most: number) => z.string().trim().max(most, `At most ${most} characters.`)
const nameSchema = text(ownCalculatorLimits.nameCharacters)
const typedSchema = text(80)
const expressionSchema = z
  .string()
  .max(ownCalculatorLimits.expressionCharacters, 'At most 300 characters. Break it in two.')
const typedByName = (most: number) =>
  z
    .record(nameSchema, typedSchema)
    .refine((typed) => Object.keys(typed).length <= most, `At most ${most} names.`)
const perSystem = z.strictObject({ metric: text(40), imperial: text(40) })
const boundSchema = z.number().min(-1e12).max(1e12)

/** An input; `min` and `max` are in SI (angles in radians, percent as the number of per cent, money in hundredths). */
export const ownInputSchema = z.strictObject({
  name: nameSchema,
  label: text(60),
  quantity: ownQuantitySchema,
  help: text(120),
  /** The unit a bare number takes and the field shows; left out, the site unit of the quantity. */
  unit: perSystem.optional(),
  min: boundSchema,
  max: boundSchema,
  initial: perSystem,
  /** May stay empty; in the formulas it then counts as 0. */
  optional: z.boolean().optional(),
})
export type OwnInput = z.infer<typeof ownInputSchema>

/** An output: its expression may use the inputs and the outputs above it. */
export const ownOutputSchema = z.strictObject({
  name: nameSchema,
  label: text(60),
  quantity: ownQuantitySchema,
  unit: perSystem.optional(),
  expression: expressionSchema,
})
export type OwnOutput = z.infer<typeof ownOutputSchema>

/** A known way to get `output` wrong; its expression may use all inputs and all (right) outputs. */
export const ownSlipSchema = z.strictObject({
  id: z.string().regex(/^[a-z0-9-]{1,40}$/),
  title: text(60),
  output: nameSchema,
  expression: expressionSchema,
  sentence: text(160),
  wayBack: text(200),
})
export type OwnSlip = z.infer<typeof ownSlipSchema>

/** One worked example: the inputs as typed in metric or with units, and what must come out, with its unit. */
export const ownExampleSchema = z.strictObject({
  inputs: typedByName(ownCalculatorLimits.inputs),
  expected: typedByName(ownCalculatorLimits.outputs),
})
export type OwnExample = z.infer<typeof ownExampleSchema>

/** A calculator as its instructor writes it; a draft may hold anything within these sizes. */
export const ownCalculatorDefinitionSchema = z.strictObject({
  title: text(60),
  question: text(160),
  help: text(320),
  inputs: z.array(ownInputSchema).max(ownCalculatorLimits.inputs),
  outputs: z.array(ownOutputSchema).max(ownCalculatorLimits.outputs),
  cautions: z
    .array(z.strictObject({ title: text(60), text: text(300) }))
    .max(ownCalculatorLimits.cautions),
  sources: z
    .array(
      z.strictObject({
        title: text(120),
        detail: text(120).optional(),
        kind: z.enum(['published', 'common practice, no source', 'from memory']),
      }),
    )
    .max(ownCalculatorLimits.sources),
  examples: z.array(ownExampleSchema).max(ownCalculatorLimits.examples),
  slips: z.array(ownSlipSchema).max(ownCalculatorLimits.slips),
})
export type OwnCalculatorDefinition = z.infer<typeof ownCalculatorDefinitionSchema>

/** A calculator as a learner gets it: what its fields, steps and formulas need, no examples and no slips. */
export const ownCalculatorSheetSchema = ownCalculatorDefinitionSchema.omit({
  examples: true,
  slips: true,
})
export type OwnCalculatorSheet = z.infer<typeof ownCalculatorSheetSchema>

/** The frozen version of an own calculator that an exercise is made of. */
export const ownSnapshotSchema = z.strictObject({
  key: ownCalculatorKeySchema,
  version: z.number().int().min(1),
  definition: ownCalculatorDefinitionSchema,
})
export type OwnSnapshot = z.infer<typeof ownSnapshotSchema>
/** The same as a learner gets it. */
export const learnerOwnSnapshotSchema = z.object({
  key: ownCalculatorKeySchema,
  version: z.number(),
  definition: ownCalculatorSheetSchema,
})
export type LearnerOwnSnapshot = z.infer<typeof learnerOwnSnapshotSchema>

/** Something that keeps an own calculator from being attached. */
export const ownProblemSchema = z.object({
  /** Dotted path into the definition: `outputs.2.expression`, `inputs.0.name`, `examples.1.expected.weight`, `examples`. */
  path: z.string(),
  /** The output or slip whose expression it is in, else null. */
  output: z.string().nullable(),
  /** The character of the expression at which it stands, counted from 1, else null; `length` characters are meant. */
  column: z.number().nullable(),
  length: z.number(),
  /** What is wrong, then what to do: one sentence each. */
  message: z.string(),
  wayOut: z.string(),
})
export type OwnProblem = z.infer<typeof ownProblemSchema>

const shownSchema = z.object({ metric: z.string(), imperial: z.string() })
/** What was found on checking a definition: it can be attached when there are no problems. */
export const ownCheckSchema = z.object({
  problems: z.array(ownProblemSchema),
  /** For each example what each output gives, by name; null where something above must be mended first. */
  examples: z.array(
    z.record(
      z.string(),
      z.object({ shown: shownSchema, agrees: z.boolean().nullable() }).nullable(),
    ),
  ),
})
export type OwnCheck = z.infer<typeof ownCheckSchema>

const versionSchema = z.number().int().min(1)
const courseSchema = z.object({ id: z.number(), title: z.string() })

/** One row of a course's own calculators. */
export const ownCalculatorRowSchema = z.object({
  key: ownCalculatorKeySchema,
  title: z.string(),
  question: z.string(),
  /** The newest version that can be attached, or null while there is none. */
  attachable: z.number().nullable(),
  /** The draft says something else than that version. */
  hasUnkept: z.boolean(),
  /** Stops it is attached to, in all revisions of the course. */
  stops: z.number(),
  savedAt: z.iso.datetime(),
})
export type OwnCalculatorRow = z.infer<typeof ownCalculatorRowSchema>

/** One own calculator as its staff see it. */
export const ownCalculatorSchema = ownCalculatorRowSchema.omit({ attachable: true }).extend({
  course: courseSchema,
  /** To send with the next save. */
  version: versionSchema,
  definition: ownCalculatorDefinitionSchema,
  check: ownCheckSchema,
  /** What goes into an exercise as `own`, or null while no version can be attached. */
  attachable: ownSnapshotSchema.nullable(),
  can: z.object({ edit: z.boolean(), remove: z.boolean() }),
})
export type OwnCalculator = z.infer<typeof ownCalculatorSchema>

export const createOwnCalculatorSchema = z.strictObject({
  definition: ownCalculatorDefinitionSchema,
})
export type CreateOwnCalculator = z.infer<typeof createOwnCalculatorSchema>

export const changeOwnCalculatorSchema = z.strictObject({
  version: versionSchema,
  definition: ownCalculatorDefinitionSchema,
  /** True keeps it as a new version that can be attached; 409 `not-attachable` with the check while it has problems. */
  keepsVersion: z.boolean(),
})
export type ChangeOwnCalculator = z.infer<typeof changeOwnCalculatorSchema>

/** A version that was kept; it never changes. */
export const ownCalculatorVersionSchema = z.object({
  version: versionSchema,
  definition: ownCalculatorDefinitionSchema,
  createdAt: z.iso.datetime(),
  /** Stops that are made of this version. */
  stops: z.number(),
})
export type OwnCalculatorVersion = z.infer<typeof ownCalculatorVersionSchema>

/** A calculator of another course on whose staff one is, to be copied. */
export const copyableOwnCalculatorSchema = z.object({
  course: courseSchema,
  key: ownCalculatorKeySchema,
  title: z.string(),
  question: z.string(),
  attachable: z.number().nullable(),
})
export type CopyableOwnCalculator = z.infer<typeof copyableOwnCalculatorSchema>

export const copyOwnCalculatorSchema = z.strictObject({
  fromCourseId: z.number().int().positive(),
  key: ownCalculatorKeySchema,
})
export type CopyOwnCalculator = z.infer<typeof copyOwnCalculatorSchema>
