/** One stroke or face of an icon; what is left out takes the colour of the words beside it. */
export interface IconPart {
  d: string
  fill?: string
  stroke?: string
  width?: number
}

export interface Icon {
  /** Width and height of the view box. */
  size: readonly [width: number, height: number]
  /** Width and height on the screen, in pixels, where the page sets none. */
  shown: readonly [width: number, height: number]
  parts: readonly IconPart[]
}

const ink = 'var(--gf-ink)'
const chalk = 'var(--gf-chalk)'
/** On amber the lines stay dark in every theme. */
const onAmber = '#18272e'

const square = (parts: readonly IconPart[], side = 24, shown = 20): Icon => ({
  size: [side, side],
  shown: [shown, shown],
  parts,
})

const dots = [5, 12, 19]
  .flatMap((y) => [8, 16].map((x) => `M${x - 1.6} ${y}a1.6 1.6 0 1 0 3.2 0a1.6 1.6 0 1 0-3.2 0z`))
  .join('')

/** Every icon by name: tick for right, wave for a slip, never a cross on a person's work. */
export const ICONS = {
  ok: square([{ d: 'M3 14l6 6L21 4', width: 2.4 }]),
  slip: square([
    {
      d: 'M4 7c3-4 6 4 9 0s5 2 7 0M4 13c3-4 6 4 9 0s5 2 7 0M4 19c3-4 6 4 9 0s5 2 7 0',
      width: 2.2,
    },
  ]),
  warn: square(
    [
      { d: 'M16 4L30 28H2z', fill: 'var(--gf-amber-fill)', stroke: onAmber, width: 1.8 },
      { d: 'M16 12v8M16 23.5v.6', stroke: onAmber, width: 2.6 },
    ],
    32,
    32,
  ),
  crow: {
    size: [18, 26],
    shown: [14, 20],
    parts: [{ d: 'M2 3C5 11 7 18 9 24 11 17 13 10 16.5 2', stroke: chalk, width: 2.6 }],
  },
  sun: square([
    { d: 'M7.5 12a4.5 4.5 0 1 0 9 0a4.5 4.5 0 1 0-9 0z', width: 2 },
    {
      d: 'M12 1.5v3M12 19.5v3M1.5 12h3M19.5 12h3M4.6 4.6l2.1 2.1M17.3 17.3l2.1 2.1M4.6 19.4l2.1-2.1M17.3 6.7l2.1-2.1',
      width: 2,
    },
  ]),
  notch: square([{ d: 'M1 3h3l5 9 5-9h3', stroke: ink, width: 1.5 }], 18, 18),
  flag: square(
    [
      { d: 'M3 1v16', stroke: ink, width: 1.5 },
      { d: 'M3 3h13l-3 4 3 4H3z', fill: ink, stroke: 'none' },
    ],
    18,
    18,
  ),
  inked: square(
    [
      { d: 'M1 3h16v12H1z', fill: 'var(--gf-boxwood)', stroke: ink, width: 1 },
      { d: 'M1 12h16v3H1z', fill: ink, stroke: 'none' },
    ],
    18,
    18,
  ),
  play: square([{ d: 'M5 3v14l12-7z', fill: 'currentColor', stroke: 'none' }], 20, 18),
  pause: square(
    [{ d: 'M5 3h4v14H5zM11 3h4v14h-4z', fill: 'currentColor', stroke: 'none' }],
    20,
    18,
  ),
  grip: square([{ d: dots, fill: 'currentColor', stroke: 'none' }]),
  logo: {
    size: [34, 30],
    shown: [34, 30],
    parts: [
      { d: 'M14 1h6v13h-6z', fill: 'var(--gf-timber)', stroke: ink, width: 1.6 },
      { d: 'M11 14h12v7h8v8H3v-8h8z', fill: 'var(--gf-concrete)', stroke: ink, width: 1.6 },
      { d: 'M0 15h11M23 15h11', stroke: ink, width: 2 },
    ],
  },
} as const satisfies Record<string, Icon>

export type IconName = keyof typeof ICONS
