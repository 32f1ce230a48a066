import { spawnSync } from 'node:child_process'
import { copyFileSync, mkdirSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { config } from '../../../server/config'
import { judgeVideo } from '../../../server/media/judgeVideo'
import { probeFile } from '../../../server/media/probe'
import { filmPath, type Film } from '../../support/films'

const judge = async (path: string) => judgeVideo(await probeFile(path))
const folder = join(config.dataDir, 'judged')
mkdirSync(folder, { recursive: true })
function write(name: string, content: string) {
  const path = join(folder, name)
  writeFileSync(path, content)
  return path
}

describe('judgeVideo', () => {
  it.each<[Film, string, number, number]>([
    ['plain.mp4', 'video/mp4', 320, 180],
    ['silent.mp4', 'video/mp4', 320, 180],
    ['film.webm', 'video/webm', 320, 180],
  ])('takes %s', async (film, contentType, width, height) => {
    const judgement = await judge(filmPath(film))
    expect(judgement).toMatchObject({ isUsable: true, contentType, width, height })
    expect(judgement.isUsable && Math.abs(judgement.durationMs - 2000)).toBeLessThan(60)
  })

  it.each<[Film, RegExp]>([
    ['sound.m4a', /sound but no moving picture/],
    ['old.avi', /avi file/],
    ['mpeg4.mp4', /stored as mpeg4/],
    ['full-colour.mp4', /yuv444p/],
    ['surround.mp4', /sound is stored as ac3/],
    ['still.png', /not a video/],
  ])('refuses %s in a sentence that says what to do', async (film, reason) => {
    const judgement = await judge(filmPath(film))
    expect(judgement).toMatchObject({
      isUsable: false,
      refusal: expect.stringMatching(reason) as string,
    })
    expect(!judgement.isUsable && judgement.refusal).toContain('H.264')
  })

  it('5.2.2 goes by what is in a file, not by its name', async () => {
    const film = join(folder, 'notes.txt')
    copyFileSync(filmPath('plain.mp4'), film)
    expect(await judge(film)).toMatchObject({ isUsable: true })
    expect(await judge(write('film.mp4', 'Just a few words.'))).toMatchObject({ isUsable: false })
    expect(await judge(write('empty.mp4', ''))).toMatchObject({ isUsable: false })
  })

  it('opens no playlist, whose lines could name other files of the machine', async () => {
    const playlist = `#EXTM3U\n#EXT-X-TARGETDURATION:2\n#EXTINF:2,\nfile:${filmPath('plain.mp4')}\n#EXT-X-ENDLIST\n`
    const list = `ffconcat version 1.0\nfile '${filmPath('plain.mp4')}'\n`
    for (const path of [write('list.mp4', playlist), write('concat.mp4', list)]) {
      expect(await judge(path)).toMatchObject({ isUsable: false })
    }
    const open = spawnSync('ffprobe', [
      '-v',
      'error',
      '-allowed_extensions',
      'ALL',
      join(folder, 'list.mp4'),
    ])
    expect(open.status, 'the playlist would open without the limits').toBe(0)
  })

  it('refuses a film without length, without end and too large', () => {
    const stream = {
      codec_type: 'video',
      codec_name: 'h264',
      pix_fmt: 'yuv420p',
      width: 320,
      height: 180,
    }
    const film = (duration: string | undefined, values = {}) =>
      judgeVideo({
        format: { format_name: 'mov,mp4,m4a', ...(duration ? { duration } : {}) },
        streams: [{ ...stream, ...values }],
      })
    expect(film('2.0')).toMatchObject({ isUsable: true, durationMs: 2000 })
    for (const refused of [
      film(undefined),
      film('0'),
      film('N/A'),
      film('86400.5'),
      film('2', { width: 9000 }),
    ]) {
      expect(refused).toMatchObject({ isUsable: false })
    }
    const cover = { attached_pic: 1 }
    expect(film('2.0', { disposition: cover })).toMatchObject({ isUsable: false })
  })

  it('turns the measures of a film that was held upright', () => {
    const judgement = judgeVideo({
      format: { format_name: 'mov,mp4', duration: '2' },
      streams: [
        {
          codec_type: 'video',
          codec_name: 'h264',
          pix_fmt: 'yuv420p',
          width: 320,
          height: 180,
          side_data_list: [{ rotation: -90 }],
        },
      ],
    })
    expect(judgement).toMatchObject({ width: 180, height: 320 })
  })
})
