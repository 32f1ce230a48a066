import { h, type FunctionalComponent, type VNode } from 'vue'
import type { GroupMark, LayerState, Mark } from './marks'

export interface DrawingMarksProps {
  marks: readonly Mark[]
  /** State of each layer by name; a layer that is not named is in ink. */
  layers?: Readonly<Record<string, LayerState>>
  /** Layers that are being inked now, with the state they come from. */
  inking?: Readonly<Record<string, LayerState>>
  /** Layer drawn in chalk because the reader is at work on it. */
  here?: string
  /** Prefix of the clips' ids. */
  clipId?: string
}

function renderGroup(mark: GroupMark, props: DrawingMarksProps): VNode | VNode[] {
  const clip = mark.clip ? { 'clip-path': `url(#${props.clipId}-${mark.clip})` } : {}
  const children = () => mark.marks.map((child) => renderMark(child, props))
  if (!mark.layer) return h('g', { ...mark.attributes, ...clip }, children())
  const state = props.layers?.[mark.layer] ?? 'ink'
  const before = props.inking?.[mark.layer]
  const style = [mark.attributes.class, `is-${state}`, mark.layer === props.here ? 'is-here' : '']
  const layer = h('g', { class: [...style, before ? `is-inking from-${before}` : ''] }, children())
  if (before !== 'pencil') return layer
  return h('g', [h('g', { class: [mark.attributes.class, 'is-pencil'] }, children()), layer])
}

function renderMark(mark: Mark, props: DrawingMarksProps): VNode | VNode[] {
  if (mark.tag === 'g') return renderGroup(mark, props)
  if (mark.tag === 'text') return h('text', mark.attributes, mark.text)
  return h(mark.tag, mark.attributes)
}

/** Turns the marks of a drawing into SVG elements. */
export const DrawingMarks: FunctionalComponent<DrawingMarksProps> = (props) =>
  props.marks.map((mark) => renderMark(mark, props)).flat()

DrawingMarks.props = ['marks', 'layers', 'inking', 'here', 'clipId']
