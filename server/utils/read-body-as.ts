import { getHeader, setResponseHeader, type H3Event } from 'h3'
import type { z } from 'zod'
import { fail } from './fail'

const MOST_BYTES = 64 * 1024
/** Keys that would reach into an object's prototype. */
const UNSAFE_KEYS = new Set(['__proto__', 'constructor', 'prototype'])

/**
 * The request's body, as the schema says it must be; anything else ends the request with a clear sentence.
 *
 * Read as it streams in, so that a body without a length can't fill the memory.
 */
export async function readBodyAs<Schema extends z.ZodType>(event: H3Event, schema: Schema): Promise<z.output<Schema>> {
  const type = getHeader(event, 'content-type') ?? ''
  if (!/^application\/json\s*(;|$)/i.test(type)) fail(415, 'not-json', 'Send the data as JSON (Content-Type: application/json).')
  if (getHeader(event, 'content-encoding')) fail(415, 'encoded', 'Send the data uncompressed.')
  const parsed = schema.safeParse(parse(await readText(event)))
  if (parsed.success) return parsed.data
  const issue = parsed.error.issues[0]!
  const field = issue.path.join('.') || undefined
  fail(400, 'wrong-shape', field ? `${field}: ${issue.message}` : issue.message, field)
}

function readText(event: H3Event): Promise<string> {
  const request = event.node.req
  if (Number(getHeader(event, 'content-length') ?? 0) > MOST_BYTES) tooLarge(event)
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = []
    let bytes = 0
    request.on('data', (chunk: Buffer) => {
      bytes += chunk.length
      if (bytes <= MOST_BYTES) chunks.push(chunk)
      else {
        request.pause()
        request.removeAllListeners('data')
        try {
          tooLarge(event)
        }
        catch (error) {
          reject(error)
        }
      }
    })
    request.on('end', () => resolve(Buffer.concat(chunks).toString('utf8')))
    request.on('error', reject)
  })
}

function tooLarge(event: H3Event): never {
  setResponseHeader(event, 'connection', 'close')
  fail(413, 'too-large', `The data is too large: ${MOST_BYTES / 1024} kB at most.`)
}

function parse(text: string): unknown {
  try {
    return JSON.parse(text, (key, value: unknown) => {
      if (UNSAFE_KEYS.has(key)) throw new SyntaxError('unsafe key')
      return value
    })
  }
  catch {
    fail(400, 'not-json', 'The data is not valid JSON.')
  }
}
