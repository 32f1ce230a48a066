import { mkdirSync } from 'node:fs'
import { readdir, rm, stat } from 'node:fs/promises'
import { join } from 'node:path'
import { FileConfigstore, FileStore } from '@tus/file-store'
import { config } from '../config'

const folder = join(config.dataDir, 'uploads')
mkdirSync(folder, { recursive: true })

const configs = new FileConfigstore(folder)
/** An upload may lie this long before it is cleared away. */
export const keptMs = 3 * 24 * 3600_000

/** What is known of an upload besides its bytes. */
export interface UploadNote {
  size: number
  /** When it began, in ms. */
  createdAt: number
  userId: number
  lessonId: number
  courseId: number
  lessonKey: string
  filename: string
}

/** Files that are coming in, and a note beside each. */
export const uploadStore = {
  folder,
  pathOf: (id: string) => join(folder, id),
  makeDataStore: () => new FileStore({ directory: folder, expirationPeriodInMilliseconds: keptMs }),

  async listIds(): Promise<string[]> {
    const names = await readdir(folder)
    return names.flatMap((name) => (name.endsWith('.json') ? [name.slice(0, -5)] : []))
  },

  /** What is known of an upload, or null when there is none. */
  async findNote(id: string): Promise<UploadNote | null> {
    const upload = await configs.get(id)
    const { metadata } = upload ?? {}
    if (!upload || !metadata || upload.size === undefined) return null
    return {
      size: upload.size,
      createdAt: Date.parse(upload.creation_date ?? '') || 0,
      userId: Number(metadata['userId']),
      lessonId: Number(metadata['lessonId']),
      courseId: Number(metadata['courseId']),
      lessonKey: metadata['lessonKey'] ?? '',
      filename: metadata['filename'] ?? '',
    }
  },

  /** How many bytes have come in and when the last did, or null when the file is gone. */
  async findFile(id: string): Promise<{ bytes: number; changedAt: number } | null> {
    const found = await stat(join(folder, id)).catch(() => null)
    return found && { bytes: found.size, changedAt: found.mtimeMs }
  },

  /** Forgets an upload with what came in of it. */
  async remove(id: string) {
    await rm(join(folder, id), { force: true })
    await rm(join(folder, `${id}.json`), { force: true })
  },
}
