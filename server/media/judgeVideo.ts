import type { Probed, ProbedStream } from './probe'

/** What an uploaded file turned out to be. */
export type Judgement =
  | { isUsable: false; refusal: string }
  | { isUsable: true; durationMs: number; width: number; height: number; contentType: string }

const longestMs = 86_400_000
const widest = 8192

const mp4Sound = new Set(['aac', 'mp3', 'opus', 'flac'])
const webmSound = new Set(['opus', 'vorbis'])
const mp4Pictures = new Set(['h264', 'av1', 'vp9'])
const webmPictures = new Set(['vp8', 'vp9', 'av1'])
/** Eight bits, half the colour: the only H.264 that every browser shows. */
const h264Formats = new Set(['yuv420p', 'yuvj420p'])

const wayOut = 'Export it as MP4 with H.264 pictures and AAC sound, and send it again.'
const refuse = (reason: string): Judgement => ({
  isUsable: false,
  refusal: `${reason} ${wayOut}`.slice(0, 500),
})

/** A name out of a foreign file, short and harmless enough for a sentence. */
const named = (text: string | undefined) =>
  (text ?? 'unknown').replace(/[^\w.,-]/g, '').slice(0, 40)

const cannotBeRead = 'Its pictures cannot be read: the file is damaged or was cut off.'

function judgeCodecs(isMp4: boolean, picture: ProbedStream, sounds: ProbedStream[]) {
  const codec = picture.codec_name ?? ''
  if (!(isMp4 ? mp4Pictures : webmPictures).has(codec)) {
    return `Its pictures are stored as ${named(codec)}, which not every browser shows.`
  }
  if (picture.pix_fmt === undefined) return cannotBeRead
  if (codec === 'h264' && !h264Formats.has(picture.pix_fmt ?? '')) {
    return `Its pictures are H.264 of the kind ${named(picture.pix_fmt)}, which browsers do not show.`
  }
  const sound = sounds[0]?.codec_name
  if (sound !== undefined && !(isMp4 ? mp4Sound : webmSound).has(sound)) {
    return `Its sound is stored as ${named(sound)}, which browsers do not play.`
  }
  return null
}

function measure(picture: ProbedStream) {
  const { width = 0, height = 0 } = picture
  const turn = picture.side_data_list?.find(({ rotation }) => rotation !== undefined)?.rotation ?? 0
  return Math.abs(turn) % 180 === 90 ? { width: height, height: width } : { width, height }
}

/** Decides from what ffprobe found whether a file is a video that browsers play. */
export function judgeVideo(probed: Probed | null): Judgement {
  if (!probed) {
    return refuse(
      'This file is not a video: nothing in it can be played. Its name does not matter.',
    )
  }
  const isStill = ({ disposition }: ProbedStream) => disposition?.attached_pic === 1
  const picture = probed.streams.find((s) => s.codec_type === 'video' && !isStill(s))
  const sounds = probed.streams.filter((s) => s.codec_type === 'audio')
  if (!picture) {
    return refuse(
      sounds.length > 0
        ? 'This file has sound but no moving picture.'
        : 'This file has no moving picture.',
    )
  }
  const durationMs = Math.round(Number(probed.format.duration ?? picture.duration ?? 0) * 1000)
  if (!(durationMs > 0)) return refuse('This video has no length: its recording was not finished.')
  if (durationMs > longestMs) return refuse('This video is longer than a day.')
  const names = probed.format.format_name.split(',')
  const isMp4 = names.includes('mp4')
  if (!isMp4 && !names.includes('webm')) {
    return refuse(`This is a ${named(names[0])} file, which browsers do not play.`)
  }
  const reason = judgeCodecs(isMp4, picture, sounds)
  if (reason) return refuse(reason)
  const size = measure(picture)
  if (size.width < 1 || size.height < 1 || Math.max(size.width, size.height) > widest) {
    return refuse(
      `Its pictures are ${size.width} × ${size.height} points; at most ${widest} a side.`,
    )
  }
  return { isUsable: true, durationMs, ...size, contentType: isMp4 ? 'video/mp4' : 'video/webm' }
}

/** Said of a file that looks like a video but whose pictures cannot be read. */
export const unreadablePicture = (): Judgement => refuse(cannotBeRead)
