import type { UnitSystem } from '../contracts/exercises'

/** Pieces of one length that the build needs. */
export interface CutPart {
  label: string
  lengthMm: number
  count: number
  /** What the bar measures across, such as “47 × 100”; parts are only cut from stock of the same section. */
  section: string
}

/** One length the yard sells, or bars already at hand (price 0, and how many there are). */
export interface CutStock {
  lengthMm: number
  section: string
  /** For one bar, in hundredths of the currency; given for all stock of a section or for none. */
  price?: number
  /** How many can be had; without it as many as needed. */
  available?: number
}

/** What has to be cut, from what, with which saw. */
export interface CutRequest {
  parts: readonly CutPart[]
  stock: readonly CutStock[]
  /** What the blade turns to dust at each cut. */
  kerfMm: number
  /** Taken off each bar before the first piece, for a split or dirty end; this cut's own dust is part of it. */
  endTrimMm: number
  /** The units in which a refusal names lengths; millimetres if not said. */
  units?: UnitSystem
}

/** How large a list may be. */
export interface CutLimits {
  pieces: number
  parts: number
  stockLengths: number
}

/** As much as one person cuts for one build. */
export const homeLimits: CutLimits = { pieces: 400, parts: 40, stockLengths: 12 }

/** The longest bar that is carried anywhere: a 30 m pole. */
export const longestMm = 30_000
/** The shortest piece that a saw bench holds. */
export const shortestMm = 5
/** Wider than any blade, chainsaws included. */
export const widestKerfMm = 25
