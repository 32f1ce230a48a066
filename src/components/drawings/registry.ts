import { defineAsyncComponent, h, type Component } from 'vue'
import type { DrawCalculatorSheet } from './calculatorSheet'

/** Holds the drawing's room while its code is on the way. */
const DrawingWaits = () => h('div', { style: 'min-height: 236px' })

function load(loader: () => Promise<{ default: Component }>): Component {
  return defineAsyncComponent({ loader, loadingComponent: DrawingWaits, delay: 0 })
}

/** How each calculator is drawn, by the calculator's id; each is fetched when it is first shown. */
export const CALCULATOR_SHEETS: Readonly<Record<string, () => Promise<DrawCalculatorSheet>>> = {
  slab: async () => (await import('./slabSheet')).drawSlabSheet,
  mix: async () => (await import('./mixSheet')).drawMixSheet,
  square: async () => (await import('./squareSheet')).drawSquareSheet,
  diagonals: async () => (await import('./diagonalsSheet')).drawDiagonalsSheet,
  pitch: async () => (await import('./pitchSheet')).drawPitchSheet,
  sheets: async () => (await import('./sheetsSheet')).drawSheetsSheet,
  fall: async () => (await import('./fallSheet')).drawFallSheet,
  corner: async () => (await import('./cornerSheet')).drawCornerSheet,
  snow: async () => (await import('./snowSheet')).drawSnowSheet,
  joints: async () => (await import('./jointsSheet')).drawJointsSheet,
  taper: async () => (await import('./taperSheet')).drawTaperSheet,
  lid: async () => (await import('./lidSheet')).drawLidSheet,
  gravel: async () => (await import('./gravelSheet')).drawGravelSheet,
  coating: async () => (await import('./coatingSheet')).drawCoatingSheet,
  posthole: async () => (await import('./postholeSheet')).drawPostholeSheet,
  fixings: async () => (await import('./fixingsSheet')).drawFixingsSheet,
  rafter: async () => (await import('./rafterSheet')).drawRafterSheet,
  batch: async () => (await import('./batchSheet')).drawBatchSheet,
  boards: async () => (await import('./boardsSheet')).drawBoardsSheet,
  spacing: async () => (await import('./spacingSheet')).drawSpacingSheet,
  'posts-on-fall': async () => (await import('./postsOnFallSheet')).drawPostsOnFallSheet,
  'angle-cut': async () => (await import('./angleCutSheet')).drawAngleCutSheet,
  stairs: async () => (await import('./stairsSheet')).drawStairsSheet,
  'lumber-size': async () => (await import('./lumberSizeSheet')).drawLumberSizeSheet,
}

/** Every kind of course drawing; each is fetched when it is first shown. */
export const COURSE_DRAWINGS = {
  'log-store': load(() => import('./LogStoreDrawing.vue')),
  deck: load(() => import('./DeckDrawing.vue')),
  'picket-fence': load(() => import('./PicketFenceDrawing.vue')),
} as const satisfies Record<string, Component>

export type CourseDrawingType = keyof typeof COURSE_DRAWINGS
