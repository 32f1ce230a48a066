/** Who asks: null stands for a visitor. */
export interface Actor {
  id: number
  role: 'learner' | 'instructor' | 'admin'
}

/** What is known of the thing that is asked about; the server fills it from the database only. */
export interface Thing {
  courseState?: 'draft' | 'issued' | 'closed'
  /** The actor's place on the course's staff. */
  staffRole?: 'owner' | 'helper' | null
  isEnrolled?: boolean
  /** The lesson is open to everyone. */
  isSample?: boolean
  /** The actor wrote the question or answer. */
  isAuthor?: boolean
  isIssued?: boolean
}

const isAdmin = (actor: Actor | null) => actor?.role === 'admin'
const isStaff = (actor: Actor | null, thing: Thing) =>
  isAdmin(actor) ||
  (actor !== null && (thing.staffRole === 'owner' || thing.staffRole === 'helper'))
const isOwner = (actor: Actor | null, thing: Thing) =>
  isAdmin(actor) || (actor !== null && thing.staffRole === 'owner')
const isIssued = (thing: Thing) => thing.courseState === 'issued' || thing.courseState === 'closed'
const isInside = (actor: Actor | null, thing: Thing) =>
  isStaff(actor, thing) || (actor !== null && thing.isEnrolled === true)

/** The one table of who may do what; routes and sockets ask it, the client shows its answers as hints. */
export const policies = {
  'account:open-bench': (actor) => actor !== null,
  'account:change': (actor) => actor !== null,
  'course:create': (actor) => actor?.role === 'instructor' || isAdmin(actor),
  'course:see-sheet': (actor, thing) => isIssued(thing) || isStaff(actor, thing),
  'course:see-bench': (actor, thing) => isStaff(actor, thing),
  'course:edit': (actor, thing) => isOwner(actor, thing),
  'course:issue': (actor, thing) => isOwner(actor, thing),
  'course:enrol': (actor, thing) =>
    actor !== null && thing.courseState === 'issued' && !thing.isEnrolled && !thing.staffRole,
  'lesson:watch': (actor, thing) =>
    isInside(actor, thing) || (isIssued(thing) && thing.isSample === true),
  'lesson:keep-progress': (actor, thing) => actor !== null && thing.isEnrolled === true,
  'stop:answer': (actor, thing) =>
    isInside(actor, thing) || (isIssued(thing) && thing.isSample === true),
  'media:upload': (actor, thing) => isOwner(actor, thing),
  'build:see': (actor, thing) => actor !== null && thing.isEnrolled === true,
  'field-book:write': (actor, thing) => actor !== null && thing.isEnrolled === true,
  'fence:read': (actor, thing) =>
    isInside(actor, thing) || (isIssued(thing) && thing.isSample === true),
  'fence:write': (actor, thing) => isInside(actor, thing),
  'fence:edit-post': (actor, thing) => isInside(actor, thing) && thing.isAuthor === true,
  'fence:delete-post': (actor, thing) =>
    isStaff(actor, thing) || (isInside(actor, thing) && thing.isAuthor === true),
  /** The asker or staff; `isAuthor` is of the question. */
  'fence:settle': (actor, thing) =>
    isStaff(actor, thing) || (isInside(actor, thing) && thing.isAuthor === true),
} satisfies Record<string, (actor: Actor | null, thing: Thing) => boolean>

export type Action = keyof typeof policies

/** True when `actor` may do `action` to `thing`. */
export function can(actor: Actor | null, action: Action, thing: Thing = {}): boolean {
  return policies[action](actor, thing)
}
