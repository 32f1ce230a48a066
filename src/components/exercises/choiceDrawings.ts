import { defineAsyncComponent, type Component } from 'vue'
import type { ChoiceDrawing } from '../../../shared/contracts/exercises'

const furrow = defineAsyncComponent(() => import('../drawings/MixFurrowDrawing.vue'))

/** What draws a choice, and with which props; the drawing gives nothing away that the words do not. */
export const choiceDrawings: Record<
  ChoiceDrawing,
  { component: Component; props: Record<string, unknown>; label: string }
> = {
  'furrow-falls-in': {
    component: furrow,
    props: { kind: 'dry', decorative: true },
    label: 'A furrow that falls in',
  },
  'furrow-rough-top': {
    component: furrow,
    props: { kind: 'stiff', decorative: true },
    label: 'A furrow that stands, rough on top',
  },
  'furrow-closed-top': {
    component: furrow,
    props: { kind: 'right', decorative: true },
    label: 'A furrow that stands, closed on top',
  },
  'furrow-water-shows': {
    component: furrow,
    props: { kind: 'wet', decorative: true },
    label: 'A furrow that closes, with water',
  },
}
