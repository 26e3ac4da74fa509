import { brotliCompress, constants, gzip } from 'node:zlib'
import { promisify } from 'node:util'
import { getRequestHeader, getResponseHeader, getResponseStatus, removeResponseHeader, setResponseHeader, setResponseStatus, type H3Event } from 'h3'
import { log } from '../services/log'

const brotli = promisify(brotliCompress)
const deflate = promisify(gzip)
const LEAST_BYTES = 1024

/** What every answer goes through on its way out. */
export default defineNitroPlugin((nitro) => {
  nitro.hooks.hook('render:html', (html, { event }) => {
    const nonce = event.context.nonce as string | undefined
    if (!nonce) return
    const withNonce = (part: string) => part.replace(/<(script|style|link)(?=[\s>])/g, `<$1 nonce="${nonce}"`)
    html.head = html.head.map(withNonce)
    html.bodyPrepend = html.bodyPrepend.map(withNonce)
    html.bodyAppend = html.bodyAppend.map(withNonce)
  })
  nitro.hooks.hook('beforeResponse', async (event, response) => {
    removeResponseHeader(event, 'x-powered-by')
    withholdUnasked(event, response)
    await compress(event, response)
  })
})

/** Fails closed: a handler of the API that never asked for a permission gives no answer away. */
function withholdUnasked(event: H3Event, response: { body?: unknown }): void {
  if (!event.path.startsWith('/api/') || event.context.authorised || getResponseStatus(event) >= 400) return
  log('error', 'A route answered without asking for a permission.', { route: event.path.split('?')[0] })
  setResponseStatus(event, 500)
  response.body = { error: { code: 'internal', message: 'Something went wrong on our side.', requestId: event.context.requestId } }
}

async function compress(event: H3Event, response: { body?: unknown }): Promise<void> {
  // Nuxt draws its error page by asking itself, and wants that answer plain.
  if (event.method === 'HEAD' || event.path.startsWith('/__nuxt_error') || getResponseHeader(event, 'content-encoding') || response.body === null || response.body === undefined) return
  const isText = typeof response.body === 'string'
  const isObject = typeof response.body === 'object' && [Object.prototype, Array.prototype].includes(Object.getPrototypeOf(response.body) as object)
  if (!isText && !isObject) return
  if (isObject && !getResponseHeader(event, 'content-type')) setResponseHeader(event, 'content-type', 'application/json')
  const text = isText ? response.body as string : JSON.stringify(response.body)
  response.body = text
  if (text.length < LEAST_BYTES) return
  const accepted = String(getRequestHeader(event, 'accept-encoding') ?? '')
  setResponseHeader(event, 'vary', 'Accept-Encoding')
  if (/\bbr\b/.test(accepted)) {
    setResponseHeader(event, 'content-encoding', 'br')
    response.body = await brotli(text, { params: { [constants.BROTLI_PARAM_QUALITY]: 4 } })
  }
  else if (/\bgzip\b/.test(accepted)) {
    setResponseHeader(event, 'content-encoding', 'gzip')
    response.body = await deflate(text)
  }
}
