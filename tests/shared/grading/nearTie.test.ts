import { describe, expect, it } from 'vitest'
import { findCalculator, runCalculator } from '../../../shared/calculators/index'
import { findNearTie } from '../../../shared/grading/nearTie'

function tieOf(id: string, asked: string, texts: Record<string, string>) {
  const calculator = findCalculator(id)
  if (!calculator) throw new Error(`No ${id}`)
  const run = runCalculator(calculator, texts, 'metric')
  if (!run.ok) throw new Error(JSON.stringify(run.errors))
  return findNearTie(calculator, run.values, asked, 'metric')
}

/** 1 m³ with 20 L a bag and no waste: exactly 50 bags, a cubic centimetre more is the 51st. */
const cube = { length: '5 m', width: '2 m', thickness: '100 mm', waste: '0', bag: '25 kg' }

describe('findNearTie', () => {
  it('names the input that decides a whole bag', () => {
    expect(tieOf('slab', 'bags', { ...cube, bagYield: '20 L' })).toBe('length')
  })

  it('finds none in the middle between two bags', () => {
    expect(tieOf('slab', 'bags', { ...cube, bagYield: '19.8 L' })).toBeUndefined()
  })

  it('finds none in a number that is not rounded', () => {
    expect(tieOf('slab', 'volume', { ...cube, bagYield: '20 L' })).toBeUndefined()
  })

  it('names the input that decides a word', () => {
    const diagonals = { length: '2600 mm', width: '1100 mm', diagonal1: '2823 mm' }
    const checked = { ...diagonals, diagonal2: '2827 mm', tolerance: '3 mm' }
    expect(tieOf('diagonals', 'square', checked)).toBe('diagonal1')
  })
})
