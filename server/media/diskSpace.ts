import { statfs } from 'node:fs/promises'

/** Left free for everything else on the disk. */
export const reservedBytes = 512 * 1024 ** 2

/** Bytes that may still be written to the disk a folder lies on. */
export async function findFreeBytes(folder: string): Promise<number> {
  const { bavail, bsize } = await statfs(folder)
  return bavail * bsize
}
