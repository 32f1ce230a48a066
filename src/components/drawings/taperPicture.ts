import type { Drawing } from './drawing'

/** Four whole boards and the last, ripped along a stop that leans: how wide is it at each end? */
export function drawTaperPicture(drawing: Drawing): void {
  drawing.coloured(() => {
    for (let index = 0; index < 4; index++)
      drawing.rect(24 + index * 38, -98, 34, 74, 'p1b m-timber')
    drawing.path('M176 24H204L192 98H176Z', 'p2 m-timber2')
  })
  drawing.path('M208 18L195 104', 'p3 nofill')
  drawing.text(190, 18, '?', 'ask1', 'middle', 17)
  drawing.text(184, 117, '?', 'ask1', 'middle', 17)
}
