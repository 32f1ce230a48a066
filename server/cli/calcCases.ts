import { z } from 'zod'
import type { CommandResult } from './calc'
import { computeInputs, jsonUnit } from './calcJson'
import type { Calculator } from '../../shared/calculators/calculator'
import { findCalculator } from '../../shared/calculators/index'
import { findUnit } from '../../shared/units/unit'

const caseSchema = z.object({
  id: z.string(),
  calculator: z.string(),
  inputs: z.record(z.string(), z.unknown()),
  expected: z.record(z.string(), z.union([z.number(), z.string(), z.boolean()])),
  /** Of the expected numbers and the tolerance; left out, the unit of plain numbers in JSON. */
  unit: z.string().optional(),
  tolerance: z.number().min(0),
  source: z.string().optional(),
})
type Case = z.infer<typeof caseSchema>

/** Checks an array of cases; prints each that falls outside its tolerance, closes with the count. */
export function checkCases(json: string): CommandResult {
  const parsed: unknown = JSON.parse(json)
  const entries: unknown[] = Array.isArray(parsed) ? parsed : [parsed]
  const failures = entries.flatMap((entry, index) => {
    const read = caseSchema.safeParse(entry)
    if (!read.success) {
      const issue = read.error.issues[0]
      const place = issue?.path.map(String).join('.') ?? ''
      return [`case ${String(index + 1)}: ${place} ${issue?.message ?? 'is not a case'}`]
    }
    const problems = checkCase(read.data)
    const { id, source } = read.data
    return problems.length === 0
      ? []
      : [`${id}: ${problems.join('; ')}${source === undefined ? '' : ` (${source})`}`]
  })
  const passed = entries.length - failures.length
  const closing = `${String(passed)} passed, ${String(failures.length)} failed`
  return { text: [...failures, closing].join('\n'), exitCode: failures.length === 0 ? 0 : 1 }
}

function checkCase({ calculator: id, inputs, expected, unit, tolerance }: Case): string[] {
  const calculator = findCalculator(id)
  if (!calculator) return [`there is no calculator “${id}”`]
  const result = computeInputs(calculator, inputs)
  if ('error' in result) return [`${result.error.input}: ${result.error.message}`]
  if (Object.keys(expected).length === 0) return ['nothing is expected']
  return Object.entries(expected).flatMap(([name, wanted]) => {
    const output = result.outputs[name]
    if (output === undefined) return [`${name} is no answer of ${id} with these inputs`]
    if (typeof wanted !== 'number') {
      const given = typeof wanted === 'boolean' ? (wanted ? 'yes' : 'no') : wanted
      return output.value === given
        ? []
        : [`${name} expected ${given}, got ${String(output.value)}`]
    }
    const scale = scaleOf(calculator, name, unit)
    if (scale === undefined) return [`${name} is never in “${unit ?? ''}”`]
    const got = Number(output.value) / scale
    const isWithin = Math.abs(got - wanted) <= tolerance + 1e-12 * Math.abs(wanted)
    return isWithin
      ? []
      : [`${name} expected ${String(wanted)} ± ${String(tolerance)}, got ${String(got)}`]
  })
}

/** JSON units in one of the case's unit; undefined where the unit measures something else. */
function scaleOf(
  calculator: Calculator,
  name: string,
  unit: string | undefined,
): number | undefined {
  const output = calculator.outputs.find((candidate) => candidate.name === name)
  if (!output || output.quantity === 'choice') return undefined
  if (unit === undefined || unit === '' || unit === 'SI' || unit === jsonUnit(output)) return 1
  const wanted = findUnit(output.quantity, unit)
  if (wanted) return output.quantity === 'angle' ? (wanted.factor * 180) / Math.PI : wanted.factor
  return output.quantity === 'count' || output.quantity === 'ratio' ? 1 : undefined
}
