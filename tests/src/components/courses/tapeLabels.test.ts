import { describe, expect, it } from 'vitest'
import { placeLabels } from '../../../../src/components/courses/tapeLabels'

const stop = (key: string, atMs: number, name = 'Both diagonals') => ({ key, name, atMs })

describe('placeLabels', () => {
  it('gives every stop its name where there is room', () => {
    const labels = placeLabels([stop('a', 10_000), stop('b', 40_000)], 60_000, 1200)
    expect([...labels.values()].every(({ isShort }) => !isShort)).toBe(true)
    expect(labels.get('a')?.overhang).toBe(14)
  })
  it('shows the number alone where the next label begins', () => {
    const labels = placeLabels([stop('a', 30_000), stop('b', 34_000)], 60_000, 1200)
    expect(labels.get('a')?.isShort).toBe(true)
    expect(labels.get('b')?.isShort).toBe(false)
  })
  it('moves the last label back onto the tape', () => {
    const label = placeLabels([stop('a', 59_000)], 60_000, 1200).get('a')
    expect(label?.isShort).toBe(false)
    expect(label?.overhang).toBeGreaterThan(100)
  })
  it('places nothing on a tape that has no width yet', () => {
    expect(placeLabels([stop('a', 1000)], 60_000, 0).size).toBe(0)
  })
})
