import {
  dressedSize,
  nominalChoices,
  readNominal,
} from '../../../shared/calculators/lumberSizeTables'
import type { UnitSystem } from '../../../shared/contracts/exercises'
import type { CutRequest } from '../../../shared/cutlist/cutRequest'

const MM_IN_INCH = 25.4

/** What each named size measures dry, in whole millimetres: 2x4 is 38×89. */
const measuredOfName = new Map(
  nominalChoices.map(({ value }) => {
    const { thickness, width } = dressedSize(readNominal(value), false)
    const sides = [thickness, width].map((inches) => Math.round(inches * MM_IN_INCH))
    return [value, sides.join('×')] as const
  }),
)
const nameOfMeasured = new Map([...measuredOfName].map(([name, measured]) => [measured, name]))

/** One spelling for `2 x 4`, `2×4` and `2X4`. */
const tidy = (text: string) =>
  text
    .trim()
    .toLowerCase()
    .replace(/["”″]/g, '')
    .replace(/\s+/g, ' ')
    .replace(/(\d) ?[x×*] ?(?=\d)/g, '$1×')

/**
 * The section that a text names, the same for every way to write it. Only in feet and inches is 2x4 the named
 * size that measures 38×89.
 */
export function sectionOf(text: string, system: UnitSystem): string {
  const section = tidy(text)
  const measured = measuredOfName.get(section.replace('×', 'x'))
  return system === 'imperial' && measured ? measured : section
}

/** A section as a yard of that system calls it. */
export function showSection(section: string, system: UnitSystem): string {
  return (system === 'imperial' ? nameOfMeasured.get(section) : undefined) ?? section
}

/** A sentence about a list with its sections called as a yard of that system calls them. */
export function nameSections(
  sentence: string,
  { parts }: Pick<CutRequest, 'parts'>,
  system: UnitSystem,
): string {
  const sections = new Set(parts.map(({ section }) => section).filter(Boolean))
  return [...sections].reduce(
    (text, section) => text.replaceAll(section, showSection(section, system)),
    sentence,
  )
}
