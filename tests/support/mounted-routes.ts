import type { Express } from 'express'

interface Layer {
  route?: { path: string; methods: Record<string, boolean> }
  handle?: { stack?: Layer[] }
}

const verbsOf = (methods: Record<string, boolean>): string[] =>
  methods._all || Object.keys(methods).length > 8
    ? ['ALL']
    : Object.keys(methods).map((verb) => verb.toUpperCase())

function walk(stack: Layer[]): string[] {
  const own = stack.flatMap(({ route }) =>
    route ? verbsOf(route.methods).map((verb) => `${verb} ${route.path}`) : [],
  )
  // A limit mounted before its handler is the same route of the same router.
  return [...new Set(own), ...stack.flatMap(({ handle }) => (handle?.stack ? walk(handle.stack) : []))]
}

/** Every route the application really answers to, as `GET /orders/:orderId`; prefixes of mounted routers are not told. */
export function mountedRoutes(app: Express): string[] {
  return walk((app as unknown as { router: { stack: Layer[] } }).router.stack)
}
