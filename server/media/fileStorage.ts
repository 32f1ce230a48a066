import { copyFile, mkdir, rename, rm, stat } from 'node:fs/promises'
import { dirname, join } from 'node:path'
import type { MediaStorage } from './storage'

const keyPattern = /^[\w-]+(\/[\w-]+)*(\.[a-z0-9]+)?$/

function checkKey(key: string): string {
  if (!keyPattern.test(key)) throw new Error(`not a storage key: ${key}`)
  return key
}

const codeOf = (error: unknown) => (error as NodeJS.ErrnoException).code

async function move(source: string, target: string) {
  try {
    await rename(source, target)
  } catch (error) {
    if (codeOf(error) !== 'EXDEV') throw error
    const aside = `${target}.part`
    await copyFile(source, aside)
    await rename(aside, target)
    await rm(source, { force: true })
  }
}

/** Media as files in one folder, the key being the path in it. */
export function createFileStorage(root: string): MediaStorage {
  const statFile = async (key: string) => {
    try {
      return { bytes: (await stat(join(root, checkKey(key)))).size }
    } catch (error) {
      if (codeOf(error) === 'ENOENT') return null
      throw error
    }
  }
  return {
    stat: statFile,
    locate: (key) => ({ root, name: checkKey(key) }),
    async put(key, sourcePath) {
      const target = join(root, checkKey(key))
      await mkdir(dirname(target), { recursive: true })
      try {
        await move(sourcePath, target)
      } catch (error) {
        const isMovedBefore = codeOf(error) === 'ENOENT' && (await statFile(key))
        if (!isMovedBefore) throw error
      }
    },
    async remove(key) {
      await rm(join(root, checkKey(key)), { force: true })
    },
  }
}

/** The media that ship with the project, under `demo:` keys; they can be read and nothing else. */
export function withDemoMedia(storage: MediaStorage, demoRoot: string): MediaStorage {
  const prefix = 'demo:'
  const demo = createFileStorage(demoRoot)
  const isDemo = (key: string) => key.startsWith(prefix)
  const within = (key: string) => key.slice(prefix.length)
  return {
    stat: (key) => (isDemo(key) ? demo.stat(within(key)) : storage.stat(key)),
    locate: (key) => (isDemo(key) ? demo.locate(within(key)) : storage.locate(key)),
    async put(key, sourcePath) {
      if (isDemo(key)) throw new Error('demo media are not written')
      await storage.put(key, sourcePath)
    },
    async remove(key) {
      if (!isDemo(key)) await storage.remove(key)
    },
  }
}
