import { execFileSync } from 'node:child_process'
import { describe, expect, it } from 'vitest'
import { runCalc } from '../../../server/cli/calc'
import type { CalcSuccess } from '../../../server/cli/calcJson'
import { calculators } from '../../../shared/calculators/index'

const noFile = () => {
  throw new Error('ENOENT: no such file')
}
const run = (id: string, inputs: unknown) => {
  const { text, exitCode } = runCalc([id, JSON.stringify(inputs)], noFile)
  return { exitCode, json: JSON.parse(text) as unknown }
}
const runWell = (id: string, inputs: unknown) => {
  const { exitCode, json } = run(id, inputs)
  expect(exitCode).toBe(0)
  return json as CalcSuccess
}
const check = (cases: unknown) => runCalc(['check', 'cases.json'], () => JSON.stringify(cases))
const pad = { length: 2.6, width: 1.1, thickness: 0.1 }

describe('calc ID JSON', () => {
  it('takes plain numbers in SI and texts with a unit for the same', () => {
    const plain = runWell('slab', pad)
    const typed = runWell('slab', { length: '2600 mm', width: '1,1 m', thickness: '10 cm' })
    expect(typed).toEqual(plain)
    expect(plain.id).toBe('slab')
    expect(plain.outputs['bags']).toEqual({
      value: 28,
      unit: '1',
      shown: { metric: '28', imperial: '28' },
    })
    expect(plain.outputs['volume']).toMatchObject({
      unit: 'm³',
      shown: { metric: '0.286\u00a0m³', imperial: '0.374\u00a0yd³' },
    })
    expect(plain.outputs['volume']?.value).toBeCloseTo(0.286, 12)
    expect(plain.steps.length).toBeGreaterThan(3)
    expect(plain.cautions).toContainEqual(expect.objectContaining({ title: 'Wet cement burns' }))
  })

  it('says angles in degrees, both ways', () => {
    const { outputs } = runWell('pitch', { degrees: 45 })
    expect(outputs['degrees']).toMatchObject({ unit: 'deg' })
    expect(outputs['degrees']?.value).toBeCloseTo(45, 9)
    expect(outputs['percent']).toMatchObject({ unit: '%' })
    expect(outputs['risePer12']?.value).toBeCloseTo(12, 9)
  })

  it('leaves out what was not worked out', () => {
    const { outputs } = runWell('mix', { bag: '25 kg', waterAdded: '2.8 L', slump: null })
    expect(outputs).not.toHaveProperty('slumpClass')
    expect(outputs['verdict']).toEqual({
      value: 'right',
      unit: 'choice',
      shown: { metric: 'Right', imperial: 'Right' },
    })
  })

  it('takes true and false for yes and no', () => {
    const { outputs } = runWell('slab', { ...pad, flatBase: true, fall: '20 mm/m' })
    expect(outputs['meanThickness']?.value).toBeCloseTo(0.111, 12)
  })

  it.each([
    [
      'slab',
      { ...pad, thickness: -0.1 },
      'thickness',
      /^Thickness: −100.mm is out of range\. Give 20.mm to 1000.mm\.$/,
    ],
    ['slab', { ...pad, length: '400 m' }, 'length', /400.000.mm is out of range/],
    ['slab', { ...pad, length: '3 bananas' }, 'length', /“3 bananas” cannot be read as a length/],
    ['slab', { ...pad, length: ['3 m'] }, 'length', /must be a number or a text with a unit/],
    ['slab', { ...pad, bag: '35 kg' }, 'bag', /“35 kg” is not one of them/],
    ['slab', { ...pad, bag: 25 }, 'bag', /“25” is not one of them/],
    ['slab', { length: 3, width: 2 }, 'thickness', /Thickness is missing/],
    [
      'slab',
      { ...pad, depth: 1 },
      'depth',
      /has no input “depth”. It takes: length, width, thickness,/,
    ],
    ['slab', [], 'inputs', /one JSON object/],
    ['pitch', { degrees: 90 }, 'degrees', /^Degrees: 90° is out of range\. Give .+ to 80°\.$/],
    ['pitch', {}, 'risePer12', /Say the slope in one way/],
    ['square', { sideA: 2.6, sideB: 1.1, unit: 0.4 }, 'unit', /does not fit these sides/],
    ['moon', {}, 'id', /There is no calculator “moon”. There are: slab, mix,/],
  ])('%s %j: exit 1, naming %s', (id, inputs, input, sentence) => {
    const { exitCode, json } = run(id, inputs)
    expect(exitCode).toBe(1)
    expect(json).toEqual({ error: { input, message: expect.stringMatching(sentence) as string } })
  })

  it.each([
    [['slab', '{length: 3}'], 'inputs'],
    [['slab', '{"length": 1e999, "width": 1, "thickness": 0.1}'], 'length'],
    [[], 'id'],
    [['check'], 'file'],
    [['check', 'none.json'], 'file'],
  ])('%j: exit 1, naming %s', (words, input) => {
    const { text, exitCode } = runCalc(words, noFile)
    expect(exitCode).toBe(1)
    expect(JSON.parse(text)).toMatchObject({ error: { input } })
  })
})

describe('calc list', () => {
  it('names every calculator with its inputs, bounds and outputs', () => {
    const { text, exitCode } = runCalc(['list'], noFile)
    expect(exitCode).toBe(0)
    const listed = JSON.parse(text) as {
      id: string
      inputs: { name: string }[]
      outputs: { name: string }[]
    }[]
    expect(listed.map(({ id }) => id)).toEqual([...calculators.map(({ id }) => id), 'cutlist'])
    const pitch = listed.find(({ id }) => id === 'pitch')
    expect(pitch?.inputs.find(({ name }) => name === 'degrees')).toMatchObject({
      unit: 'deg',
      max: 80,
      optional: true,
    })
    expect(pitch?.outputs.map(({ name }) => name)).toContain('hipPerRun')
  })
})

describe('calc check', () => {
  const sound = {
    id: 'pad',
    calculator: 'slab',
    inputs: pad,
    expected: { volume: 0.286, bags: 28 },
    unit: 'm3',
    tolerance: 0.0001,
    source: 'by hand',
  }

  it('closes with the count alone when all pass', () => {
    expect(
      check([sound, { ...sound, expected: { volume: 10.1 }, unit: 'ft3', tolerance: 0.01 }]),
    ).toEqual({ text: '2 passed, 0 failed', exitCode: 0 })
  })

  it('checks words, and degrees in degrees', () => {
    const word = {
      id: 'cone',
      calculator: 'mix',
      inputs: { waterAdded: '2.8 L', slump: '70 mm' },
      expected: { slumpClass: 'S2' },
      unit: '',
      tolerance: 0,
    }
    const angle = {
      id: 'roof',
      calculator: 'pitch',
      inputs: { risePer12: 4 },
      expected: { degrees: 18.43 },
      unit: 'deg',
      tolerance: 0.01,
    }
    const square = {
      id: 'form',
      calculator: 'diagonals',
      inputs: { length: 3, width: 4, diagonal1: 5, diagonal2: 5 },
      expected: { square: true },
      tolerance: 0,
    }
    expect(check([word, angle, square])).toEqual({ text: '3 passed, 0 failed', exitCode: 0 })
  })

  it.each([
    [
      'a number outside its tolerance',
      { expected: { volume: 0.2862 } },
      'pad: volume expected 0.2862 ± 0.0001, got 0.286',
    ],
    [
      'an answer that does not exist',
      { expected: { weight: 1 } },
      'pad: weight is no answer of slab',
    ],
    ['a unit of something else', { unit: 'kg' }, 'pad: volume is never in “kg”'],
    ['inputs that are refused', { inputs: { ...pad, length: 400 } }, 'pad: length: Length: 400'],
    ['an unknown calculator', { calculator: 'moon' }, 'pad: there is no calculator “moon”'],
    ['nothing expected', { expected: {} }, 'pad: nothing is expected'],
    ['no tolerance', { tolerance: undefined }, 'case 1: tolerance'],
  ])('fails for %s', (_case, changes, line) => {
    const { text, exitCode } = check([{ ...sound, ...changes }])
    expect(exitCode).toBe(1)
    expect(text).toContain(line)
    expect(text.split('\n').at(-1)).toBe('0 passed, 1 failed')
  })

  it('refuses a file that is not JSON', () => {
    const { text, exitCode } = runCalc(['check', 'cases.json'], () => 'volume = 3')
    expect(exitCode).toBe(1)
    expect(text).toContain('cases.json cannot be read')
  })
})

describe('npm run calc', () => {
  it('prints nothing but JSON', () => {
    const inputs = JSON.stringify(pad)
    const printed = execFileSync('npm', ['run', '--silent', 'calc', '--', 'slab', inputs], {
      encoding: 'utf8',
    })
    expect((JSON.parse(printed) as CalcSuccess).outputs['bags']?.value).toBe(28)
  })
})
