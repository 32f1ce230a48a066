import type { Drawing } from './drawing'

/** A side that leans beside its square line: how many degrees is it out? */
export function drawCornerPicture(drawing: Drawing): void {
  drawing.coloured(() => {
    drawing.path('M40 98H180V104H40Z', 'p1b m-timber')
    drawing.path('M40 98L34 97L50 20L56 21Z', 'p1b m-timber')
  })
  drawing.path('M40 98V16', 'p1 dash nofill')
  drawing.path('M55 24L170 98', 'chalkline')
  drawing.path('M76 98A36 36 0 0 0 47 63', 'chalkline')
  drawing.text(94, 90, '?°', 'ask1', 'middle', 17)
}
