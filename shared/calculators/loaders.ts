import type { Calculator } from './calculator'

/** How a browser fetches one calculator alone, by its id; a new one is one line here and one in the registry. */
export const calculatorLoaders: Readonly<Record<string, () => Promise<Calculator>>> = {
  'angle-cut': async () => (await import('./angleCut')).angleCut,
  batch: async () => (await import('./batch')).batch,
  boards: async () => (await import('./boards')).boards,
  coating: async () => (await import('./coating')).coating,
  corner: async () => (await import('./corner')).corner,
  diagonals: async () => (await import('./diagonals')).diagonals,
  fall: async () => (await import('./fall')).fall,
  fixings: async () => (await import('./fixings')).fixings,
  gravel: async () => (await import('./gravel')).gravel,
  joints: async () => (await import('./joints')).joints,
  lid: async () => (await import('./lid')).lid,
  'lumber-size': async () => (await import('./lumberSize')).lumberSize,
  mix: async () => (await import('./mix')).mix,
  pitch: async () => (await import('./pitch')).pitch,
  posthole: async () => (await import('./posthole')).posthole,
  'posts-on-fall': async () => (await import('./postsOnFall')).postsOnFall,
  rafter: async () => (await import('./rafter')).rafter,
  sheets: async () => (await import('./sheets')).sheets,
  slab: async () => (await import('./slab')).slab,
  snow: async () => (await import('./snow')).snow,
  spacing: async () => (await import('./spacing')).spacing,
  square: async () => (await import('./square')).square,
  stairs: async () => (await import('./stairs')).stairs,
  taper: async () => (await import('./taper')).taper,
}
