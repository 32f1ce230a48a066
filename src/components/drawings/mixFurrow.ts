import { Drawing } from './drawing'
import { tenth } from './marks'
import { createRandom } from './random'

/** How a mix looks when a trowel is pulled through it once. */
export type FurrowKind = 'dry' | 'stiff' | 'right' | 'wet'

export const FURROW_WORDS: Record<FurrowKind, string> = {
  dry: 'Dry and crumbly: the furrow falls in',
  stiff: 'Stiff: the furrow stands, the top is open and rough',
  right: 'The furrow stands and the surface closes',
  wet: 'Wet: the furrow closes and water shows',
}

const PROFILES: Record<FurrowKind, string> = {
  dry: 'M28 104C44 60 62 48 84 44l12 10 10 16 6 6 6-3 8-18 14-12c26 2 44 22 60 61z',
  stiff: 'M24 104C36 62 60 44 86 42l10 4 8 44h28l10-44 12-5c30 4 48 26 60 63z',
  right: 'M20 104c12-40 36-52 66-53q8 0 10 7l6 34q14 6 30 0l8-34q2-7 10-7c30 2 52 16 66 53z',
  wet: 'M12 104c6-20 34-30 68-31q26 8 42 9t40-9c34 2 60 12 66 31z',
}
const GRAINS: Record<FurrowKind, number> = { dry: 34, stiff: 26, right: 10, wet: 5 }

function drawGrains(drawing: Drawing, kind: FurrowKind): void {
  const random = createRandom(kind.length * 31 + 5)
  let d = ''
  for (let index = 0; index < GRAINS[kind]; index++) {
    const x = 44 + random() * 152
    const y = 78 + random() * 22
    if (x > 100 && x < 144 && kind !== 'wet') continue
    const half = 2 + random() * 4
    d += `M${tenth(x - half)} ${tenth(y + half * 0.6)}l${tenth(half)}-${tenth(half * 1.3)}l${tenth(half)} ${tenth(half * 1.2)}z`
  }
  drawing.path(d, 'p1 m-stone')
  if (kind !== 'dry') return
  let crumbs = ''
  for (let index = 0; index < 16; index++)
    crumbs += `M${tenth(104 + random() * 36)} ${tenth(70 + random() * 14)}l3-4 3 5z`
  for (const x of [12, 20, 206, 216, 226]) crumbs += `M${x} 102l3-5 4 5z`
  drawing.path(crumbs, 'p1 m-stone')
}

/** Draws a heap of mix with a furrow through it. */
export function drawFurrow(kind: FurrowKind): Drawing {
  const drawing = new Drawing(240, 130)
  drawing.coloured(() => {
    drawing.path(PROFILES[kind], 'p2 m-concrete')
    if (kind === 'wet') {
      drawing.path('M84 76q36 12 74 0q-34 20-74 0z', 'p1 m-water')
      drawing.path('M4 104q14-6 20-6M236 104q-12-6-22-6', 'p1 nofill')
    }
    drawGrains(drawing, kind)
    if (kind === 'right') drawing.path('M40 78q20-18 46-18M154 60q28 2 46 18', 'shine')
    if (kind === 'stiff')
      drawing.path('M60 58l6-3 5 4 6-5 6 3M158 50l6 4 6-2 8 8 8 2', 'p1b nofill')
  })
  drawing.path('M2 104H238', 'p3')
  return drawing
}
