/** A pictogram on an amber ground: lines, and faces that are filled. */
export interface Pictogram {
  lines: string
  faces?: string
}

const dot = (x: number, y: number) => `M${x - 1.2} ${y}a1.2 1.2 0 1 0 2.4 0a1.2 1.2 0 1 0-2.4 0z`

/** Hazards by kind, in a square of 28. */
export const PICTOGRAMS = {
  cement: { lines: 'M14 5c3 4 4.5 6 4.5 8.2a4.5 4.5 0 0 1-9 0C9.5 11 11 9 14 5zM5 22h18' },
  lift: { lines: 'M7 13h14v9H7zM14 10V4M11 7l3-3 3 3' },
  saw: {
    lines: 'M4 11h20l-3 6-2.5-3-2.5 3-2.5-3-2.5 3-2.5-3-2.5 3L4 11zM4 22h20',
  },
  dust: {
    lines: 'M5 12a4 4 0 0 1 7.5-2 4.5 4.5 0 0 1 8.5 2',
    faces: dot(8, 17) + dot(14, 19) + dot(20, 17) + dot(11, 22.5) + dot(17, 23),
  },
  dig: { lines: 'M4 12h20M15 4l-4 7h5l-3 6M4 21c4-3 6 2 10 0s6 1 10-1' },
  drop: { lines: 'M4 9h9v12h11M19 6v8M16 11l3 3 3-3' },
} as const satisfies Record<string, Pictogram>

export type PictogramName = keyof typeof PICTOGRAMS
