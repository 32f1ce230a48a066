import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join, resolve } from 'node:path'

const env = process.env
const dataDir = resolve(env['DATA_DIR'] ?? '.data')

function readOrMakeSecret(): string {
  if (env['SESSION_SECRET']) return env['SESSION_SECRET']
  const file = join(dataDir, 'session-secret')
  if (!existsSync(file)) {
    mkdirSync(dataDir, { recursive: true })
    writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 })
  }
  return readFileSync(file, 'utf8').trim()
}

const publicOrigin = env['PUBLIC_ORIGIN'] ?? null

/** Everything the process takes from its surroundings, read once. */
export const config = {
  isProduction: env['NODE_ENV'] === 'production',
  isTest: env['NODE_ENV'] === 'test',
  port: Number(env['PORT'] ?? 3000),
  /** Address people use when it differs from the listening one, e.g. behind TLS. */
  publicOrigin,
  isBehindTls: publicOrigin?.startsWith('https://') ?? false,
  /** Proxies in front that may be believed about the client's address. */
  trustedProxies: Number(env['TRUSTED_PROXIES'] ?? 0),
  databaseUrl: env['DATABASE_URL'] ?? '',
  dataDir,
  clientDir: resolve(env['CLIENT_DIR'] ?? 'dist/client'),
  /** Videos that ship with the project. */
  demoMediaDir: resolve(env['DEMO_MEDIA_DIR'] ?? 'media/built'),
  ffmpegPath: env['FFMPEG_PATH'] ?? 'ffmpeg',
  ffprobePath: env['FFPROBE_PATH'] ?? 'ffprobe',
  logLevel: env['LOG_LEVEL'] ?? (env['NODE_ENV'] === 'test' ? 'silent' : 'info'),
  sessionSecret: readOrMakeSecret(),
  /** Multiplies all rate limits; raised where a machine plays many people, as in browser tests. */
  rateLimitFactor: Number(env['RATE_LIMIT_FACTOR'] ?? 1),
}
