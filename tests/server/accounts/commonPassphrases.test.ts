import { describe, expect, it } from 'vitest'
import { isEasilyGuessed } from '../../../server/accounts/commonPassphrases'

describe('6.2.4 a passphrase that is tried first', () => {
  it.each([
    '123456789012',
    '210987654321',
    'passwordpassword',
    'Password1234',
    'p a s s w o r d 1 2 3 4',
    'qwertyuiop123',
    'aaaaaaaaaaaa',
    'abcabcabcabc',
    '1q2w3e4r5t6y',
    'letmein12345',
    'administrator1',
    'goodfooting123',
    'password!!!!!!!!',
  ])('is known: %s', (passphrase) => {
    expect(isEasilyGuessed(passphrase, [])).toBe(true)
  })

  it('is one’s own name or address, over and over', () => {
    expect(isEasilyGuessed('holmholmholm', ['Ines', 'Holm'])).toBe(true)
    expect(isEasilyGuessed('ines.holm.1234', ['ines', 'holm'])).toBe(true)
  })

  it.each([
    'gravel sand and a string',
    'first shovel in the ground',
    'ein Zaun um den Garten',
    'q9!xT4#pLm2z',
    'пять досок и молоток',
    '木の柵を三枚作ります今日は',
  ])('is not: %s', (passphrase) => {
    expect(isEasilyGuessed(passphrase, ['Ines', 'Holm', 'example', 'org'])).toBe(false)
  })
})
