import { spawn, spawnSync } from 'node:child_process'
import { once } from 'node:events'
import { writeFileSync } from 'node:fs'
import type { Timeline } from './timeline'
import { FRAME_RATE, SAMPLE_RATE } from './timeline'

export const WIDTH = 1280
export const HEIGHT = 720
const LOUDNESS = -16
const LIMIT_DB = -3.5

/** Writes the narration as a mono wav with every sentence at its place. */
export function writeNarration(file: string, timeline: Timeline, speech: Int16Array[]): void {
  const samples = new Int16Array(Math.round(timeline.durationSeconds * SAMPLE_RATE))
  timeline.placed.forEach(({ startSample }, index) => samples.set(speech[index] ?? [], startSample))
  const header = Buffer.alloc(44)
  header.write('RIFF', 0, 'latin1')
  header.writeUInt32LE(36 + samples.byteLength, 4)
  header.write('WAVEfmt ', 8, 'latin1')
  header.writeUInt32LE(16, 16)
  header.writeUInt16LE(1, 20)
  header.writeUInt16LE(1, 22)
  header.writeUInt32LE(SAMPLE_RATE, 24)
  header.writeUInt32LE(SAMPLE_RATE * 2, 28)
  header.writeUInt16LE(2, 32)
  header.writeUInt16LE(16, 34)
  header.write('data', 36, 'latin1')
  header.writeUInt32LE(samples.byteLength, 40)
  writeFileSync(file, Buffer.concat([header, Buffer.from(samples.buffer)]))
}

/** The chain that the voice goes through before its level is set; the same for measuring and for the film. */
function soundChain(gainDb: number): string {
  const limit = (10 ** (LIMIT_DB / 20)).toFixed(4)
  return [
    'highpass=f=70',
    'aresample=48000:resampler=swr:filter_size=64',
    'pan=stereo|c0=c0|c1=c0',
    `volume=${gainDb.toFixed(2)}dB`,
    `alimiter=limit=${limit}:attack=4:release=60:level=disabled`,
  ].join(',')
}

function measureLoudness(narration: string, gainDb: number): number {
  const filter = `${soundChain(gainDb)},ebur128=framelog=verbose`
  const run = spawnSync(
    'ffmpeg',
    ['-hide_banner', '-nostats', '-i', narration, '-af', filter, '-f', 'null', '-'],
    { encoding: 'utf8' },
  )
  const found = [...run.stderr.matchAll(/I:\s+(-?[\d.]+) LUFS/g)].at(-1)?.[1]
  if (run.status !== 0 || found === undefined)
    throw new Error(`The loudness could not be measured: ${run.stderr}`)
  return Number(found)
}

/** The gain in dB that brings the narration to the loudness; the limiter takes some away, hence the second look. */
function findGain(narration: string): number {
  let gainDb = 0
  for (let look = 0; look < 3; look++) gainDb += LOUDNESS - measureLoudness(narration, gainDb)
  return gainDb
}

/** Encodes the frames that `frame` returns as raw RGBA, with the narration, into an mp4. */
export async function film(
  file: string,
  narration: string,
  timeline: Timeline,
  frame: (index: number) => Buffer,
): Promise<void> {
  const keyFrames = [
    ...timeline.stops.map(({ atMs }) => atMs),
    ...timeline.chapters.map(({ startMs }) => startMs),
  ]
  const inputs = [
    '-f',
    'rawvideo',
    '-pix_fmt',
    'rgba',
    '-s',
    `${WIDTH}x${HEIGHT}`,
    '-r',
    `${FRAME_RATE}`,
    '-i',
    '-',
    '-i',
    narration,
  ]
  const picture = [
    ...['-vf', 'scale=in_range=full:out_range=tv:out_color_matrix=bt709,format=yuv420p'],
    ...[
      '-c:v',
      'libx264',
      '-profile:v',
      'high',
      '-preset',
      'medium',
      '-crf',
      '20',
      '-g',
      '150',
      '-threads',
      '2',
    ],
    ...['-force_key_frames', keyFrames.map((ms) => (ms / 1000).toFixed(3)).join(',')],
    ...[
      '-colorspace',
      'bt709',
      '-color_primaries',
      'bt709',
      '-color_trc',
      'bt709',
      '-color_range',
      'tv',
    ],
  ]
  const sound = [
    '-af',
    soundChain(findGain(narration)),
    '-c:a',
    'aac',
    '-b:a',
    '64k',
    '-ar',
    '48000',
  ]
  // Without these the encoder's version and the date would make each build differ.
  const exact = [
    '-map_metadata',
    '-1',
    '-fflags',
    '+bitexact',
    '-flags:v',
    '+bitexact',
    '-flags:a',
    '+bitexact',
  ]
  const output = ['-movflags', '+faststart', '-y', file]
  const encoder = spawn(
    'ffmpeg',
    ['-v', 'error', ...inputs, ...picture, ...sound, ...exact, ...output],
    {
      stdio: ['pipe', 'inherit', 'inherit'],
    },
  )
  const closed = once(encoder, 'close')
  for (let index = 0; index < timeline.frames; index++) {
    if (!encoder.stdin.write(frame(index))) await once(encoder.stdin, 'drain')
  }
  encoder.stdin.end()
  const [code] = (await closed) as [number]
  if (code !== 0) throw new Error(`ffmpeg ended with ${code}.`)
}
