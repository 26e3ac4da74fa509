import { randomBytes, randomUUID } from 'node:crypto'
import { getHeader, setResponseHeader, setResponseHeaders, type H3Event } from 'h3'
import { useApp } from '../services/app'
import { logRequest } from '../services/log-request'
import { routeMethods } from '../services/routes'
import { fail } from '../utils/fail'
import { isFromOurPages } from '../utils/own-pages'

const READS = ['GET', 'HEAD']

/** Before any route: an id for the log, the security headers, known methods only, and no writing from other sites. */
export default defineEventHandler((event) => {
  const { production, publicOrigin } = useApp().settings
  const requestId = event.context.requestId = randomUUID()
  const nonce = event.context.nonce = randomBytes(16).toString('base64')
  setResponseHeaders(event, { 'cache-control': 'no-store', 'content-security-policy': contentPolicy(nonce) })
  // Nuxt draws its error page by asking itself; log and answer keep the id of the request that failed.
  if (!event.path.startsWith('/__nuxt_error')) {
    setResponseHeader(event, 'x-request-id', requestId)
    logRequest(event)
  }
  if (production) setResponseHeader(event, 'strict-transport-security', 'max-age=63072000; includeSubDomains')
  // The module's own session route could only tell or drop a cookie; ours do both with the session behind it.
  if (event.path.startsWith('/api/_auth')) fail(404, 'not-found', 'There is nothing here.')
  refuseOtherMethods(event)
  if (!READS.includes(event.method) && !isFromOurPages(site(event), publicOrigin)) {
    fail(403, 'other-site', `Changes are only taken from Sillion's own pages. A program sends 'Origin: ${publicOrigin}' with them.`)
  }
})

function contentPolicy(nonce: string): string {
  return [
    'default-src \'none\'', `script-src 'self' 'nonce-${nonce}'`, `style-src 'self' 'nonce-${nonce}'`, 'img-src \'self\' data:', 'font-src \'self\'',
    'connect-src \'self\'', 'manifest-src \'self\'', 'form-action \'self\'', 'frame-ancestors \'none\'', 'base-uri \'none\'',
  ].join('; ')
}

/** Pages are only read; a route of the API has its own methods, and what is no route answers 404 later. */
function refuseOtherMethods(event: H3Event): void {
  const path = event.path.split('?')[0]!
  const methods = path.startsWith('/api/') ? routeMethods(path) : READS
  if (methods.includes(event.method) || (methods.length === 0 && READS.includes(event.method))) return
  if (methods.length === 0) fail(404, 'not-found', 'There is nothing here.')
  setResponseHeader(event, 'allow', methods.join(', '))
  fail(405, 'method', `This address answers ${methods.join(' and ')} only.`)
}

function site(event: H3Event) {
  return { secFetchSite: getHeader(event, 'sec-fetch-site'), origin: getHeader(event, 'origin'), host: getHeader(event, 'host') }
}
