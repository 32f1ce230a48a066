import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readCaptions } from '../../../shared/captions/read'
import type { Cue } from '../../../shared/contracts/media'

const encode = (text: string) => new TextEncoder().encode(text)
const read = (text: string) => readCaptions(encode(text))

function cuesOf(text: string): Cue[] {
  const result = read(text)
  if (!result.ok) throw new Error(JSON.stringify(result.errors))
  return result.cues
}
function errorsOf(bytes: string | Uint8Array) {
  const result = readCaptions(typeof bytes === 'string' ? encode(bytes) : bytes)
  return result.ok ? [] : result.errors
}
function marksOf(text: string) {
  const result = read(text)
  return result.ok ? result.marks : []
}

const one = '00:01.000 --> 00:04.000\nSet the string.\n'

describe('readCaptions', () => {
  it('reads times, names, settings and words as they stand', () => {
    const cues = cuesOf(
      `WEBVTT\n\nfirst\n01:02:03.004 --> 100:00:00.000   line:90%  align:start\nSet the\nstring.\n`.replace(
        '100:00:00.000',
        '01:02:05.000',
      ),
    )
    expect(cues).toEqual([
      {
        cueId: 'first',
        startMs: 3_723_004,
        endMs: 3_725_000,
        settings: 'line:90% align:start',
        text: 'Set the\nstring.',
      },
    ])
  })

  it.each([
    ['a byte order mark', `\uFEFFWEBVTT\n\n${one}`],
    ['CRLF', `WEBVTT\n\n${one}`.replaceAll('\n', '\r\n')],
    ['CR alone', `WEBVTT\n\n${one}`.replaceAll('\n', '\r')],
    ['words after WEBVTT', `WEBVTT - pad, form and pour\n\n${one}`],
    ['a comment', `WEBVTT\n\nNOTE spoken by the builder\nin the yard\n\n${one}`],
    ['a style block', `WEBVTT\n\nSTYLE\n::cue { color: white }\n\n${one}`],
    ['a region', `WEBVTT\n\nREGION\nid:low\nwidth:40%\n\n${one}`],
    ['a header of another program', `WEBVTT\nKind: captions\nLanguage: en\n\n${one}`],
    ['no line break at the end', `WEBVTT\n\n${one.trim()}`],
  ])('takes %s', (_what, text) => {
    expect(cuesOf(text)).toEqual([
      { cueId: '', startMs: 1000, endMs: 4000, settings: '', text: 'Set the string.' },
    ])
  })

  it('keeps what stands above the first caption', () => {
    const result = read(
      `WEBVTT log store\n\nNOTE by Maren\n\nSTYLE\n::cue { color: white }\n\n${one}`,
    )
    expect(result).toMatchObject({
      ok: true,
      preamble: 'WEBVTT log store\n\nNOTE by Maren\n\nSTYLE\n::cue { color: white }',
    })
  })

  it('takes a setting that names a region', () => {
    const [cue] = cuesOf(
      'WEBVTT\n\nREGION\nid:low\n\n00:01.000 --> 00:04.000 region:low\nHi there\n',
    )
    expect(cue?.settings).toBe('region:low')
  })

  it('keeps captions that overlap, with a mark on the first', () => {
    const text =
      'WEBVTT\n\n00:01.000 --> 00:04.000\nOne of us\n\n00:03.000 --> 00:06.000\nAnother\n'
    expect(cuesOf(text)).toHaveLength(2)
    expect(marksOf(text)).toContainEqual({
      line: 3,
      column: 1,
      message: 'It still stands when the next one comes, for 1.0 s.',
    })
  })

  it('keeps a lone & and marks it', () => {
    const text = 'WEBVTT\n\n00:01.000 --> 00:04.000\nSand & gravel\n'
    expect(cuesOf(text)[0]?.text).toBe('Sand & gravel')
    expect(marksOf(text)).toMatchObject([{ line: 4 }])
  })

  it('puts the standard’s sign in the place of NUL, and marks it', () => {
    const text = 'WEBVTT\n\n00:01.000 --> 00:04.000\nSet\0 the string and pull it tight\n'
    expect(cuesOf(text)[0]?.text).toBe('Set\uFFFD the string and pull it tight')
    expect(marksOf(text)).toMatchObject([{ line: 4, column: 4 }])
  })

  it('reads the captions that ship with the project', () => {
    const result = readCaptions(readFileSync('media/built/squaring-the-form.vtt'))
    expect(result.ok && result.cues.length).toBeGreaterThan(10)
  })

  it('reads 5,000 captions and refuses 5,001', () => {
    const file = (count: number) =>
      'WEBVTT\n\n' +
      Array.from({ length: count }, (_, second) => {
        const clock = new Date(second * 2000).toISOString().slice(11, 23)
        const end = new Date(second * 2000 + 1500).toISOString().slice(11, 23)
        return `${clock} --> ${end}\nSet the string.`
      }).join('\n\n')
    expect(cuesOf(file(5000))).toHaveLength(5000)
    expect(errorsOf(file(5001))).toMatchObject([{ line: 1, column: 1 }])
  })
})

describe('readCaptions of what is not in order', () => {
  it.each([
    ['an empty file', '', 1, 1, /empty/],
    ['no WEBVTT', one, 1, 1, /first line has to be WEBVTT/],
    ['no caption', 'WEBVTT\n\n', 1, 1, /no caption/],
    [
      'a decimal comma',
      'WEBVTT\n\n00:01,000 --> 00:04.000\nHi\n',
      3,
      6,
      /point before the thousandths/,
    ],
    [
      'an end before the start',
      'WEBVTT\n\n00:04.000 --> 00:01.000\nHi\n',
      3,
      24,
      /ends before it has begun/,
    ],
    [
      'an end at the start',
      'WEBVTT\n\n00:04.000 --> 00:04.000\nHi\n',
      3,
      24,
      /ends before it has begun/,
    ],
    [
      'times that go back',
      'WEBVTT\n\n00:04.000 --> 00:06.000\nHi\n\n00:01.000 --> 00:03.000\nHo\n',
      6,
      10,
      /begins before the one above/,
    ],
    [
      'a caption without words',
      'WEBVTT\n\n00:01.000 --> 00:04.000\n\n' + one.replace('1', '5').replace('4', '8'),
      3,
      1,
      /no words/,
    ],
    ['a caption of tags alone', 'WEBVTT\n\n00:01.000 --> 00:04.000\n<b></b>\n', 3, 1, /no words/],
    ['no arrow', 'WEBVTT\n\n00:01.000 00:04.000\nHi\n', 4, 1, /times of a caption are expected/],
    ['seconds over 59', 'WEBVTT\n\n00:61.000 --> 00:64.000\nHi\n', 3, 10, /Seconds end at 59/],
    [
      'a tag left open',
      'WEBVTT\n\n00:01.000 --> 00:04.000\nfirst\n<b>second\n',
      5,
      10,
      /never closed/,
    ],
    ['an unknown tag', 'WEBVTT\n\n00:01.000 --> 00:04.000\nHi <blink>there\n', 4, 11, /&lt;/],
    [
      'an unknown setting',
      'WEBVTT\n\n00:01.000 --> 00:04.000 colour:red\nHi\n',
      3,
      25,
      /not known/,
    ],
    [
      'a style after a caption',
      `WEBVTT\n\n${one}\nSTYLE\n::cue {}\n`,
      8,
      1,
      /above the first caption/,
    ],
    [
      'no blank line before the next',
      `WEBVTT\n\n${one}00:05.000 --> 00:08.000\nHo\n`,
      5,
      1,
      /blank line before/,
    ],
    [
      'a caption later than a day',
      'WEBVTT\n\n24:00:00.000 --> 24:00:01.000\nHi\n',
      3,
      1,
      /later than a day/,
    ],
    [
      'a caption as long as a page',
      `WEBVTT\n\n00:01.000 --> 00:04.000\n${'word '.repeat(500)}\n`,
      4,
      1,
      /2500 characters/,
    ],
  ])('names %s by line and column', (_what, text, line, column, message) => {
    const errors = errorsOf(text)
    expect(errors).toContainEqual({
      line,
      column,
      message: expect.stringMatching(message) as string,
    })
  })

  it('names the line and column of the first byte that is not UTF-8', () => {
    const latin1 = Uint8Array.from(
      Buffer.from('WEBVTT\r\n\r\n00:01.000 --> 00:04.000\r\nDie Säge\r\n', 'latin1'),
    )
    expect(errorsOf(latin1)).toEqual([
      { line: 4, column: 6, message: expect.stringContaining('UTF-8') as string },
    ])
  })

  it.each([
    ['with its mark', '\uFEFF'],
    ['without a mark', ''],
  ])('knows UTF-16 %s', (_what, mark) => {
    const bytes = Uint8Array.from(Buffer.from(`${mark}WEBVTT\n\n${one}`, 'utf16le'))
    expect(errorsOf(bytes)).toMatchObject([
      { line: 1, column: 1, message: expect.stringContaining('UTF-16') as string },
    ])
  })

  it('lists several errors in the order of their places', () => {
    const errors = errorsOf(
      'WEBVTT\n\n00:01,000 --> 00:04.000\nHi\n\n00:05.000 --> 00:04.000\nHo\n',
    )
    expect(errors.map(({ line }) => line)).toEqual([3, 6])
  })

  it('refuses a file of hardly anything but tags before it is parsed', () => {
    const nested = `00:01.000 --> 00:04.000\n${'<b>'.repeat(600)}x\n\n`
    expect(errorsOf(`WEBVTT\n\n${nested.repeat(70)}`)).toMatchObject([
      { line: 1, message: expect.stringMatching(/more than 40000 tags/) as string },
    ])
  })

  it('survives tags nested without end, and any bytes at all', () => {
    expect(errorsOf(`WEBVTT\n\n00:01.000 --> 00:04.000\n${'<b>'.repeat(30_000)}\n`)).not.toEqual([])
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 400 }), (bytes) => {
        expect(typeof readCaptions(bytes).ok).toBe('boolean')
      }),
    )
    fc.assert(
      fc.property(
        fc.array(
          fc.constantFrom('WEBVTT', '\n', '\n\n', '-->', '00:01.000', ' ', '<b>', '&', 'NOTE', 'x'),
        ),
        (parts) => {
          const result = read(parts.join(''))
          expect(result.ok || result.errors.length > 0).toBe(true)
        },
      ),
    )
  })
})
