import { z } from 'zod'
import { stableKeySchema } from './stableKey'
import { catchUpSchema, fenceEventSchema } from './fence'

/** A lesson's room over the fence. */
export const roomSchema = z.strictObject({
  courseSlug: z.string().min(1).max(80),
  lessonKey: stableKeySchema,
})
export type Room = z.infer<typeof roomSchema>

export const joinRoomSchema = roomSchema.extend({
  /** The last number the reader saw; what followed comes with the acknowledgement. */
  after: z.number().int().min(0),
})
export type JoinRoom = z.infer<typeof joinRoomSchema>

export const writingSchema = roomSchema.extend({
  /** Null while asking a new question. */
  questionId: z.number().int().nullable(),
  isWriting: z.boolean(),
})
export type Writing = z.infer<typeof writingSchema>

export const personSchema = z.object({ id: z.number(), name: z.string() })
export type Person = z.infer<typeof personSchema>

export const presenceSchema = roomSchema.extend({
  here: z.array(personSchema).max(50),
  /** How many are here in all, visitors among them. */
  count: z.number(),
})
export type Presence = z.infer<typeof presenceSchema>

export const someoneWritesSchema = writingSchema.extend({ person: personSchema })
export type SomeoneWrites = z.infer<typeof someoneWritesSchema>

export const roomChangedSchema = roomSchema.extend({ event: fenceEventSchema })
export type RoomChanged = z.infer<typeof roomChangedSchema>

export const joinedSchema = z.object({ catchUp: catchUpSchema, presence: presenceSchema })
export type Joined = z.infer<typeof joinedSchema>

/** Every acknowledgement has this shape. */
export type Acknowledgement<T> =
  { ok: true; data: T } | { ok: false; error: { code: string; detail: string } }

/** Readers hear that somebody writes for so long, unless it is said again. */
export const writingLastsMs = 6000

/** Names of what the client sends. */
export const clientEvents = {
  joinRoom: 'room:join',
  leaveRoom: 'room:leave',
  writing: 'room:writing',
} as const

/** Names of what the server sends. */
export const serverEvents = {
  roomChanged: 'room:changed',
  presence: 'room:presence',
  someoneWrites: 'room:someone-writes',
  sessionEnded: 'session:ended',
} as const
