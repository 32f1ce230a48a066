import { mediaStorage } from './mediaStorage'
import { listStorageKeys } from './videos.queries'

/** Storage keys of everything that was uploaded for a course. */
export const listCourseFiles = (courseId: number): Promise<string[]> => listStorageKeys(courseId)

/** Removes files whose rows are gone. */
export async function removeFiles(keys: string[]) {
  for (const key of keys) await mediaStorage.remove(key)
}
