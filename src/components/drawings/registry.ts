import { defineAsyncComponent, h, type Component } from 'vue'

/** Holds the drawing's room while its code is on the way. */
const DrawingWaits = () => h('div', { style: 'min-height: 236px' })

function load(loader: () => Promise<{ default: Component }>): Component {
  return defineAsyncComponent({ loader, loadingComponent: DrawingWaits, delay: 0 })
}

/** The drawing of each calculator by the calculator's id; each is fetched when it is first shown. */
export const CALCULATOR_DRAWINGS: Readonly<Record<string, Component>> = {
  slab: load(() => import('./SlabDrawing.vue')),
  mix: load(() => import('./MixDrawing.vue')),
  square: load(() => import('./SquareDrawing.vue')),
  diagonals: load(() => import('./DiagonalsDrawing.vue')),
  pitch: load(() => import('./PitchDrawing.vue')),
}

/** Every kind of course drawing; each is fetched when it is first shown. */
export const COURSE_DRAWINGS = {
  'log-store': load(() => import('./LogStoreDrawing.vue')),
  deck: load(() => import('./DeckDrawing.vue')),
  'picket-fence': load(() => import('./PicketFenceDrawing.vue')),
} as const satisfies Record<string, Component>

export type CourseDrawingType = keyof typeof COURSE_DRAWINGS
