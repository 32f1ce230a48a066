import type { Slip, Values } from './calculator'
import { factorOf, MOST_SPACING } from './jointsRules'
import { numberOf, wordOf } from './values'

const spacingOf = (outputs: Values) => numberOf(outputs, 'maxSpacing')
const withoutLimit = (values: Values) =>
  factorOf(wordOf(values, 'mix')) * numberOf(values, 'thickness')
const quarter = (values: Values) => numberOf(values, 'thickness') / 4

/** What happens when the joints are counted for the panels, or a part of a panel is left out. */
function panelSlips(output: 'panelsLong' | 'panelsWide', side: 'length' | 'width'): Slip[] {
  const parts = (values: Values, outputs: Values) => numberOf(values, side) / spacingOf(outputs)
  return [
    {
      id: `joints-counted-${side}`,
      title: 'Joints counted, not panels',
      output,
      wrong: (_values, outputs) => numberOf(outputs, output) - 1,
      sentence: 'That counts the cuts between the panels.',
      wayBack: 'One cut makes two panels: there is always one panel more than cuts.',
    },
    {
      id: `rounded-down-${side}`,
      title: 'Panels rounded down',
      output,
      wrong: (values, outputs) => {
        const whole = Math.floor(parts(values, outputs) + 1e-9)
        return whole < parts(values, outputs) - 1e-9 ? whole : undefined
      },
      sentence: 'That is rounded down: the panels get longer than the spacing allows.',
      wayBack: 'Round up to the next whole panel, then share the side out evenly.',
    },
    {
      id: `long-panels-${side}`,
      title: 'Panels left too long for their width',
      output,
      wrong: (values, outputs) => Math.ceil(parts(values, outputs) - 1e-9),
      sentence: 'That keeps the spacing but leaves panels that are long and narrow.',
      wayBack: 'Add a cut until no panel is longer than one and a half times its width.',
    },
  ]
}

/** The known ways to get `joints` wrong. */
export const jointsSlips: Slip[] = [
  {
    id: 'inches-as-feet',
    title: 'Inches given as feet',
    output: 'maxSpacing',
    wrong: (_values, outputs, system) =>
      system === 'imperial' ? spacingOf(outputs) * 12 : undefined,
    sentence: 'That takes the inches for feet.',
    wayBack: 'The thickness is in inches, so the spacing is too: divide by 12.',
  },
  {
    id: 'centimetres',
    title: 'Answered in centimetres',
    output: 'maxSpacing',
    wrong: (_values, outputs, system) =>
      system === 'metric' ? spacingOf(outputs) / 10 : undefined,
    sentence: 'That looks like centimetres.',
    wayBack: 'The field asks for millimetres: multiply by 10.',
  },
  {
    id: 'widest-of-the-range',
    title: 'The widest spacing of all mixes',
    output: 'maxSpacing',
    wrong: (values) => Math.min(36 * numberOf(values, 'thickness'), MOST_SPACING),
    sentence: 'That spacing is for a stiff mix only.',
    wayBack: 'A mix with small stone or more water shrinks more: take the factor of your own mix.',
  },
  {
    id: 'limit-forgotten',
    title: 'The limit forgotten',
    output: 'maxSpacing',
    wrong: (values) => (withoutLimit(values) > MOST_SPACING ? withoutLimit(values) : undefined),
    sentence: 'That goes beyond the widest spacing of any slab without steel.',
    wayBack: 'However thick the slab, the spacing stops at the limit of the rule.',
  },
  ...panelSlips('panelsLong', 'length'),
  ...panelSlips('panelsWide', 'width'),
  {
    id: 'spacing-for-panel',
    title: 'The widest spacing used as it is',
    output: 'panelLength',
    wrong: (_values, outputs) => spacingOf(outputs),
    sentence: 'That is how far apart joints may lie at most, not how long a panel comes out.',
    wayBack: 'Share the length out evenly over the panels.',
  },
  {
    id: 'divided-by-joints',
    title: 'Divided by the cuts',
    output: 'panelLength',
    wrong: (values, outputs) => {
      const cuts = numberOf(outputs, 'panelsLong') - 1
      return cuts > 0 ? numberOf(values, 'length') / cuts : undefined
    },
    sentence: 'That divides by the cuts, not by the panels.',
    wayBack: 'There is one panel more than cuts.',
  },
  {
    id: 'spacing-for-panel-width',
    title: 'The widest spacing used as it is',
    output: 'panelWidth',
    wrong: (_values, outputs) => spacingOf(outputs),
    sentence: 'That is how far apart joints may lie at most, not how wide a panel comes out.',
    wayBack: 'Share the width out evenly over the panels.',
  },
  {
    id: 'least-depth-forgotten',
    title: 'The least depth forgotten',
    output: 'jointDepth',
    wrong: (values, outputs) =>
      quarter(values) < numberOf(outputs, 'jointDepth') - 1e-9 ? quarter(values) : undefined,
    sentence: 'That is a quarter of a thin slab, too shallow to guide a crack.',
    wayBack: 'A quarter of the thickness, but never less than the least of the rule.',
  },
  {
    id: 'a-quarter-inch',
    title: 'A quarter of an inch',
    output: 'jointDepth',
    wrong: () => 0.25 * 0.0254,
    sentence: 'That is a scratch: a quarter of an inch, not of the slab.',
    wayBack: 'The cut goes a quarter of the way down: divide the thickness by 4.',
  },
  {
    id: 'cut-half-way',
    title: 'Cut half way',
    output: 'jointDepth',
    wrong: (values) => numberOf(values, 'thickness') / 2,
    sentence: 'That goes half way down and weakens the slab.',
    wayBack: 'A quarter is enough for the crack to follow.',
  },
]
