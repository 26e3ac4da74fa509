import { STATUS_CODES } from 'node:http'
import { getHeader, send, setResponseHeader, setResponseHeaders, setResponseStatus, type H3Event } from 'h3'
import { causesOf, describeError, type HandledError } from './services/describe-error'
import { log } from './services/log'
import { routeOf } from './services/log-request'
import { identify, isOwnErrorPage } from './utils/identify'

const RETRY_AFTER_SECONDS = 5

/** Every error in one shape, and nothing of the inside in it. Who wants a page gets Nuxt's own, which comes after this. */
export default defineNitroErrorHandler(async (error, event) => {
  const { status, code, message, field } = describeError(error as HandledError)
  identify(event)
  const requestId = event.context.requestId!
  if (status >= 500) log('error', 'A request failed.', { requestId, route: routeOf(event), status, cause: causesOf(error), stack: error.stack })
  if ([429, 503, 507].includes(status) && !event.node.res.hasHeader('retry-after')) setResponseHeader(event, 'retry-after', RETRY_AFTER_SECONDS)
  if (wantsPage(event)) {
    Object.assign(error, { statusCode: status, statusMessage: STATUS_CODES[status], data: { code, requestId } })
    if (status >= 500) error.message = message
    return
  }
  setResponseStatus(event, status, STATUS_CODES[status])
  setResponseHeaders(event, { 'content-type': 'application/json', 'cache-control': 'no-store' })
  const body = JSON.stringify({ error: { code, message, ...(field ? { field } : {}), requestId } })
  await send(event, event.method === 'HEAD' ? '' : body)
})

/** True for a browser on its way to a page, and for Nuxt when it draws its error page by asking itself. */
function wantsPage(event: H3Event): boolean {
  if (event.path.startsWith('/api/')) return false
  return isOwnErrorPage(event) || (getHeader(event, 'accept') ?? '').includes('text/html')
}
