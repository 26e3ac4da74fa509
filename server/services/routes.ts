import { handlers } from '#nitro-internal-virtual/server-handlers'

/** Methods that some route of the API answers at a path, with or without a slash at its end. */
export function routeMethods(pathAsWritten: string): string[] {
  const path = pathAsWritten.replace(/\/$/, '')
  const matching = handlers.filter(handler => handler.method && handler.route && matches(handler.route, path))
  return [...new Set(matching.map(handler => handler.method!.toUpperCase()))].sort()
}

function matches(route: string, path: string): boolean {
  const wanted = route.split('/')
  const parts = path.split('/')
  return wanted.length === parts.length && wanted.every((part, index) => part.startsWith(':') || part === parts[index])
}
