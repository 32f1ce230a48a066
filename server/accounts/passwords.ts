import argon2 from 'argon2'

/** Argon2id no weaker than OWASP's password storage cheat sheet: 19 MiB, 2 passes, 1 lane. */
const parameters = { type: argon2.argon2id, memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 }

/** At most two hashes at once; the rest wait in line, so that a flood of sign-ins leaves a core free. */
const places = 2
let busy = 0
const waiting: (() => void)[] = []

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (busy >= places) await new Promise<void>((resolve) => waiting.push(resolve))
  else busy++
  try {
    return await work()
  } finally {
    const next = waiting.shift()
    if (next) next()
    else busy--
  }
}

/** Hashes a passphrase with a salt of its own. */
export const hashPassphrase = (passphrase: string) =>
  inTurn(() => argon2.hash(passphrase.normalize('NFKC'), parameters))

let decoy: Promise<string> | null = null

/**
 * True when the passphrase belongs to the hash. Without a hash (no such account) it takes as long
 * and says false, so that answers do not tell which addresses exist.
 */
export async function isPassphrase(passphrase: string, hash: string | null): Promise<boolean> {
  const against = hash ?? (await (decoy ??= hashPassphrase('nobody has this passphrase')))
  const fits = await inTurn(() => argon2.verify(against, passphrase.normalize('NFKC')))
  return fits && hash !== null
}

/** True when the hash was made with weaker parameters than today's. */
export const isOutdatedHash = (hash: string) => argon2.needsRehash(hash, parameters)
