import type { OwnCalculatorSheet } from '../contracts/ownCalculators'

type Worked = Pick<OwnCalculatorSheet, 'inputs' | 'outputs'>
type Sentences = [message: string, wayOut: string]

/** Why output number `index` cannot use this name: it is further down, goes round in a circle, or is nowhere. */
export function explainUnknown(
  name: string,
  { inputs, outputs }: Worked,
  index: number,
): Sentences {
  const own = outputs[index]?.name
  if (name === own) {
    return [`${name} is worked out from itself.`, 'Use the inputs and the outputs above it.']
  }
  if (own !== undefined && outputs.slice(index + 1).some((output) => output.name === name)) {
    return leadsTo(name, own, outputs)
      ? [`${own} and ${name} are each worked out from the other.`, 'One of them must do without.']
      : [`${name} is worked out further down.`, `Move ${name} above ${own}.`]
  }
  const names = [...inputs, ...outputs.slice(0, index)].map((one) => one.name).filter(Boolean)
  const near = names.find((known) => countEdits(known.toLowerCase(), name.toLowerCase()) <= 2)
  if (near !== undefined) return [`Nothing is called ${name}.`, `Did you mean ${near}?`]
  return [`Nothing is called ${name}.`, `You can use ${listNames(names)}.`]
}

/** True when the formula of `from` uses `target`, itself or through other outputs. */
function leadsTo(from: string, target: string, outputs: OwnCalculatorSheet['outputs']): boolean {
  const seen = new Set<string>()
  const open = [from]
  for (let name = open.pop(); name !== undefined; name = open.pop()) {
    if (name === target) return true
    if (seen.has(name)) continue
    seen.add(name)
    const found = outputs.find((output) => output.name === name)
    open.push(...(found?.expression.match(/[A-Za-z][A-Za-z0-9_]*/g) ?? []))
  }
  return false
}

function listNames(names: string[]): string {
  if (names.length < 2) return names[0] ?? 'numbers and units'
  return `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`
}

/** How many letters must be changed, added or taken out (Levenshtein's distance); names are short. */
function countEdits(a: string, b: string): number {
  if (Math.min(a.length, b.length) < 3) return a === b ? 0 : 9
  let row = Array.from({ length: b.length + 1 }, (_, index) => index)
  for (const [at, letter] of Array.from(a).entries()) {
    const next = [at + 1]
    for (const [index, other] of Array.from(b).entries()) {
      const kept = (row[index] ?? 0) + (letter === other ? 0 : 1)
      next.push(Math.min(kept, (row[index + 1] ?? 0) + 1, (next[index] ?? 0) + 1))
    }
    row = next
  }
  return row.at(-1) ?? 9
}
