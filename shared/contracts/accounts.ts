import { z } from 'zod'
import { unitSystemSchema } from './unitSystem'

const displayNameSchema = z
  .string()
  .trim()
  .min(1, 'Write the name others will see.')
  .max(60, 'At most 60 characters.')
const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, 'At most 254 characters.')
  .regex(/^[^\s@]+@[^\s@]+$/, 'An address with an @ in it.')
/** Length only, as OWASP advises: no rules about kinds of characters. */
const newPassphraseSchema = z
  .string()
  .min(12, 'Twelve characters or more. Four words you can picture do well.')
  .max(128, 'At most 128 characters.')

export const themeSchema = z.enum(['paper', 'sun'])

export const signUpSchema = z.strictObject({
  displayName: displayNameSchema,
  email: emailSchema,
  passphrase: newPassphraseSchema,
  units: unitSystemSchema,
  isOldEnough: z.literal(true, 'Tick this to go on.'),
})
export type SignUp = z.infer<typeof signUpSchema>

export const signInSchema = z.strictObject({
  email: emailSchema,
  passphrase: z.string().min(1, 'Write your passphrase.').max(128, 'At most 128 characters.'),
})
export type SignIn = z.infer<typeof signInSchema>

export const changeAccountSchema = z.strictObject({
  displayName: displayNameSchema.optional(),
  about: z.string().trim().max(500, 'At most 500 characters.').optional(),
  units: unitSystemSchema.optional(),
  theme: themeSchema.optional(),
})
export type ChangeAccount = z.infer<typeof changeAccountSchema>

/** The signed-in person, as only they see it. */
export const meSchema = z.object({
  id: z.number(),
  email: z.string(),
  displayName: z.string(),
  about: z.string(),
  role: z.enum(['learner', 'instructor', 'admin']),
  units: unitSystemSchema,
  theme: themeSchema,
  /** How many devices are signed in, this one among them. */
  sessions: z.number(),
  /** Hints for the interface; the server decides again at every request. */
  can: z.object({ createCourse: z.boolean(), openBench: z.boolean() }),
  /** On the staff of a course, as owner or helper. */
  isStaff: z.boolean(),
})
export type Me = z.infer<typeof meSchema>

/** `null` for a visitor. */
export const whoSchema = z.object({ user: meSchema.nullable() })
export type Who = z.infer<typeof whoSchema>
