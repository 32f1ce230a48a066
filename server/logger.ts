import { pino } from 'pino'
import { config } from './config'

/** What a query was given stands after this in the messages of Drizzle. */
const paramsMark = '\nparams:'

interface Failure {
  type?: string
  message?: string
  stack?: string
  code?: unknown
  errno?: unknown
  cause?: unknown
}

const cut = (text: string | undefined) => {
  const [head = '', ...rest] = (text ?? '').split(paramsMark)
  const frames = rest
    .join('')
    .split('\n')
    .filter((line) => /^\s+at /.test(line))
  return [head, ...frames].join('\n')
}

/** An error as it may be written down: without the SQL and the values in it, which are people's. */
export function describeFailure(error: unknown): unknown {
  if (!(error instanceof Error)) return { message: typeof error }
  const { code, errno, cause } = error as Failure
  const isOfDatabase = 'sqlMessage' in error
  return {
    type: error.name,
    message: isOfDatabase ? `database error ${String(errno)}` : cut(error.message),
    stack: isOfDatabase ? undefined : cut(error.stack),
    code,
    errno,
    ...(cause === undefined ? {} : { cause: describeFailure(cause) }),
  }
}

/** The process's log; cookies, passphrases and addresses of people are never written. */
export const logger = pino({
  level: config.logLevel,
  redact: ['req.headers.cookie', 'req.headers.authorization', 'res.headers["set-cookie"]'],
  serializers: { err: describeFailure },
})
