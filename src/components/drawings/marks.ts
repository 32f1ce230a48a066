/** Attributes of one SVG element, written as SVG writes them. */
export type MarkAttributes = Record<string, string | number>

/** One piece of line work, in pixels of the view box. */
export interface ShapeMark {
  tag: 'rect' | 'line' | 'path' | 'circle' | 'polygon' | 'polyline'
  attributes: MarkAttributes
}

/** One piece of lettering. */
export interface TextMark {
  tag: 'text'
  attributes: MarkAttributes
  text: string
}

/** Marks that belong together; a layer takes its class from the state of its stage. */
export interface GroupMark {
  tag: 'g'
  attributes: MarkAttributes
  marks: Mark[]
  layer?: string
  clip?: string
}

export type Mark = ShapeMark | TextMark | GroupMark

/** A shape that limits where a group is seen. */
export interface Clip {
  name: string
  shape: ShapeMark
}

/** Where a label stands, so that no other is set on top of it. */
export interface LabelBox {
  text: string
  left: number
  top: number
  right: number
  bottom: number
}

/** How far a layer has come: to do, built, looked at. */
export type LayerState = 'pencil' | 'ink' | 'signed'

/** Rounds to a tenth of a pixel, which keeps the markup short. */
export function tenth(value: number): number {
  return Math.round(value * 10) / 10
}

/** Says whether two labels touch. */
export function labelsOverlap(a: LabelBox, b: LabelBox): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom
}
