import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join, resolve } from 'node:path'

const env = process.env
const shortestSecret = 32
const dataDir = resolve(env['DATA_DIR'] ?? '.data')

function readOrMakeSecret(): string {
  const given = env['SESSION_SECRET']
  if (given && given.length < shortestSecret) {
    throw new Error(`SESSION_SECRET is too short: at least ${shortestSecret} characters by chance.`)
  }
  if (given) return given
  const file = join(dataDir, 'session-secret')
  if (!existsSync(file)) {
    mkdirSync(dataDir, { recursive: true })
    writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 })
  }
  return readFileSync(file, 'utf8').trim()
}

/** A number out of the surroundings; a typing error must not switch a limit off. */
function readNumber(name: string, fallback: number, least = 0): number {
  const text = env[name]
  if (text === undefined || text === '') return fallback
  const value = Number(text)
  if (Number.isFinite(value) && value >= least) return value
  throw new Error(`${name} is "${text}". Set it to a number of at least ${least}.`)
}

function readOrigin(): string | null {
  const text = env['PUBLIC_ORIGIN']
  if (!text) return null
  if (!/^https?:\/\//.test(text) || !URL.canParse(text)) {
    throw new Error(`PUBLIC_ORIGIN is "${text}". Set it to an address such as https://example.org.`)
  }
  return new URL(text).origin
}

const publicOrigin = readOrigin()
const isBehindTls = publicOrigin?.startsWith('https://') ?? false
const trustedProxies = readNumber('TRUSTED_PROXIES', 0)
if (isBehindTls && trustedProxies < 1) {
  throw new Error(
    'PUBLIC_ORIGIN begins with https, so something in front speaks TLS: set TRUSTED_PROXIES to how many such programs stand in front. Otherwise nobody could sign in.',
  )
}

/** Everything the process takes from its surroundings, read once. */
export const config = {
  isProduction: env['NODE_ENV'] === 'production',
  isTest: env['NODE_ENV'] === 'test',
  port: readNumber('PORT', 3000),
  /** Address people use when it differs from the listening one, e.g. behind TLS. */
  publicOrigin,
  isBehindTls,
  /** Proxies in front that may be believed about the client's address. */
  trustedProxies,
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
  rateLimitFactor: readNumber('RATE_LIMIT_FACTOR', 1, 0.01),
}
