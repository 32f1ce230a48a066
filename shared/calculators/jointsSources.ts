import type { Caution, Source } from './calculator'

/** What stands before the numbers of `joints`. */
export const jointsCautions: Caution[] = [
  {
    title: 'A saw that cuts concrete throws dust and stones',
    text: 'Dry cutting fills the air with silica, which ruins lungs: cut wet, with eye and ear protection and a respirator rated for silica. A hand groover in the fresh concrete makes no dust.',
  },
  {
    title: 'Wet cement burns',
    text: 'Waterproof gloves, long sleeves, boots and knee boards when you groove fresh concrete. Rinse splashes at once with clean water.',
  },
  {
    title: 'Cut in time',
    text: 'Groove while it is soft, or saw as soon as the edges do not crumble, the same day as a rule. The next morning it may have cracked where it liked.',
  },
  {
    title: 'Not for every slab',
    text: 'A slab that carries a building or a vehicle, is thinner than 90 mm (3 1/2 in), holds back earth or has steel in it needs joints from its own design. The local code and, where it is required, a licensed engineer come first.',
  },
]

/** Where the figures of `joints` come from. */
export const jointsSources: Source[] = [
  {
    title: 'ACI 302.1R-96, as stated by The Concrete Producer',
    detail: 'joints 24 to 36 times the thickness apart, at most 18 ft without steel',
    kind: 'published',
  },
  {
    title: 'PCA, Building Movements and Joints; Beall, Masonry and Concrete, Fig. 2-15',
    detail: '24 for stone under 3/4 in, 30 for larger, 36 for a low slump',
    kind: 'published',
  },
  {
    title: 'Concrete Construction magazine',
    detail: 'depth a quarter of the thickness, at least 1 in; other books say a fifth',
    kind: 'published',
  },
  {
    title: 'Basham, Rules for Designing Contraction Joints',
    detail: 'no panel longer than 1.5 times its width',
    kind: 'published',
  },
  {
    title: 'IRC R506.1 (2009), as summarised',
    detail: 'slabs on the ground at least 3 1/2 in thick',
    kind: 'published',
  },
]
