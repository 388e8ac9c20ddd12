export { listRoutes }

import type { Express } from 'express'

interface Layer {
  route?: { path: string | string[]; methods: Record<string, boolean> }
  handle?: { stack?: Layer[] }
  match(path: string): boolean
}

/** Every address that Express answers, such as `POST /api/edits/:id/send`, read from the router itself. */
function listRoutes(express: Express): string[] {
  return (express.router as unknown as { stack: Layer[] }).stack.flatMap((layer) => routesOf(layer, ''))
}

function routesOf(layer: Layer, prefix: string): string[] {
  if (layer.route !== undefined) {
    const { path, methods } = layer.route
    return [path].flat().flatMap((one) => Object.keys(methods).map((method) => `${method.toUpperCase()} ${prefix}${one}`))
  }
  // Only the API is mounted under a path of its own.
  const own = prefix === '' && !layer.match('/elsewhere') && layer.match('/api/anything') ? '/api' : prefix
  return (layer.handle?.stack ?? []).flatMap((inner) => routesOf(inner, own))
}
