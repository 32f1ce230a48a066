/** What is said at a field of an exercise, by its dotted path: what is wrong, and what is worth mending. */
export interface FieldNotes {
  error: (path: string) => string
  hint: (path: string) => string
}

interface Note {
  path: string
  message: string
  blocking: boolean
}

/** Notes by path; several at one path stand one after the other. */
export function notesOf(found: readonly Note[]): FieldNotes {
  const at = (path: string, blocking: boolean) =>
    found
      .filter((note) => note.path === path && note.blocking === blocking)
      .map(({ message }) => message)
      .join(' ')
  return { error: (path) => at(path, true), hint: (path) => at(path, false) }
}

/** The same notes for a part of the exercise, whose paths begin after `prefix`. */
export const notesUnder = (notes: FieldNotes, prefix: string): FieldNotes => ({
  error: (path) => notes.error(`${prefix}.${path}`),
  hint: (path) => notes.hint(`${prefix}.${path}`),
})
