import { randomBytes, randomUUID } from 'node:crypto'
import { getHeader, setResponseHeader, setResponseHeaders } from 'h3'
import { useApp } from '../services/app'
import { fail } from '../utils/fail'

const METHODS = new Set(['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE'])
const READS = new Set(['GET', 'HEAD'])

/** Before any route: an id for the log, the security headers, and no writing from other sites. */
export default defineEventHandler((event) => {
  event.context.requestId = randomUUID()
  event.context.nonce = randomBytes(16).toString('base64')
  setResponseHeaders(event, {
    'cache-control': 'no-store',
    'content-security-policy': contentPolicy(event.context.nonce as string),
    'x-request-id': event.context.requestId as string,
  })
  if (useApp().settings.production) setResponseHeader(event, 'strict-transport-security', 'max-age=63072000; includeSubDomains')
  if (!METHODS.has(event.method)) {
    setResponseHeader(event, 'allow', [...METHODS].join(', '))
    fail(405, 'method', 'This address does not do that.')
  }
  // The module's own session route could only tell or drop a cookie; ours do both with the session behind it.
  if (event.path.startsWith('/api/_auth')) fail(404, 'not-found', 'There is nothing here.')
  if (!READS.has(event.method)) refuseOtherSites(getHeader(event, 'sec-fetch-site'), getHeader(event, 'origin'))
})

function contentPolicy(nonce: string): string {
  return [
    'default-src \'none\'', `script-src 'self' 'nonce-${nonce}'`, `style-src 'self' 'nonce-${nonce}'`, 'img-src \'self\' data:', 'font-src \'self\'',
    'connect-src \'self\'', 'manifest-src \'self\'', 'form-action \'self\'', 'frame-ancestors \'none\'', 'base-uri \'none\'',
  ].join('; ')
}

/** A browser says where a write comes from; without a word from it, the Origin must be ours. */
function refuseOtherSites(site: string | undefined, origin: string | undefined): void {
  const ours = origin === useApp().settings.publicOrigin
  if (site === 'same-origin' && (origin === undefined || ours)) return
  if (site === undefined && ours) return
  fail(403, 'other-site', 'Changes are only taken from Sillion\'s own pages.')
}
