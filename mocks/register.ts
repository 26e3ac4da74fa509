import { setupServer } from 'msw/node'
import { handlers } from './handlers'

/** Answers for the outside services in this process. A call that no handler answers fails, and says so. */
export function registerFakes(): void {
  const server = setupServer(...handlers)
  server.listen({
    onUnhandledRequest(request) {
      const { hostname } = new URL(request.url)
      if (['localhost', '127.0.0.1', '[::1]'].includes(hostname)) return
      throw new Error(`Nothing here answers ${request.method} ${request.url}: add a handler to mocks/handlers.ts.`)
    },
  })
  ;(globalThis as Record<symbol, unknown>)[Symbol.for('sillion.fakes')] = true
}
