import { z } from 'zod'
import { config } from '../config'
import { runTool } from './runTool'

/** Containers that are opened at all: no playlist, whose lines could name other files. */
const containers = 'mov,mp4,m4a,3gp,3g2,mj2,matroska,webm,avi,mpegts,mpeg,flv,ogg,asf,mp3,wav,flac'
/** What both tools may open, whatever a file says. */
export const inputLimits = ['-protocol_whitelist', 'file', '-format_whitelist', containers]

const probeTimeoutMs = 60_000

const streamSchema = z.object({
  codec_type: z.string().optional(),
  codec_name: z.string().optional(),
  pix_fmt: z.string().optional(),
  width: z.number().optional(),
  height: z.number().optional(),
  duration: z.string().optional(),
  disposition: z.object({ attached_pic: z.number().optional() }).optional(),
  side_data_list: z.array(z.object({ rotation: z.number().optional() })).optional(),
})
export type ProbedStream = z.infer<typeof streamSchema>
const probedSchema = z.object({
  format: z.object({ format_name: z.string(), duration: z.string().optional() }),
  streams: z.array(streamSchema).default([]),
})
/** What ffprobe says of a file. */
export type Probed = z.infer<typeof probedSchema>

/** Asks ffprobe what a file is; null when it is no film or sound at all. */
export async function probeFile(path: string, signal?: AbortSignal): Promise<Probed | null> {
  const { exitCode, stdout } = await runTool(
    config.ffprobePath,
    [
      ...['-v', 'error', ...inputLimits],
      ...['-print_format', 'json', '-show_format', '-show_streams', '-i', `file:${path}`],
    ],
    { timeoutMs: probeTimeoutMs, ...(signal ? { signal } : {}) },
  )
  if (exitCode !== 0) return null
  const parsed = probedSchema.safeParse(JSON.parse(stdout))
  return parsed.success ? parsed.data : null
}
