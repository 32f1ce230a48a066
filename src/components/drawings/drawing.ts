import { measureText } from './lettering'
import { tenth, type Clip, type LabelBox, type Mark, type MarkAttributes } from './marks'

export type Point = readonly [x: number, y: number]
export type Anchor = 'start' | 'middle' | 'end'

/** Where the model's zero lies on the sheet, in pixels, and how many pixels a millimetre takes. */
export interface Frame {
  originX: number
  originY: number
  scale: number
}

/** A sheet to draw on: the model in millimetres with y upwards, the marks in pixels. */
export class Drawing {
  readonly marks: Mark[] = []
  readonly labels: LabelBox[] = []
  readonly clips: Clip[] = []
  private target: Mark[] = this.marks

  constructor(
    readonly width: number,
    public height: number,
    public frame: Frame = { originX: 0, originY: 0, scale: 1 },
    /** Height of the figures in pixels. */
    readonly figure = 13,
  ) {}

  x(mm: number): number {
    return tenth(this.frame.originX + mm * this.frame.scale)
  }

  y(mm: number): number {
    return tenth(this.frame.originY - mm * this.frame.scale)
  }

  /** Writes a model point as SVG wants it. */
  at(x: number, y: number): string {
    return `${this.x(x)} ${this.y(y)}`
  }

  /** Draws with another origin or scale, then goes back. */
  within(frame: Partial<Frame>, draw: () => void): void {
    const before = this.frame
    this.frame = { ...before, ...frame }
    draw()
    this.frame = before
  }

  add(mark: Mark): void {
    this.target.push(mark)
  }

  group(
    attributes: MarkAttributes,
    draw: () => void,
    extra: { layer?: string; clip?: string } = {},
  ) {
    const before = this.target
    const marks: Mark[] = []
    this.target = marks
    draw()
    this.target = before
    this.add({ tag: 'g', attributes, marks, ...extra })
  }

  /** A part of the build that is pencilled, inked or coloured as one. */
  layer(name: string, draw: () => void): void {
    this.group({ class: `layer l-${name}` }, draw, { layer: name })
  }

  /** Parts shown in their materials, whatever the state of the build. */
  coloured(draw: () => void): void {
    this.group({ class: 'layer is-signed' }, draw)
  }

  rect(x: number, y: number, width: number, height: number, style: string): void {
    this.add({
      tag: 'rect',
      attributes: {
        x: this.x(x),
        y: this.y(y + height),
        width: tenth(width * this.frame.scale),
        height: tenth(height * this.frame.scale),
        class: style,
      },
    })
  }

  line(x1: number, y1: number, x2: number, y2: number, style: string): void {
    const attributes = { x1: this.x(x1), y1: this.y(y1), x2: this.x(x2), y2: this.y(y2) }
    this.add({ tag: 'line', attributes: { ...attributes, class: style } })
  }

  polygon(points: readonly Point[], style: string): void {
    this.add({ tag: 'polygon', attributes: { points: this.points(points), class: style } })
  }

  polyline(points: readonly Point[], style: string): void {
    this.add({ tag: 'polyline', attributes: { points: this.points(points), class: style } })
  }

  circle(x: number, y: number, radius: number, style: string): void {
    this.dot(this.x(x), this.y(y), tenth(radius * this.frame.scale), style)
  }

  /** A circle whose place and size are in pixels, as of a nail head that must not shrink away. */
  dot(px: number, py: number, radius: number, style: string): void {
    this.add({
      tag: 'circle',
      attributes: { cx: tenth(px), cy: tenth(py), r: radius, class: style },
    })
  }

  /** A path in pixels. */
  path(d: string, style: string): void {
    if (d) this.add({ tag: 'path', attributes: { d, class: style } })
  }

  /** A line in pixels. */
  stroke(x1: number, y1: number, x2: number, y2: number, style: string): void {
    const attributes = { x1: tenth(x1), y1: tenth(y1), x2: tenth(x2), y2: tenth(y2), class: style }
    this.add({ tag: 'line', attributes })
  }

  /** Width a label takes, in pixels. */
  textWidth(text: string, size = this.figure): number {
    return measureText(text, size)
  }

  /** Lettering at a pixel place; its box is kept so that others can stay clear of it. */
  text(
    px: number,
    py: number,
    text: string,
    style = 'tx',
    anchor: Anchor = 'start',
    size?: number,
  ): void {
    const width = this.textWidth(text, size)
    const high = size ?? this.figure
    const left = anchor === 'start' ? px : anchor === 'end' ? px - width : px - width / 2
    this.labels.push({
      text,
      left,
      right: left + width,
      top: py - high * 0.8,
      bottom: py + high * 0.25,
    })
    this.add(this.lettering(px, py, text, style, anchor, size))
  }

  /** Lettering turned about its own place by so many degrees. */
  textTurned(
    px: number,
    py: number,
    degrees: number,
    text: string,
    style = 'tx',
    size?: number,
  ): void {
    const width = this.textWidth(text, size)
    const high = (size ?? this.figure) * 1.05
    const angle = (Math.abs(degrees) * Math.PI) / 180
    const halfWidth = (width * Math.cos(angle) + high * Math.sin(angle)) / 2
    const halfHeight = (width * Math.sin(angle) + high * Math.cos(angle)) / 2
    this.labels.push({
      text,
      left: px - halfWidth,
      right: px + halfWidth,
      top: py - halfHeight,
      bottom: py + halfHeight,
    })
    const turn = `translate(${tenth(px)} ${tenth(py)}) rotate(${tenth(degrees)})`
    this.group({ transform: turn }, () =>
      this.add(this.lettering(0, (size ?? this.figure) * 0.36, text, style, 'middle', size)),
    )
  }

  clip(name: string, points: readonly Point[]): void {
    this.clips.push({
      name,
      shape: { tag: 'polygon', attributes: { points: this.points(points) } },
    })
  }

  private lettering(
    px: number,
    py: number,
    text: string,
    style: string,
    anchor: Anchor,
    size = this.figure,
  ): Mark {
    const attributes: MarkAttributes = {
      x: tenth(px),
      y: tenth(py),
      class: style,
      'text-anchor': anchor,
      'font-size': size,
    }
    return { tag: 'text', attributes, text }
  }

  private points(points: readonly Point[]): string {
    return points.map(([x, y]) => `${this.x(x)},${this.y(y)}`).join(' ')
  }
}
