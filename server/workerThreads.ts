import { Worker, type WorkerOptions } from 'node:worker_threads'

const isSource = import.meta.url.endsWith('.ts')

/**
 * Starts a worker thread from `server/<folder>/<name>.worker.ts`. In the built server every such file is an
 * entry of its own beside this one (see vite.config.ts); from the sources the thread reads it with tsx.
 */
export function startThread(folder: string, name: string, options: WorkerOptions = {}): Worker {
  if (!isSource) return new Worker(new URL(`./${name}.worker.js`, import.meta.url), options)
  const file = new URL(`./${folder}/${name}.worker.ts`, import.meta.url).href
  const readIt = `import('tsx/esm/api').then(({ register }) => (register(), import('${file}')))`
  return new Worker(readIt, { ...options, eval: true, execArgv: [] })
}
