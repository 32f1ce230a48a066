import { describe, expect, it } from 'vitest'
import { db } from '../../server/db/client'
import { users } from '../../server/db/schema'
import { describeFailure } from '../../server/logger'

const secret = '$argon2id$a-hash-of-somebody'
const row = { email: 'ines@example.org', displayName: 'Ines', passwordHash: secret }

async function failForReal(): Promise<unknown> {
  await db.insert(users).values(row)
  return db
    .insert(users)
    .values(row)
    .then(
      () => null,
      (error: unknown) => error,
    )
}

describe('what is written down of a failure', () => {
  it('16.2.5 is not what a query was given, though the error itself holds it', async () => {
    const error = await failForReal()
    const everything = JSON.stringify([
      (error as Error).message,
      (error as Error).stack,
      (error as { cause: object }).cause,
    ])
    expect(everything).toContain(secret)
    const written = JSON.stringify(describeFailure(error))
    expect(written).not.toContain(secret)
    expect(written).not.toContain('ines@example.org')
    expect(written).toContain('1062')
    expect(written).toContain('insert into')
  })

  it('still says where it happened', () => {
    const written = JSON.stringify(describeFailure(new Error('the file is gone')))
    expect(written).toContain('the file is gone')
    expect(written).toContain('logger.test')
  })

  it('takes anything that is thrown', () => {
    for (const thrown of ['text', null, undefined, 7]) {
      expect(describeFailure(thrown)).toEqual({ message: typeof thrown })
    }
  })
})
