import { randomBytes, randomUUID } from 'node:crypto'
import { setResponseHeader, setResponseHeaders, type H3Event } from 'h3'
import { logRequest } from '../services/log-request'

/**
 * Gives a request its id, its line in the log and the headers that every answer has; once, also where an error comes
 * before any middleware.
 */
export function identify(event: H3Event): void {
  if (event.context.requestId) return
  const requestId = event.context.requestId = randomUUID()
  const nonce = event.context.nonce = randomBytes(16).toString('base64')
  setResponseHeaders(event, { 'cache-control': 'no-store', 'content-security-policy': contentPolicy(nonce) })
  // Nuxt draws its error page by asking itself; log and answer keep the id of the request that failed.
  if (isOwnErrorPage(event)) return
  setResponseHeader(event, 'x-request-id', requestId)
  logRequest(event)
}

/** True when Nuxt asks itself for the page that shows an error; such a request never came over a socket. */
export function isOwnErrorPage(event: H3Event): boolean {
  return event.path.startsWith('/__nuxt_error') && '__unenv__' in event.node.req
}

function contentPolicy(nonce: string): string {
  return [
    'default-src \'none\'', `script-src 'self' 'nonce-${nonce}'`, `style-src 'self' 'nonce-${nonce}'`, 'img-src \'self\' data:', 'font-src \'self\'',
    'connect-src \'self\'', 'manifest-src \'self\'', 'form-action \'self\'', 'frame-ancestors \'none\'', 'base-uri \'none\'',
  ].join('; ')
}
