import { getHeader, setResponseHeader, type H3Event } from 'h3'
import { useApp } from '../services/app'
import { routeMethods } from '../services/routes'
import { fail } from '../utils/fail'
import { identify, isOwnErrorPage } from '../utils/identify'
import { isFromOurPages } from '../utils/own-pages'

const READS = ['GET', 'HEAD']

/** Before any route: an id for the log, the security headers, known methods only, and no writing from other sites. */
export default defineEventHandler((event) => {
  const { production, publicOrigin } = useApp().settings
  identify(event)
  if (production) setResponseHeader(event, 'strict-transport-security', 'max-age=63072000; includeSubDomains')
  if (!URL.canParse(`http://${getHeader(event, 'host') ?? 'none'}`)) fail(400, 'host', 'The request names a host that can\'t be.')
  // The module's own session route could only tell or drop a cookie; ours do both with the session behind it.
  if (event.path.startsWith('/api/_auth')) fail(404, 'not-found', 'There is nothing here.')
  if (event.path.startsWith('/__nuxt_error') && !isOwnErrorPage(event)) fail(404, 'not-found', 'There is nothing here.')
  readForHead(event)
  refuseOtherMethods(event)
  if (!READS.includes(event.method) && !isFromOurPages(site(event), publicOrigin)) {
    fail(403, 'other-site', `Changes are only taken from Sillion's own pages. A program sends 'Origin: ${publicOrigin}' with them.`)
  }
})

/** HEAD answers as GET does; Node leaves the body out, since the request came as HEAD. A stream that never ends has none. */
function readForHead(event: H3Event): void {
  const path = event.path.split('?')[0]!
  if (event.method !== 'HEAD' || !path.startsWith('/api/') || path.endsWith('/changes')) return
  event.node.req.method = 'GET'
  event._method = 'GET'
}

/** Pages are only read; a route of the API has its own methods, and what is no route answers 404 later. */
function refuseOtherMethods(event: H3Event): void {
  const path = event.path.split('?')[0]!
  const methods = path.startsWith('/api/') ? withHead(path, routeMethods(path)) : READS
  if (methods.includes(event.method) || (methods.length === 0 && READS.includes(event.method))) return
  if (methods.length === 0) fail(404, 'not-found', 'There is nothing here.')
  setResponseHeader(event, 'allow', methods.join(', '))
  fail(405, 'method', `This address answers ${methods.join(' and ')} only.`)
}

function withHead(path: string, methods: string[]): string[] {
  return methods.includes('GET') && !path.endsWith('/changes') ? [...methods, 'HEAD'].sort() : methods
}

function site(event: H3Event) {
  return { secFetchSite: getHeader(event, 'sec-fetch-site'), origin: getHeader(event, 'origin'), host: getHeader(event, 'host') }
}
