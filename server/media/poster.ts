import { mkdir, rm, stat } from 'node:fs/promises'
import { join } from 'node:path'
import { config } from '../config'
import { inputLimits } from './probe'
import { runTool } from './runTool'

const posterTimeoutMs = 120_000
const latestMs = 3000

async function takePicture(source: string, target: string, atMs: number, signal?: AbortSignal) {
  const { exitCode } = await runTool(
    config.ffmpegPath,
    [
      ...['-nostdin', '-v', 'error', '-y', '-threads', '1'],
      ...['-ss', (atMs / 1000).toFixed(3), ...inputLimits, '-i', `file:${source}`],
      ...['-map', '0:V:0', '-frames:v', '1', '-vf', "scale='min(1280,iw)':-2"],
      ...['-c:v', 'libwebp', '-quality', '80', '-f', 'webp', `file:${target}`],
    ],
    { timeoutMs: posterTimeoutMs, ...(signal ? { signal } : {}) },
  )
  if (exitCode !== 0) return false
  const found = await stat(target).catch(() => null)
  return found !== null && found.size > 0
}

/**
 * Takes a picture out of a video's first seconds, as a WebP file of at most 1280 points' width;
 * returns its path, or null when no picture can be read. Whoever asks removes the file.
 */
export async function makePoster(
  source: string,
  { videoId, durationMs, signal }: { videoId: number; durationMs: number; signal?: AbortSignal },
): Promise<string | null> {
  const folder = join(config.dataDir, 'posters')
  await mkdir(folder, { recursive: true })
  const target = join(folder, `${videoId}-${process.pid}.webp`)
  for (const atMs of [Math.min(latestMs, durationMs / 10), 0]) {
    if (await takePicture(source, target, atMs, signal)) return target
  }
  await rm(target, { force: true })
  return null
}
