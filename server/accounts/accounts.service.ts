import type { ChangeAccount, Me, SignIn, SignUp } from '../../shared/contracts/accounts'
import { can } from '../../shared/contracts/policies'
import { isDuplicate } from '../db/transaction'
import { AppError, invalid } from '../errors'
import {
  countSessions,
  findUserByEmail,
  findUserById,
  insertUser,
  isOnAnyStaff,
  updateUser,
  type UserRow,
} from './accounts.queries'
import { isEasilyGuessed } from './commonPassphrases'
import { hashPassphrase, isOutdatedHash, isPassphrase } from './passwords'

/** A session ends at the latest this long after its sign-in. */
export const absoluteLimitMs = 30 * 24 * 3600_000

/** The signed-in person as the server's own code sees them. */
export type SignedIn = Pick<UserRow, 'id' | 'role' | 'displayName' | 'units'>

/** True when a session's sign-in lies too far back, or is unknown. */
export const isSessionTooOld = (signedInAt: number | undefined) =>
  signedInAt === undefined || Date.now() - signedInAt > absoluteLimitMs

/** The person a session belongs to, or null when the account is gone. */
export async function findSignedIn(userId: number): Promise<SignedIn | null> {
  const user = await findUserById(userId)
  if (!user) return null
  return { id: user.id, role: user.role, displayName: user.displayName, units: user.units }
}

/** Makes an account and returns its id; 400 for a passphrase that is guessed first, 409 when the address has one already. */
export async function signUp(input: SignUp): Promise<number> {
  const ownWords = [...input.email.split(/[@.]/), ...input.displayName.split(/\s+/)]
  if (isEasilyGuessed(input.passphrase, ownWords)) {
    throw invalid([
      {
        field: 'passphrase',
        message:
          'This one is tried first by whoever guesses. Take four words that only you put together.',
      },
    ])
  }
  const passwordHash = await hashPassphrase(input.passphrase)
  try {
    return await insertUser({
      email: input.email,
      displayName: input.displayName,
      units: input.units,
      passwordHash,
    })
  } catch (error) {
    if (!isDuplicate(error)) throw error
    throw new AppError(409, 'address-taken', 'This address has an account already.', {
      errors: [
        { field: 'email', message: 'This address has an account already. Sign in instead.' },
      ],
    })
  }
}

/** The id of the person whose address and passphrase these are; 400 without telling which was wrong. */
export async function signIn(input: SignIn): Promise<number> {
  const user = await findUserByEmail(input.email)
  const fits = await isPassphrase(input.passphrase, user?.passwordHash ?? null)
  if (!user || !fits) {
    throw invalid(
      [{ field: 'passphrase', message: 'Address and passphrase do not belong together.' }],
      'Address and passphrase do not belong together.',
    )
  }
  if (isOutdatedHash(user.passwordHash)) {
    await updateUser(user.id, { passwordHash: await hashPassphrase(input.passphrase) })
  }
  return user.id
}

/** What the signed-in person sees of their own account. */
export async function describeMe(userId: number): Promise<Me | null> {
  const user = await findUserById(userId)
  if (!user) return null
  return {
    id: user.id,
    email: user.email,
    displayName: user.displayName,
    about: user.about,
    role: user.role,
    units: user.units,
    theme: user.theme,
    sessions: await countSessions(userId),
    can: {
      createCourse: can(user, 'course:create'),
      openBench: user.role === 'learner' && can(user, 'account:open-bench'),
    },
    isStaff: await isOnAnyStaff(userId),
  }
}

/** Changes one's own name, text, units or theme. */
export const changeAccount = (userId: number, input: ChangeAccount) => updateUser(userId, input)

/** Makes a learner an instructor; an instructor or admin stays what they are. */
export async function openBench(userId: number) {
  const user = await findUserById(userId)
  if (user?.role === 'learner') await updateUser(userId, { role: 'instructor' })
}
