import { describe, expect, it } from 'vitest'
import { readPackingFile } from '../../../server/cli/packingFile'

describe('readPackingFile', () => {
  it('reads identifier, capacity, items and best-known number, whatever the spaces', () => {
    const text = '2\n u120_00\n 150 3 2\n42\n69\n  67\n u120_01\n 150 1 1\n57\n'
    expect(readPackingFile(text)).toEqual([
      { id: 'u120_00', capacity: 150, lengths: [42, 69, 67], bestKnown: 2 },
      { id: 'u120_01', capacity: 150, lengths: [57], bestKnown: 1 },
    ])
  })

  it('takes decimals as the whole numbers they stand for', () => {
    expect(readPackingFile('1\r\n t60_00\r\n 100.0 2 1\r\n49.5\r\n33.25\r\n')).toEqual([
      { id: 't60_00', capacity: 10_000, lengths: [4950, 3325], bestKnown: 1 },
    ])
  })

  it.each([
    ['', 'The file ends before its last problem does.'],
    ['2\nu1\n150 1 1\n42\n', 'The file ends before its last problem does.'],
    ['one\n', 'Line 1 is “one”; expected there: 1 plain numbers.'],
    [
      '1\nx1\n150 1 1\n42\n',
      'Line 2 is “x1”; an identifier beginning with u or t is expected there.',
    ],
    ['1\nu1\n150 1\n42\n', 'Line 3 is “150 1”; expected there: 3 plain numbers.'],
    ['1\nu1\n150 1 1\n-42\n', 'Line 4 is “-42”; expected there: 1 plain numbers.'],
  ])('refuses %j', (text, sentence) => {
    expect(() => readPackingFile(text)).toThrow(sentence)
  })
})
