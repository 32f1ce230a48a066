import { join } from 'node:path'
import { config } from '../config'
import { createFileStorage, withDemoMedia } from './fileStorage'

/** The one storage of this installation. */
export const mediaStorage = withDemoMedia(
  createFileStorage(join(config.dataDir, 'media')),
  config.demoMediaDir,
)
