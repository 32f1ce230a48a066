import type { SignedIn } from './accounts/accounts.service'

declare global {
  namespace Express {
    interface Request {
      /** The signed-in person, null for a visitor; set by authenticate. */
      actor: SignedIn | null
    }
  }
}

declare module 'express-session' {
  interface SessionData {
    userId: number
    /** When this session was signed in, in ms; decides the absolute limit. */
    signedInAt: number
    /** A visitor's tries at the stops of sample lessons, and staff's in a preview. */
    samples: Record<
      string,
      { seed: number; triesUsed: number; solved: boolean; answeredKey?: string }
    >
    /** Their ticked kit items, by the lesson's id. */
    kit: Record<string, string[]>
  }
}
