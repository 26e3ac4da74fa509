import { brotliCompress, constants, gzip } from 'node:zlib'
import { promisify } from 'node:util'
import { getRequestHeader, getResponseHeader, removeResponseHeader, setResponseHeader, type H3Event } from 'h3'
import { withholdUnasked } from '../utils/asked'

const brotli = promisify(brotliCompress)
const deflate = promisify(gzip)
const LEAST_BYTES = 1024

/** What every request is given on its way in, and every answer goes through on its way out. */
export default defineNitroPlugin((nitro) => {
  nitro.hooks.hook('request', (event) => {
    // Settings don't change while it runs; without this each request reads the whole environment anew.
    const context = event.context as { nitro?: { runtimeConfig?: unknown } }
    context.nitro = { ...context.nitro, runtimeConfig: useRuntimeConfig() }
  })
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
  setResponseHeader(event, 'vary', 'Accept-Encoding')
  const accepted = getRequestHeader(event, 'accept-encoding') ?? ''
  if (accepts(accepted, 'br')) {
    response.body = await brotli(text, { params: { [constants.BROTLI_PARAM_QUALITY]: 4 } })
    setResponseHeader(event, 'content-encoding', 'br')
  }
  else if (accepts(accepted, 'gzip')) {
    response.body = await deflate(text)
    setResponseHeader(event, 'content-encoding', 'gzip')
  }
}

/** True when the header names the coding and does not weigh it with 0. */
function accepts(header: string, coding: string): boolean {
  return header.split(',').some((part) => {
    const [name, ...weights] = part.split(';').map(piece => piece.trim().toLowerCase())
    return name === coding && !weights.some(weight => /^q=0(\.0*)?$/.test(weight))
  })
}
