import { join, resolve } from 'node:path'
import { startDatabase, type PrivateDatabase } from './database'

export const dataFolder = resolve(process.env['DATA_DIR'] ?? '.data')
export const privateDatabase = { folder: join(dataFolder, 'mariadb'), database: 'good_footing' }

export interface OpenDatabase {
  url: string
  /** The one we started, or null when DATABASE_URL names another. */
  own: PrivateDatabase | null
  /** Stops the database if this call started it. */
  close: () => Promise<void>
}

/** The database of this checkout: the one DATABASE_URL names, or a private one, started if need be. */
export async function openDatabase(say: (sentence: string) => void): Promise<OpenDatabase> {
  const given = process.env['DATABASE_URL']
  if (given) return { url: given, own: null, close: () => Promise.resolve() }
  say('Starting the database …')
  const own = await startDatabase(privateDatabase)
  return { url: own.url, own, close: () => (own.wasRunning ? Promise.resolve() : own.stop()) }
}
