import { createServer, type Server } from 'node:http'
import { createApp } from './app'
import { sweepSessions } from './accounts/sessions.service'
import { config } from './config'
import { pool } from './db/client'
import { startJobs, stopJobs } from './jobs/queue'
import { logger } from './logger'
import { createSocketServer } from './socket'

const hardStopMs = 10_000

/** Vite's hot reload speaks through our own server: a port of its own would clash with a second one. */
async function createDevClient(server: Server) {
  if (config.isProduction || config.isTest) return undefined
  const { createServer: createVite } = await import('vite')
  const vite = await createVite({
    server: { middlewareMode: true, hmr: { server } },
    appType: 'spa',
  })
  return vite.middlewares
}

const httpServer = createServer()
const devClient = await createDevClient(httpServer)
const app = createApp(devClient ? { devClient } : {})
httpServer.on('request', (request, response) => void app(request, response))
httpServer.requestTimeout = 0
const io = createSocketServer(httpServer)
startJobs()
const sweeping = setInterval(() => {
  sweepSessions().catch((error: unknown) => logger.error({ err: error }, 'sweep'))
}, 15 * 60_000)

httpServer.on('error', (error: NodeJS.ErrnoException) => {
  const reason =
    error.code === 'EADDRINUSE'
      ? `Port ${config.port} is taken by another program. Set PORT to a free one.`
      : error.message
  process.stderr.write(`${reason}\n`)
  process.exit(1)
})
httpServer.listen(config.port, () => {
  logger.info({ port: config.port }, 'listening')
  process.send?.('listening')
})

let isStopping = false
async function stop(exitCode = 0) {
  if (isStopping) return
  isStopping = true
  setTimeout(() => process.exit(1), hardStopMs).unref()
  clearInterval(sweeping)
  const closed = new Promise<void>((resolve) => httpServer.close(() => resolve()))
  await io.close()
  httpServer.closeIdleConnections()
  setTimeout(() => httpServer.closeAllConnections(), 3000).unref()
  await closed
  await stopJobs()
  await pool.end()
  process.exit(exitCode)
}
process.on('SIGTERM', () => void stop())
process.on('SIGINT', () => void stop())
process.on('disconnect', () => void stop())

/** The last resort: what nobody foresaw is written down, and the process ends in order to be started anew. */
function giveUp(error: unknown) {
  logger.fatal({ err: error }, 'unforeseen')
  stop(1).catch(() => process.exit(1))
}
process.on('uncaughtException', giveUp)
process.on('unhandledRejection', giveUp)
