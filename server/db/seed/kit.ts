import type { Hazard } from '../../../shared/contracts/courses'
import type { KitItem } from '../../../shared/contracts/lessons'

export const onYou = (key: string, icon: string, title: string, detail: string): KitItem => ({
  key,
  kind: 'on-you',
  icon,
  title,
  detail,
})
export const toHand = (key: string, icon: string, title: string, detail: string): KitItem => ({
  key,
  kind: 'to-hand',
  icon,
  title,
  detail,
})
export const caution = (key: string, title: string, detail: string): KitItem => ({
  key,
  kind: 'caution',
  icon: 'generic',
  title,
  detail,
})

export const hazards = {
  services: { kind: 'dig', label: 'Buried services' },
  openDig: { kind: 'dig', label: 'Open dig' },
  openHoles: { kind: 'dig', label: 'Open post holes' },
  sawing: { kind: 'saw', label: 'Sawing' },
  cement: { kind: 'cement', label: 'Wet cement burns skin' },
  cementDust: { kind: 'dust', label: 'Cement dust' },
  stoneDust: { kind: 'dust', label: 'Stone dust' },
  drillDust: { kind: 'dust', label: 'Dust from drilling concrete' },
  bags: { kind: 'lift', label: 'Bags of 25 kg (55 lb)' },
  longBoards: { kind: 'lift', label: 'Long boards' },
  gate: { kind: 'lift', label: 'A gate in one piece' },
  frame: { kind: 'drop', label: 'A propped frame can fall' },
  above: { kind: 'drop', label: 'Work above the ground' },
  stack: { kind: 'drop', label: 'A stack can roll' },
} satisfies Record<string, Hazard>

/** Things worn and cautions read in more than one lesson. */
export const kit = {
  longGloves: onYou(
    'gloves',
    'gloves',
    'Waterproof gloves, long',
    'Leather soaks cement through and holds it against the skin.',
  ),
  workGloves: onYou(
    'gloves',
    'gloves',
    'Work gloves that grip',
    'Off again before anything that turns: a drill takes a glove with it.',
  ),
  eyes: onYou(
    'eyes',
    'goggles',
    'Eye protection',
    'On before the first blow or cut, and on helpers too.',
  ),
  mask: onYou(
    'mask',
    'mask',
    'Mask rated for fine dust',
    'A respirator rated for silica, shaved under and fitted; a paper mask lets it through.',
  ),
  boots: onYou('boots', 'boots', 'Stout boots', 'A spade and a falling post both find toes.'),
  wetBoots: onYou(
    'boots',
    'boots',
    'Waterproof boots, trousers over them',
    'Never kneel in wet concrete.',
  ),
  sleeves: onYou('sleeves', 'sleeves', 'Long sleeves', 'Buttoned, nothing loose near a blade.'),
  rinse: toHand(
    'rinse-water',
    'bucket',
    'Clean water, a bucket only for skin and eyes',
    'Not the mixing water.',
  ),
  level: toHand(
    'level',
    'level',
    'Level, 1200 mm (4 ft)',
    'Turn it end for end: it should say the same.',
  ),
  barrow: toHand(
    'barrow',
    'barrow',
    'Barrow, shovel, tub or mixer',
    'Plan the way first: firm planks, no steps.',
  ),
  services: caution(
    'services',
    'Have buried cables and pipes located, and wait for the answer.',
    'The owners or the locating service mark them. Near a mark dig by hand only. If you touch one: stop, keep off and call its owner.',
  ),
  burns: caution(
    'cement-burns',
    'Wet cement burns without hurting at first.',
    'Rinse skin at once with clean water and take soaked clothes off. In an eye: rinse for twenty minutes and get medical help.',
  ),
  dust: caution(
    'cement-dust',
    'Dust from bags harms lungs.',
    'Open them low, wind at your back, others out of the cloud. Keep children and animals away until it is set.',
  ),
  bags: caution(
    'two-to-a-bag',
    'Two people to a bag, or half bags.',
    'Bent knees, bag against you, no twisting. Stop when you are tired.',
  ),
  blade: caution(
    'blade',
    'Clamp it, clear your fingers, let the saw do the work.',
    'Both hands behind the blade, the offcut free to fall. A power saw: guard working, unplugged or battery out before you touch the blade.',
  ),
  prop: caution(
    'propped-frame',
    'A propped frame can fall.',
    'Two braces to a post before you let go, and nobody reaches under it or climbs it.',
  ),
  drill: caution(
    'drilling',
    'Drilling concrete makes silica dust.',
    'Mask on before the drill turns, a vacuum at the hole or a wet method your tool allows. Never blow a hole out with your mouth.',
  ),
  ladder: caution(
    'ladder',
    'Both feet on something made to stand on.',
    'A platform or a tied ladder on firm ground, never the frame, never alone, never in wind or wet.',
  ),
} satisfies Record<string, KitItem>
