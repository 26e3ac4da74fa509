import { ofetch } from 'ofetch'
import type { Outcome } from './weather-gateway'

/** How large an answer may be. */
const MOST_BYTES = 24 * 1024 * 1024
const TRIES = 3
const FIRST_WAIT_MS = 1000
const LONGEST_WAIT_MS = 30_000

export interface Caller {
  /** 0 to 1 */
  random: () => number
  sleep: (ms: number) => Promise<void>
  /** longest that one try may take, answer and all */
  patienceMs: number
  now: () => Date
}

type Try = { ok: true, value: unknown } | { ok: false, trouble: string, again: boolean, retryAfterMs: number }

/**
 * GETs JSON: at most three tries with full jitter, only after network errors, 429 and 5xx; no redirects; capped in time
 * and size. An answer that is not JSON is the service's error.
 */
export async function fetchJson(url: string, caller: Caller): Promise<Outcome<unknown>> {
  for (let attempt = 1; ; attempt++) {
    const result = await tryOnce(url, caller)
    if (result.ok) return result
    if (!result.again || attempt === TRIES || result.retryAfterMs > LONGEST_WAIT_MS) return { ok: false, trouble: result.trouble }
    await caller.sleep(Math.max(result.retryAfterMs, caller.random() * Math.min(LONGEST_WAIT_MS, FIRST_WAIT_MS * 4 ** (attempt - 1))))
  }
}

async function tryOnce(url: string, caller: Caller): Promise<Try> {
  const failed = (trouble: string, again: boolean, retryAfterMs = 0): Try => ({ ok: false, trouble, again, retryAfterMs })
  const stop = new AbortController()
  const timer = setTimeout(() => stop.abort(), caller.patienceMs)
  try {
    const answer = await ofetch.raw<ReadableStream<Uint8Array>, 'stream'>(url, { responseType: 'stream', retry: 0, redirect: 'manual', ignoreResponseError: true, signal: stop.signal })
    if (answer.status >= 300 && answer.status < 400) return failed('The weather service sent us elsewhere, where we don\'t go.', false)
    if (answer.status === 429) return failed('The weather service says that we asked too often.', true, retryAfterMs(answer.headers, caller.now()))
    if (answer.status >= 500) return failed(`The weather service answered with an error (${answer.status}).`, true, retryAfterMs(answer.headers, caller.now()))
    if (answer.status !== 200) return failed(`The weather service did not understand us (${answer.status}).`, false)
    const text = await readCapped(answer._data!, stop.signal)
    if (text === null) return failed('The weather service sent far more than a forecast.', false)
    return parsed(text) ?? failed('The weather service sent something that is no forecast.', false)
  }
  catch {
    return failed(stop.signal.aborted ? 'The weather service took too long.' : 'The weather service can\'t be reached.', true)
  }
  finally {
    clearTimeout(timer)
    stop.abort()
  }
}

/** What a service says in Retry-After, seconds or a date (RFC 9110, 10.2.3); 0 when it says nothing that can be read. */
export function retryAfterMs(headers: Headers, now: Date): number {
  const said = headers.get('retry-after')?.trim() ?? ''
  const wait = /^\d+$/.test(said) ? 1000 * Number(said) : Date.parse(said) - now.getTime()
  return wait > 0 ? wait : 0
}

async function readCapped(stream: ReadableStream<Uint8Array>, signal: AbortSignal): Promise<string | null> {
  const reader = stream.getReader()
  const aborted = new Promise<never>((_, reject) => signal.addEventListener('abort', () => reject(new Error('too long')), { once: true }))
  const chunks: Uint8Array[] = []
  let bytes = 0
  for (;;) {
    const { done, value } = await Promise.race([reader.read(), aborted])
    if (done) return Buffer.concat(chunks).toString('utf8')
    bytes += value.length
    if (bytes > MOST_BYTES) {
      // Not waited for: a sender that doesn't stop must not hold us up.
      reader.cancel().catch(() => undefined)
      return null
    }
    chunks.push(value)
  }
}

function parsed(text: string): Try | null {
  try {
    return { ok: true, value: JSON.parse(text) as unknown }
  }
  catch {
    return null
  }
}
