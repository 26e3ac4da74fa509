import type { H3Event } from 'h3'
import { log } from './log'

/** One line in the log for each request from outside, when its answer has gone or the caller has. */
export function logRequest(event: H3Event): void {
  const startedAt = performance.now()
  event.node.res.once('close', () => {
    const { requestId, personId, farmId, matchedRoute } = event.context
    log('info', 'request', {
      requestId,
      method: event.method,
      // The pattern: what stands in a path is nobody's business in a log.
      route: (matchedRoute as { path?: string } | undefined)?.path ?? 'none',
      status: event.node.res.statusCode,
      ms: Math.round(performance.now() - startedAt),
      ...(personId ? { person: personId } : {}),
      ...(farmId ? { farm: farmId } : {}),
      ...(event.node.res.writableFinished ? {} : { cutOff: true }),
    })
  })
}
