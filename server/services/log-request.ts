import type { H3Event } from 'h3'
import { log } from './log'

/** One line in the log for each request from outside, when its answer has gone or the caller has. */
export function logRequest(event: H3Event): void {
  const startedAt = performance.now()
  event.node.res.once('close', () => {
    const { requestId, personId, farmId } = event.context
    log('info', 'request', {
      requestId,
      method: event.method,
      route: routeOf(event),
      status: event.node.res.statusCode,
      ms: Math.round(performance.now() - startedAt),
      ...(personId ? { person: personId } : {}),
      ...(farmId ? { farm: farmId } : {}),
      ...(event.node.res.writableFinished ? {} : { cutOff: true }),
    })
  })
}

/** The pattern of the route that answers: what stands in a path itself is nobody's business in a log. */
export function routeOf(event: H3Event): string {
  return (event.context.matchedRoute as { path?: string } | undefined)?.path ?? 'none'
}
