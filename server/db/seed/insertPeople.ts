import { hashPassphrase } from '../../accounts/passwords'
import type { Transaction } from '../client'
import { users } from '../schema'
import { people, type PersonKey } from './people'

export type PersonIds = Record<PersonKey, number>

/** Adds everyone of the demo; one hash for each passphrase, for hashes are slow on purpose. */
export async function insertPeople(tx: Transaction): Promise<PersonIds> {
  const passphrases = [...new Set(Object.values(people).map(({ passphrase }) => passphrase))]
  const hashes = new Map(
    await Promise.all(passphrases.map(async (text) => [text, await hashPassphrase(text)] as const)),
  )
  const ids: Partial<PersonIds> = {}
  for (const [key, { passphrase, joinedOn, ...person }] of Object.entries(people)) {
    const [row] = await tx
      .insert(users)
      .values({
        ...person,
        passwordHash: hashes.get(passphrase) ?? '',
        createdAt: new Date(joinedOn),
      })
      .$returningId()
    ids[key as PersonKey] = row?.id ?? 0
  }
  return ids as PersonIds
}
