import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

const built = (name: string) =>
  fileURLToPath(new URL(`../../../media/built/${name}`, import.meta.url))

/** A narrated film of 50 s, 1.1 MB. */
export const film = built('roof-pitch.mp4')
export const filmName = 'roof-pitch.mp4'
/** A longer one, 2.2 MB. */
export const longFilm = built('mixing-and-pouring.mp4')
/** The captions of the first, sixteen or so, all readable. */
export const captions = readFileSync(built('roof-pitch.vtt'), 'utf8')

/** Not a film, whatever its name says. */
export const falseFilm = {
  name: 'lecture.mp4',
  mimeType: 'video/mp4',
  buffer: Buffer.from('A shopping list: sand, gravel, cement.\n'.repeat(400)),
}

export const vttFile = (name: string, text: string) => ({
  name,
  mimeType: 'text/vtt',
  buffer: Buffer.from(text),
})

/** Wrong in three places. */
export const brokenCaptions = `WEBVTT

00:01.000 -> 00:03.000
The arrow is too short.

00:06.000 --> 00:05.000
This ends before it begins.

00:07.000 --> 00:9.000
This has a figure too few.
`
