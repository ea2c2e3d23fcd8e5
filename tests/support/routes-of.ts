import type { Express } from 'express'

interface Layer {
  route?: { path: string; methods: Record<string, boolean> }
  handle: { stack?: Layer[] }
}

/** Every route of the app as `METHOD /path`, however deep its router. */
export function routesOf(app: Express): string[] {
  const visit = (layers: Layer[]): string[] =>
    layers.flatMap((layer) => {
      const { route } = layer
      if (route) {
        return Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${route.path}`)
      }
      return layer.handle.stack ? visit(layer.handle.stack) : []
    })
  return visit((app as unknown as { router: { stack: Layer[] } }).router.stack).sort()
}
