import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { showCueText } from '../../../shared/captions/cueText'
import { readCaptions } from '../../../shared/captions/read'
import { writeCaptions } from '../../../shared/captions/write'
import type { Cue } from '../../../shared/contracts/media'

const encode = (text: string) => new TextEncoder().encode(text)

describe('writeCaptions', () => {
  const words = fc.string({
    unit: fc.constantFrom(...'abcäß漢 <>&;/-\n'.split(''), '<b>', '</b>', '-->'),
    minLength: 1,
    maxLength: 60,
  })
  const cue = fc.record({
    length: fc.integer({ min: 1, max: 9000 }),
    pause: fc.integer({ min: 0, max: 4000 }),
    text: words.filter((text) => /[acäß漢]/.test(text)),
    cueId: fc.constantFrom('', 'first', '12'),
    settings: fc.constantFrom('', 'line:90%', 'align:start size:80%'),
  })

  it('gives back times, names, settings and the words on the screen', () => {
    fc.assert(
      fc.property(fc.array(cue, { minLength: 1, maxLength: 12 }), (parts) => {
        let now = 0
        const cues: Cue[] = parts.map(({ length, pause, ...rest }) => {
          const startMs = now + pause
          now = startMs + length
          return { ...rest, startMs, endMs: now }
        })
        const text = writeCaptions({ preamble: 'WEBVTT\n\nNOTE ours' }, cues)
        const result = readCaptions(encode(text))
        if (!result.ok) throw new Error(`${JSON.stringify(result.errors)} in ${text}`)
        expect(result.preamble).toBe('WEBVTT\n\nNOTE ours')
        const timed = ({ cueId, startMs, endMs, settings }: Cue) => ({
          cueId,
          startMs,
          endMs,
          settings,
        })
        expect(result.cues.map(timed)).toEqual(cues.map(timed))
        result.cues.forEach(({ text: read }, index) => {
          const typed = cues[index]!.text
          if (/[<&]/.test(typed)) return
          expect(showCueText(read)).toBe(typed.replace(/\n+/g, '\n').replace(/^\n|\n$/g, ''))
        })
        expect(writeCaptions(result, result.cues)).toBe(text)
      }),
      { numRuns: 300 },
    )
  })

  it('keeps the words of a text whose signs stand for themselves', () => {
    const texts = [
      'a < b & c > d',
      'if 3 <b 4',
      '<v Ana>Hold it</v>',
      'one --> two',
      'a\n\nb',
      '<b>x',
    ]
    const cues = texts.map((text, index) => ({
      cueId: '',
      startMs: index * 2000,
      endMs: index * 2000 + 1500,
      settings: '',
      text,
    }))
    const back = readCaptions(encode(writeCaptions({ preamble: '' }, cues)))
    expect(back.ok && back.cues.map(({ text }) => showCueText(text))).toEqual([
      'a < b & c > d',
      'if 3 <b 4',
      'Hold it',
      'one --> two',
      'a\nb',
      '<b>x',
    ])
  })
})
