import type { Express } from 'express'

interface Layer {
  route?: { path: string; methods: Record<string, boolean>; stack: { method?: string }[] }
  handle?: { stack?: Layer[] }
}

/** Every route of the application as `GET /courses/:slug`, read from Express itself. */
export function listRoutes(app: Express): string[] {
  const layers = (app.router as unknown as { stack: Layer[] }).stack
  const inner = layers.flatMap((layer) => layer.handle?.stack ?? [])
  return [...layers, ...inner].flatMap(({ route }) =>
    route
      ? Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${route.path}`)
      : [],
  )
}
