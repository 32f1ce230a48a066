import { existsSync } from 'node:fs'
import { join } from 'node:path'
import express, { Router, type RequestHandler, type Response } from 'express'
import { createPagePreloads } from './pagePreloads'

const encodings = [
  { name: 'br', suffix: '.br' },
  { name: 'gzip', suffix: '.gz' },
] as const
const contentTypes: Record<string, string> = {
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.html': 'text/html; charset=utf-8',
  '.json': 'application/json',
  '.wasm': 'application/wasm',
}

/** Serves the compressed file beside the asked one when the browser takes it. */
function preferCompressed(folder: string): RequestHandler {
  return (request, response, next) => {
    const path = request.path
    const extension = /\.\w+$/.exec(path)?.[0] ?? ''
    const type = contentTypes[extension]
    if (!type || /\.\.|\/\./.test(path)) return next()
    response.vary('Accept-Encoding')
    const accepted = request.acceptsEncodings('br', 'gzip')
    const encoding = encodings.find(({ name }) => name === accepted)
    if (encoding && existsSync(join(folder, path + encoding.suffix))) {
      request.url = path + encoding.suffix
      response.setHeader('Content-Encoding', encoding.name)
      response.setHeader('Content-Type', type)
    }
    next()
  }
}

function setCaching(response: Response, path: string) {
  const isHashed = path.includes('/assets/')
  response.setHeader('Cache-Control', isHashed ? 'public, max-age=31536000, immutable' : 'no-cache')
}

/** The built client: hashed assets kept for a year, and the page itself for every other path. */
export function staticFiles(folder: string): Router {
  const router = Router()
  const files = express.static(folder, { index: false, setHeaders: setCaching })
  router.use(preferCompressed(folder), files)
  return router
}

/** The client's page, for every path that nothing else answered; the client finds its own not-found. */
export function clientPage(folder: string): RequestHandler {
  const page = preferCompressed(folder)
  const files = express.static(folder, { index: false, setHeaders: setCaching })
  const preloads = createPagePreloads(folder)
  return (request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') return next()
    const link = preloads(request.path, request.url.includes('?'))
    if (link) response.setHeader('Link', link)
    request.url = '/index.html'
    page(request, response, () => void files(request, response, next))
  }
}
