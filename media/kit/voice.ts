import { execFileSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { SAMPLE_RATE } from './timeline'

const VOICE = 'cmu_us_slt_arctic_hts'
/** Below 1 the voice speaks more slowly; the only setting of the voice that has an effect. */
const RATE = 0.91
/** A sample counts as sound from here on, of 32 767. */
const QUIET = 220
const KEEP_BEFORE = 0.02
const KEEP_AFTER = 0.08

/** Speaks each sentence once, keeps the recordings in `cacheDir`, returns their samples without the silence round them. */
export function speak(sentences: string[], cacheDir: string): Int16Array[] {
  mkdirSync(cacheDir, { recursive: true })
  return sentences.map((sentence) => {
    const file = join(cacheDir, `${hashOf(sentence)}.wav`)
    if (!existsSync(file)) synthesise(sentence, file)
    return trimSilence(readSamples(file))
  })
}

function hashOf(sentence: string): string {
  return createHash('sha256').update(`${VOICE}|${RATE}|${sentence}`).digest('hex').slice(0, 24)
}

function synthesise(sentence: string, file: string): void {
  const script = `${file}.scm`
  const raw = `${file}.part`
  const quoted = JSON.stringify(sentence)
  writeFileSync(
    script,
    `(voice_${VOICE})
(set! hts_engine_params (cons '("-r" ${RATE}) hts_engine_params))
(utt.save.wave (utt.synth (Utterance Text ${quoted})) ${JSON.stringify(raw)} 'riff)
`,
  )
  try {
    execFileSync('festival', ['-b', script], { stdio: ['ignore', 'ignore', 'pipe'] })
    renameSync(raw, file)
  } finally {
    rmSync(script, { force: true })
  }
}

function readSamples(file: string): Int16Array {
  const bytes = readFileSync(file)
  const rate = bytes.readUInt32LE(24)
  if (rate !== SAMPLE_RATE) throw new Error(`${file} has ${rate} samples a second.`)
  const data = bytes.indexOf('data', 12, 'latin1') + 8
  const samples = new Int16Array(Math.floor((bytes.length - data) / 2))
  for (let i = 0; i < samples.length; i++) samples[i] = bytes.readInt16LE(data + 2 * i)
  return samples
}

function trimSilence(samples: Int16Array): Int16Array {
  const isSound = (sample: number) => Math.abs(sample) > QUIET
  const first = samples.findIndex(isSound)
  if (first < 0) throw new Error('The voice said nothing.')
  const last = samples.findLastIndex(isSound)
  const from = Math.max(0, first - KEEP_BEFORE * SAMPLE_RATE)
  return samples.slice(from, last + KEEP_AFTER * SAMPLE_RATE)
}
