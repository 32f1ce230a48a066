import type { Drawing } from './drawing'

/** How a mix stands. */
export type Consistency = 'stiff' | 'right' | 'wet'

/** A cone of mix, 300 mm high before its mould is lifted, after it dropped so many millimetres; zero is its middle. */
export function drawHeap(drawing: Drawing, dropMm: number): void {
  const height = 300 - dropMm
  const foot = 100 + dropMm * 0.55
  const crown = 46 + dropMm * 0.42
  const { x, y } = { x: (mm: number) => drawing.x(mm), y: (mm: number) => drawing.y(mm) }
  drawing.path(
    `M${x(-100)} ${y(0)}L${x(-50)} ${y(300)}H${x(50)}L${x(100)} ${y(0)}`,
    'p1b dash nofill',
  )
  const left = `C${x(-foot * 0.86)} ${y(height * 0.4)} ${x(-crown * 1.1)} ${y(height)} ${x(-crown * 0.5)} ${y(height)}`
  const right = `C${x(crown * 1.1)} ${y(height)} ${x(foot * 0.86)} ${y(height * 0.4)} ${x(foot)} ${y(0)}`
  drawing.coloured(() =>
    drawing.path(`M${x(-foot)} ${y(0)}${left}H${x(crown * 0.5)}${right}Z`, 'p2 m-concrete'),
  )
  drawing.line(-330, 0, 330, 0, 'p3')
}
