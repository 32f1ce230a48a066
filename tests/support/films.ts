import { spawnSync } from 'node:child_process'
import { mkdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { config } from '../../server/config'

/** Goes with the test file's other data. */
const folder = join(config.dataDir, 'films')
const picture = ['-f', 'lavfi', '-i', 'testsrc=duration=2:size=320x180:rate=10']
const sound = ['-f', 'lavfi', '-i', 'sine=frequency=440:duration=2']
const h264 = ['-c:v', 'libx264', '-preset', 'ultrafast', '-pix_fmt', 'yuv420p']

const recipes = {
  'plain.mp4': [...picture, ...sound, ...h264, '-c:a', 'aac', '-movflags', '+faststart'],
  'silent.mp4': [...picture, ...h264],
  'film.webm': [...picture, ...sound, '-c:v', 'libvpx', '-c:a', 'libopus'],
  'sound.m4a': [...sound, '-c:a', 'aac'],
  'old.avi': [...picture, '-c:v', 'mpeg4'],
  'mpeg4.mp4': [...picture, '-c:v', 'mpeg4'],
  'full-colour.mp4': [...picture, '-c:v', 'libx264', '-preset', 'ultrafast', '-pix_fmt', 'yuv444p'],
  'surround.mp4': [...picture, ...sound, ...h264, '-c:a', 'ac3'],
  'still.png': ['-f', 'lavfi', '-i', 'testsrc=size=64x64', '-frames:v', '1'],
}
export type Film = keyof typeof recipes

const made = new Map<Film, string>()

/** The path of a film of two seconds, made when it is first asked for. */
export function filmPath(name: Film): string {
  const known = made.get(name)
  if (known) return known
  mkdirSync(folder, { recursive: true })
  const path = join(folder, name)
  const { status, stderr } = spawnSync(config.ffmpegPath, [
    '-v',
    'error',
    '-y',
    ...recipes[name],
    path,
  ])
  if (status !== 0) throw new Error(stderr.toString())
  made.set(name, path)
  return path
}

/** The bytes of a film. */
export const readFilm = (name: Film): Buffer => readFileSync(filmPath(name))
