/** Pieces that passphrases of many people are made of, from memory; the longest of each family first. */
const pieces = [
  ...['passwort', 'password', 'passphrase', 'passw0rd', 'letmein', 'welcome', 'iloveyou'],
  ...['administrator', 'changeme', 'trustno1', 'superman', 'football', 'baseball', 'sunshine'],
  ...['princess', 'starwars', 'computer', 'internet', 'whatever', 'michelle', 'jennifer'],
  ...['charlie', 'monkey', 'dragon', 'shadow', 'master', 'secret', 'summer', 'winter', 'spring'],
  ...['autumn', 'hello', 'admin', 'login', 'love', 'test', 'user', 'pass'],
  ...['goodfooting', 'footing'],
]
/** Rows of keys and orders that fingers and minds run along. */
const runs = [
  ...['01234567890123456789', 'abcdefghijklmnopqrstuvwxyz', 'qwertyuiop', 'qwertzuiop'],
  ...['azertyuiop', 'asdfghjkl', 'zxcvbnm', 'yxcvbnm', '1q2w3e4r5t6y7u8i9o0p'],
  ...['1qaz2wsx3edc4rfv5tgb6yhn', 'q1w2e3r4t5y6u7i8o9p0', 'qazwsxedcrfvtgbyhn'],
]
const backwards = (text: string) => Array.from(text).reverse().join('')
const everyRun = runs.flatMap((run) => [run, backwards(run)])

const shortestRun = 3
/** As many characters as must be left when everything that is easily guessed is taken away. */
const fewestOwn = 5

/** How many characters at the start of a text are one run. */
function measureRun(text: string): number {
  let length = shortestRun
  while (length <= text.length && everyRun.some((run) => run.includes(text.slice(0, length)))) {
    length++
  }
  return length === shortestRun ? 0 : length - 1
}

/** What is left of a text without the guessable pieces, runs and repetitions in it. */
function findOwn(text: string, guessable: string[]): string {
  let own = ''
  let rest = text
  while (rest !== '') {
    const piece = guessable.find((word) => rest.startsWith(word))
    const known = Math.max(piece?.length ?? 0, measureRun(rest))
    const isRepeated = known === 0 && own.includes(rest.slice(0, 2)) && rest.length > 1
    if (known === 0 && !isRepeated) own += rest.charAt(0)
    rest = rest.slice(known === 0 ? (isRepeated ? 2 : 1) : known)
  }
  return own
}

/** True when a passphrase is made of what is tried first: well-known words, runs, repetitions, one's own name. */
export function isEasilyGuessed(passphrase: string, ownWords: string[]): boolean {
  const plain = passphrase.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '')
  const own = ownWords.map((word) => word.toLowerCase()).filter((word) => word.length >= 3)
  return findOwn(plain, [...own, ...pieces]).length < fewestOwn
}
