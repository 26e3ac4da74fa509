import type { IncomingMessage } from 'node:http'
import { getHeader, setResponseHeader, type H3Event } from 'h3'
import type { z } from 'zod'
import { fail } from './fail'

const MOST_BYTES = 64 * 1024
/** A phone at the field's edge needs seconds for 64 kB; nobody needs more. */
const MOST_MS = 20_000
const TOO_LARGE = `The data is too large: ${MOST_BYTES / 1024} kB at most.`
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

async function readText(event: H3Event): Promise<string> {
  const request = event.node.req
  if (Number(getHeader(event, 'content-length') ?? 0) > MOST_BYTES) refuseUnread(event, 413, 'too-large', TOO_LARGE)
  const read = await readBytes(request)
  if (read === 'too-large') refuseUnread(event, 413, 'too-large', TOO_LARGE)
  if (read === 'cut-off') fail(400, 'cut-off', 'The data broke off. Send it again.')
  if (read === 'too-slow') refuseUnread(event, 408, 'too-slow', 'The data did not arrive in time. Send it again.')
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(read)
  }
  catch {
    fail(400, 'not-json', 'The data is not valid JSON: it is not UTF-8.')
  }
}

/** Reads no further than is allowed, in bytes and in time; what is left stays unread. */
function readBytes(request: IncomingMessage): Promise<Buffer | 'too-large' | 'too-slow' | 'cut-off'> {
  return new Promise((resolve) => {
    const chunks: Buffer[] = []
    let bytes = 0
    const timer = setTimeout(finish, MOST_MS, 'too-slow')
    request.on('data', take).on('end', end).on('error', cut).on('close', cut)

    function take(chunk: Buffer): void {
      bytes += chunk.length
      if (bytes > MOST_BYTES) finish('too-large')
      else chunks.push(chunk)
    }
    function end(): void {
      finish(Buffer.concat(chunks))
    }
    function cut(): void {
      finish('cut-off')
    }
    function finish(outcome: Buffer | 'too-large' | 'too-slow' | 'cut-off'): void {
      clearTimeout(timer)
      request.off('data', take).off('end', end).off('error', cut).off('close', cut).pause()
      resolve(outcome)
    }
  })
}

/** What is still on its way would be taken for the next request, so the connection ends with the answer. */
function refuseUnread(event: H3Event, status: number, code: string, message: string): never {
  setResponseHeader(event, 'connection', 'close')
  fail(status, code, message)
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
