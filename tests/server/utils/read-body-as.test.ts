import { once } from 'node:events'
import { connect } from 'node:net'
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest'
import { eventHandler } from 'h3'
import { z } from 'zod'
import { readBodyAs } from '../../../server/utils/read-body-as'
import { smallServer, type SmallServer } from './small-server'

const Body = z.strictObject({ acres: z.number(), note: z.string().optional() })

describe('readBodyAs', () => {
  let server: SmallServer
  beforeAll(async () => {
    server = await smallServer(eventHandler(async event => ({ took: await readBodyAs(event, Body) })))
  })
  afterAll(() => server.close())
  afterEach(() => vi.useRealTimers())
  const send = async (body: BodyInit, headers: Record<string, string> = {}) => {
    const answer = await fetch(server.address, { method: 'POST', headers: { 'content-type': 'application/json', ...headers }, body, duplex: 'half' } as RequestInit)
    return { status: answer.status, ...await answer.json() as { took?: unknown, error?: { code: string, message: string, field?: string } } }
  }
  const head = (length: string) => `POST / HTTP/1.1\r\nHost: x\r\nContent-Type: application/json\r\n${length}\r\n\r\n`

  it('gives what the schema takes', async () => {
    expect(await send('{"acres":5,"note":"ø"}')).toEqual({ status: 200, took: { acres: 5, note: 'ø' } })
    expect((await send('{"acres":5}', { 'content-type': 'application/json; charset=utf-8' })).status).toBe(200)
  })

  it.each([
    ['no object', '7', 400, 'wrong-shape'],
    ['an array', '[{"acres":5}]', 400, 'wrong-shape'],
    ['text for a number', '{"acres":"5"}', 400, 'wrong-shape'],
    ['an endless number', '{"acres":1e400}', 400, 'wrong-shape'],
    ['a key too many', '{"acres":5,"role":"owner"}', 400, 'wrong-shape'],
    ['broken JSON', '{"acres":', 400, 'not-json'],
    ['nothing', '', 400, 'not-json'],
    ['a reach into prototypes', '{"acres":5,"__proto__":{"role":"owner"}}', 400, 'not-json'],
    ['a reach through the constructor', '{"acres":5,"constructor":{"prototype":{"role":"owner"}}}', 400, 'not-json'],
  ])('refuses %s', async (_, body, status, code) => {
    const answer = await send(body)
    expect([answer.status, answer.error?.code]).toEqual([status, code])
    expect(answer.error?.message).toMatch(/\w+ \w+/)
  })

  it('refuses a nest thirty thousand deep, and lives on', async () => {
    expect((await send('['.repeat(30_000) + ']'.repeat(30_000))).status).toBe(400)
    expect((await send('{"acres":5}')).status).toBe(200)
  })

  it('names the field that is wrong', async () => {
    expect((await send('{"acres":"5"}')).error?.field).toBe('acres')
  })

  it('refuses text that is not UTF-8', async () => {
    expect((await send(Buffer.concat([Buffer.from('{"acres":5,"note":"'), Buffer.from([0xff]), Buffer.from('"}')]))).error?.code).toBe('not-json')
  })

  it('refuses other types and codings', async () => {
    expect((await send('{"acres":5}', { 'content-type': 'text/plain' })).status).toBe(415)
    expect((await send('{"acres":5}', { 'content-type': 'application/jsonp' })).status).toBe(415)
    expect((await send('{"acres":5}', { 'content-encoding': 'gzip' })).status).toBe(415)
  })

  it('takes 64 kB to the byte and not one more, with and without a length', async () => {
    const note = (bytes: number) => `{"acres":5,"note":"${'x'.repeat(bytes - 21)}"}`
    const stream = (text: string) => new ReadableStream({
      start(controller) {
        for (let i = 0; i < text.length; i += 5000) controller.enqueue(new TextEncoder().encode(text.slice(i, i + 5000)))
        controller.close()
      },
    })
    expect(note(65_536)).toHaveLength(65_536)
    expect((await send(note(65_536))).status).toBe(200)
    expect((await send(note(65_537))).status).toBe(413)
    expect((await send(stream(note(65_536)))).status).toBe(200)
    expect((await send(stream(note(65_537)))).status).toBe(413)
  })

  it('gives up on a body that drips', async () => {
    vi.useFakeTimers({ toFake: ['setTimeout', 'clearTimeout'] })
    const socket = connect(server.port, '127.0.0.1')
    const answered = once(socket, 'data')
    socket.write(`${head('Content-Length: 50')}{"acres"`)
    while (vi.getTimerCount() === 0) await new Promise(resolve => setImmediate(resolve))
    vi.advanceTimersByTime(20_000)
    const [data] = await answered as [Buffer]
    expect(data.toString()).toMatch(/^HTTP\/1.1 408 [\s\S]*did not arrive in time/)
    socket.destroy()
  })

  it('lives on when the caller goes away half-way', async () => {
    const socket = connect(server.port, '127.0.0.1')
    socket.write(`${head('Content-Length: 50')}{"acres"`)
    await new Promise(resolve => setTimeout(resolve, 50))
    socket.destroy()
    await once(socket, 'close')
    expect((await send('{"acres":5}')).status).toBe(200)
  })
})
