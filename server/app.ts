import type { IncomingMessage } from 'node:http'
import express, { type Express, type RequestHandler } from 'express'
import helmet from 'helmet'
import { pinoHttp } from 'pino-http'
import { accountsRouter } from './accounts/accounts.routes'
import { buildsRouter } from './builds/builds.routes'
import { config } from './config'
import { benchCoursesRouter } from './courses/benchCourses.routes'
import { benchLessonsRouter } from './courses/benchLessons.routes'
import { lessonsRouter } from './courses/lessons.routes'
import { registerRouter } from './courses/register.routes'
import { attemptsRouter } from './exercises/attempts.routes'
import { benchStopsRouter } from './exercises/benchStops.routes'
import { ownCalculatorsRouter } from './exercises/ownCalculators.routes'
import { questionsRouter } from './fence/questions.routes'
import { logger } from './logger'
import { captionsRouter } from './media/captions.routes'
import { mediaRouter } from './media/media.routes'
import { uploadsRouter } from './media/uploads.routes'
import { authenticate } from './middleware/authenticate'
import { apiNotFound, errorHandler } from './middleware/errorHandler'
import { sameOrigin } from './middleware/sameOrigin'
import { sessionMiddleware } from './middleware/session'
import { clientPage, staticFiles } from './middleware/staticFiles'
import { progressRouter } from './progress/progress.routes'

/**
 * Compiling WebAssembly counts as evaluating code. Only the worker that searches for cut lists does that, with the
 * solver that we serve ourselves; a worker obeys the policy its own script comes with, so the pages need not allow it.
 */
const solverSource = ({ url = '' }: IncomingMessage) =>
  /^\/assets\/cutlist\.worker-[\w-]+\.js$/.test(url) ? "'wasm-unsafe-eval'" : ''

const contentSecurity = {
  useDefaults: false,
  directives: {
    defaultSrc: ["'self'"],
    scriptSrc: ["'self'", solverSource],
    styleSrc: ["'self'"],
    imgSrc: ["'self'", 'data:', 'blob:'],
    fontSrc: ["'self'"],
    mediaSrc: ["'self'", 'blob:'],
    workerSrc: ["'self'", 'blob:'],
    connectSrc: ["'self'"],
    objectSrc: ["'none'"],
    baseUri: ["'none'"],
    formAction: ["'self'"],
    frameAncestors: ["'none'"],
  },
}

/** What serves the client when it is not the built one: Vite's middleware in development. */
export interface AppOptions {
  devClient?: RequestHandler
}

/** The whole application; it does not listen. */
export function createApp({ devClient }: AppOptions = {}): Express {
  const app = express()
  app.disable('x-powered-by')
  app.set('trust proxy', config.trustedProxies)
  app.use(
    helmet({
      contentSecurityPolicy: devClient ? false : contentSecurity,
      strictTransportSecurity: config.isBehindTls,
      referrerPolicy: { policy: 'same-origin' },
    }),
  )
  if (!devClient) app.use(staticFiles(config.clientDir))

  app.use('/api', (_request, response, next) => {
    response.setHeader('Cache-Control', 'no-store')
    next()
  })
  app.use('/api', pinoHttp({ logger, autoLogging: config.isProduction }))
  app.use('/api', sameOrigin)
  app.use('/api', uploadsRouter)
  app.use('/api', sessionMiddleware, authenticate)
  app.use('/api', captionsRouter)
  app.use('/api', express.json({ limit: '2mb' }))
  app.use(
    '/api',
    accountsRouter,
    registerRouter,
    lessonsRouter,
    attemptsRouter,
    progressRouter,
    buildsRouter,
    questionsRouter,
    mediaRouter,
    benchCoursesRouter,
    benchLessonsRouter,
    benchStopsRouter,
    ownCalculatorsRouter,
  )
  app.use('/api', apiNotFound)
  app.use('/api', errorHandler)

  app.use(devClient ?? clientPage(config.clientDir))
  app.use(apiNotFound)
  app.use(errorHandler)
  return app
}
