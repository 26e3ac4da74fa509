import { getHeader, setResponseHeaders, setResponseStatus, send } from 'h3'
import { log } from './services/log'

/** SQLite codes that are the machine's trouble, with what the client should be told. */
const STORAGE: [RegExp, number, string, string][] = [
  [/^SQLITE_FULL/, 507, 'disk-full', 'The disk is full, so nothing was saved. Free some room, then try again.'],
  [/^SQLITE_BUSY/, 503, 'busy', 'The database is busy, so nothing was saved. Try again in a moment.'],
  [/^SQLITE_(READONLY|IOERR|CANTOPEN)/, 503, 'storage', 'The database can\'t be written, so nothing was saved. Try again later.'],
]

/** Every API error in one shape, and nothing of the inside in it. Pages have Nuxt's own handler, which runs after this. */
export default defineNitroErrorHandler(async (error, event) => {
  const { status, code, message, field } = describe(error)
  const requestId = String(event.context.requestId ?? '')
  if (status >= 500) log('error', 'A request failed.', { requestId, route: event.path.split('?')[0], status, cause: causeOf(error), stack: error.stack })
  if (!event.path.startsWith('/api/')) {
    if (status >= 500) error.message = message
    return
  }
  setResponseStatus(event, status)
  setResponseHeaders(event, { 'content-type': 'application/json', 'cache-control': 'no-store' })
  if (status === 503) setResponseHeaders(event, { 'retry-after': 5 })
  const body = JSON.stringify({ error: { code, message, ...(field ? { field } : {}), requestId } })
  if (getHeader(event, 'expect')) setResponseHeaders(event, { connection: 'close' })
  await send(event, event.method === 'HEAD' ? '' : body)
})

function describe(error: Error & { statusCode?: number, data?: unknown, unhandled?: boolean }): { status: number, code: string, message: string, field?: string } {
  const cause = (error.cause ?? error) as { code?: unknown }
  const storage = STORAGE.find(([pattern]) => typeof cause.code === 'string' && pattern.test(cause.code))
  if (storage) return { status: storage[1], code: storage[2], message: storage[3] }
  const data = error.data as { code?: string, field?: string } | undefined
  const status = error.statusCode ?? 500
  if (data?.code && !error.unhandled) return { status, code: data.code, message: error.message, field: data.field }
  if (status === 404) return { status, code: 'not-found', message: 'There is nothing here.' }
  if (status === 405) return { status, code: 'method', message: 'This address does not do that.' }
  if (status < 500) return { status, code: 'bad-request', message: 'The request can\'t be understood.' }
  return { status: 500, code: 'internal', message: 'Something went wrong on our side; nothing was saved. Try again, and quote the request id if it stays.' }
}

function causeOf(error: Error): string {
  return error.cause instanceof Error ? `${error.message}: ${error.cause.message}` : error.message
}
