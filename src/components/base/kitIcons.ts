/** One part of a kit drawing: its pen and material, and its outline in a square of 72. */
export type KitPart = readonly [style: string, d: string]

const circle = (x: number, y: number, radius: number) =>
  `M${x - radius} ${y}a${radius} ${radius} 0 1 0 ${2 * radius} 0a${radius} ${radius} 0 1 0-${2 * radius} 0z`

const teeth = `M4 45${'l2.5 5 2.5-4.6'.repeat(8)}`

/** What is worn. */
const worn = {
  gloves: [
    [
      'p2 m-roof',
      'M20 62V36l-7-10q-2-4 2-5t6 3l5 6V14q0-3 3-3t3 3V10q0-3 3.5-3T39 10v3q0-3 3-3t3 3v4q0-3 3-3t3 3v24q0 10-5 14v11z',
    ],
    ['p1b nofill', 'M20 54h26M32 14v18M39 13v19M45 17v15'],
  ],
  goggles: [
    ['p2 m-glass', 'M10 30q26-10 52 0v12q0 8-10 8-10 0-13-8h-6q-3 8-13 8-10 0-10-8z'],
    ['p2 nofill', 'M10 34L2 26M62 34l8-8M20 36l6-4'],
  ],
  mask: [
    ['p2 m-sheet2', 'M14 34q22-22 44 0q2 18-8 24-14 8-28 0-10-6-8-24z'],
    [
      'p1b nofill',
      'M18 36q18-12 36 0M18 46q18 10 36 0M14 34L4 24M58 34l10-10M16 48L5 56M56 48l11 8',
    ],
    ['p2 m-steel', circle(36, 44, 7)],
  ],
  boots: [
    ['p2 m-earth', 'M22 10h20v30q6 8 20 10v12H20q-2-6 0-14z'],
    ['p1b nofill', 'M20 56h42M22 18h20'],
  ],
  sleeves: [
    ['p2 m-sheet2', 'M24 10h24l16 14-4 26-8-1 1-16-5-4v34H24V29l-5 4 1 16-8 1-4-26z'],
    ['p1b nofill', 'M24 10q12 12 24 0'],
  ],
  'ear-protection': [
    ['p2 nofill', 'M15 42v-8a21 21 0 0 1 42 0v8'],
    ['p2 m-roof', 'M11 38h8q3 0 3 3v18q0 3-3 3h-5q-8 0-8-10v-4q0-10 5-10z'],
    ['p2 m-roof', 'M61 38h-8q-3 0-3 3v18q0 3 3 3h5q8 0 8-10v-4q0-10-5-10z'],
    ['p1b nofill', 'M18 42v16M54 42v16'],
  ],
  helmet: [
    ['p2 m-boxwood', 'M12 46a24 24 0 0 1 48 0z'],
    ['p2 m-boxwood', 'M4 46h64v7H4z'],
    ['p1b nofill', 'M30 23v12M42 23v12'],
  ],
} as const satisfies Record<string, readonly KitPart[]>

/** What measures and marks. */
const measuring = {
  tape: [
    ['p2 m-roof', 'M12 18h28q12 0 12 12v26H20q-8 0-8-8z'],
    ['p1b m-boxwood', circle(32, 37, 11)],
    ['p2 m-boxwood', 'M52 48h15v8H52z'],
    ['p1b nofill', 'M57 48v4M62 48v4'],
    ['p2 nofill', 'M67 45v14'],
  ],
  level: [
    ['p2 m-roof', 'M4 28h64v18H4z'],
    ['p1b m-vial', 'M32 32h8a5 5 0 0 1 0 10h-8a5 5 0 0 1 0-10z'],
    ['p1b nofill', 'M33 32v10M39 32v10'],
  ],
  square: [
    ['p2 m-steel', 'M12 8h11v43h41v11H12z'],
    ['p1b nofill', 'M12 16h5M12 24h5M12 32h5M12 40h5M32 62v-5M40 62v-5M48 62v-5M56 62v-5'],
  ],
  string: [
    ['p1b m-sheet2', 'M26 20h20v30H26z'],
    ['p1b nofill', 'M26 26l20-3M26 32l20-3M26 38l20-3M26 44l20-3M26 49l20-3M46 46q14 2 20 16'],
    ['p2 m-timber', 'M20 12h32v8H20zM20 50h32v8H20z'],
  ],
  pencil: [
    ['p2 m-boxwood', 'M17 49L51 15l8 8-34 34z'],
    ['p2 m-timber', 'M17 49l8 8-14 5z'],
    ['p1b nofill', 'M21 53l34-34'],
    ['p2 m-steel', 'M51 15l5-5 8 8-5 5z'],
  ],
} as const satisfies Record<string, readonly KitPart[]>

/** What cuts, drives, digs and carries. */
const working = {
  saw: [
    ['p2 m-steel', 'M4 38L46 24v22H4z'],
    ['p1b m-steel', teeth],
    ['p2 m-timber', 'M44 20h14q10 0 10 12v8q0 12-10 12H44z'],
    ['p1b m-sheet', 'M51 30h6q3 0 3 4v4q0 4-3 4h-6z'],
  ],
  drill: [
    ['p2 m-roof', 'M8 16h34v18H30l-3 20H14l2-20H8z'],
    ['p2 m-steel', 'M42 19h8l6 4v4l-6 4h-8z'],
    ['p2 nofill', 'M56 25h12'],
    ['p2 m-steel', 'M9 54h22v9H9z'],
    ['p1b nofill', 'M13 22h14M30 38l4-3'],
  ],
  hammer: [
    ['p2 m-timber', 'M33 26h7l2 40H31z'],
    ['p2 m-steel', 'M20 12h32v14H30q-9 0-16 9-1-15 6-23z'],
    ['p1b nofill', 'M45 12v14'],
  ],
  spade: [
    ['p2 m-timber', 'M33 14h6v28h-6z'],
    ['p2 m-timber3', 'M25 5h22v6q0 3-3 3H28q-3 0-3-3z'],
    ['p2 m-steel', 'M22 40h28v14q0 8-14 14-14-6-14-14z'],
    ['p1b nofill', 'M36 42v18'],
  ],
  trowel: [
    ['p2 m-steel', 'M6 64l6-34 24 24z'],
    ['p2 nofill', 'M27 42q10-2 18-12'],
    ['p2 m-timber', 'M42 26l16-16q4-2 6 0t0 6L48 32z'],
  ],
  'board-float': [
    ['p2 m-timber', 'M6 50h60v8H6z'],
    ['p2 nofill', 'M18 50V38q0-8 8-8h22q8 0 8 8v12'],
    ['p2 m-timber3', 'M22 26h30v9H22z'],
  ],
  tamper: [
    ['p2 m-timber', 'M33 4h6v46h-6z'],
    ['p2 m-steel', 'M14 50h44v12H14z'],
  ],
  bucket: [
    ['p2 m-steel', 'M16 26h40l-4 36H20z'],
    ['p2 nofill', 'M16 26q20-26 40 0'],
    ['nostroke m-water', 'M18 34q18 8 36 0l-3 26H21z'],
  ],
  barrow: [
    ['p2 m-steel', 'M6 20h46l-8 24H18z'],
    ['p2 nofill', 'M48 30l20-4M22 44l-2 16M40 44l-6 12'],
    ['p2 m-sheet', circle(18, 56, 8)],
  ],
  ladder: [
    ['p2 m-timber2', 'M26 14h20v5H26zM26 26h20v5H26zM26 38h20v5H26zM26 50h20v5H26z'],
    ['p2 m-timber', 'M20 5h6v62h-6zM46 5h6v62h-6z'],
  ],
  generic: [
    ['p2 nofill', 'M25 28v-8q0-5 5-5h12q5 0 5 5v8'],
    ['p2 m-roof', 'M7 28h58v32H7z'],
    ['p1b nofill', 'M7 40h58'],
    ['p1b m-steel', 'M31 36h10v9H31z'],
  ],
} as const satisfies Record<string, readonly KitPart[]>

/** Every kit drawing by name. */
export const KIT_ICONS = { ...worn, ...measuring, ...working } as const

export type KitIconName = keyof typeof KIT_ICONS

/** Names in the order in which an instructor picks from them. */
export const KIT_ICON_NAMES = Object.keys(KIT_ICONS) as KitIconName[]

/** The parts of a kit drawing; a toolbox stands for what has no drawing of its own. */
export function findKitIcon(name: string): readonly KitPart[] {
  return Object.hasOwn(KIT_ICONS, name) ? KIT_ICONS[name as KitIconName] : KIT_ICONS.generic
}
