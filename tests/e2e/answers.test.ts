import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startDemoServer, type DemoServer } from './demo-server'

const ORDER = '/api/farms/brindle-marsh/ground-order'
const OWNER = 'owner@brindlemarsh.example'

describe('the server’s answers', () => {
  let server: DemoServer
  beforeAll(async () => void (server = await startDemoServer()))
  afterAll(() => server?.stop())
  const send = (method: string, path: string, headers: Record<string, string> = {}, body?: string) => fetch(server.address + path, { method, headers: { origin: server.address, ...headers }, body, redirect: 'manual' })
  const signIn = async () => {
    const answer = await send('POST', '/api/auth/sign-in', { 'content-type': 'application/json' }, JSON.stringify({ email: OWNER, password: server.password }))
    return answer.headers.getSetCookie()[0]!.split(';')[0]!
  }

  it.each([
    ['DELETE', ORDER, 'GET, HEAD'],
    ['HEAD', '/api/farms/brindle-marsh/changes', 'GET'],
    ['OPTIONS', '/api/auth/me', 'GET, HEAD'],
    ['PUT', '/api/auth/sign-in', 'POST'],
    ['GET', '/api/auth/sign-out/', 'POST'],
    ['POST', '/sign-in', 'GET, HEAD'],
    ['DELETE', '/', 'GET, HEAD'],
  ])('say to %s %s which methods there are', async (method, path, allowed) => {
    const answer = await send(method, path)
    expect([answer.status, answer.headers.get('allow')]).toEqual([405, allowed])
  })

  it.each([['GET', '/api/nothing'], ['POST', '/api/nothing'], ['GET', '/api/_auth/session'], ['DELETE', '/api/_auth/session'], ['GET', '/nothing'], ['GET', '/_nitro/tasks'], ['GET', '/_nuxt/nothing.js'], ['GET', '/__nuxt_error?statusCode=500']])('say to %s %s that nothing is there, in the one shape', async (method, path) => {
    const answer = await send(method, path)
    expect(answer.status).toBe(404)
    expect(await answer.json()).toEqual({ error: { code: 'not-found', message: 'There is nothing here.', requestId: answer.headers.get('x-request-id') } })
  })

  it('have the same head, and nothing else, for HEAD', async () => {
    const cookie = await signIn()
    const [head, get] = [await send('HEAD', ORDER, { cookie }), await send('GET', ORDER, { cookie })]
    expect([head.status, head.headers.get('content-type'), await head.text()]).toEqual([200, get.headers.get('content-type'), ''])
    expect((await send('HEAD', ORDER)).status).toBe(401)
    expect((await send('HEAD', '/api/health/live')).status).toBe(200)
  })

  it('give no session to a seal that comes outside the cookie', async () => {
    const seal = decodeURIComponent((await signIn()).split('=')[1]!)
    expect((await send('GET', ORDER, { 'cookie': 'sillion=none', 'x-sillion-session': seal })).status).toBe(401)
  })

  it('serve others while the demo’s clock moves, and refuse a second move', async () => {
    const cookie = await signIn()
    const move = () => send('POST', '/api/farms/brindle-marsh/demo-clock/moves', { cookie, 'content-type': 'application/json' }, '{"hours":6}')
    const [first, second] = [move(), move()]
    let served = 0
    while (await Promise.race([Promise.all([first, second]).then(() => false), send('GET', '/api/health/live').then(() => true)])) served++
    expect([(await first).status, (await second).status].sort()).toEqual([200, 409])
    expect(served).toBeGreaterThan(3)
  })

  it('draw a page for a person who looks for one that is not there', async () => {
    const answer = await send('GET', '/nothing', { accept: 'text/html' })
    expect([answer.status, answer.headers.get('content-type')]).toEqual([404, 'text/html;charset=utf-8'])
    expect(await answer.text()).not.toMatch(/node_modules|\.mjs:\d/)
  })

  it('take a change from the page’s own address whatever the host is called, and from no other', async () => {
    const body = JSON.stringify({ email: OWNER, password: 'not the right sentence' })
    const from = async (headers: Record<string, string>) => (await fetch(`${server.address.replace('localhost', '127.0.0.1')}/api/auth/sign-in`, { method: 'POST', headers: { 'content-type': 'application/json', ...headers }, body })).status
    const here = server.address.replace('localhost', '127.0.0.1')
    expect(await from({ 'origin': here, 'sec-fetch-site': 'same-origin' })).toBe(401)
    expect(await from({ 'origin': 'https://elsewhere.example', 'sec-fetch-site': 'same-origin' })).toBe(403)
    expect(await from({ origin: here })).toBe(403)
    expect(await from({})).toBe(403)
  })

  it('end an older session when the same browser signs in again', async () => {
    const first = await signIn()
    const again = await send('POST', '/api/auth/sign-in', { 'content-type': 'application/json', 'cookie': first }, JSON.stringify({ email: OWNER, password: server.password }))
    const second = again.headers.getSetCookie().at(-1)!.split(';')[0]!
    expect(second).not.toBe(first)
    expect((await send('GET', ORDER, { cookie: second })).status).toBe(200)
    expect((await send('GET', ORDER, { cookie: first })).status).toBe(401)
  })

  it('stop telling of changes at once when the person signs out', async () => {
    const cookie = await signIn()
    const stream = await send('GET', '/api/farms/brindle-marsh/changes', { cookie })
    const ended = stream.text()
    expect((await send('POST', '/api/auth/sign-out', { cookie })).status).toBe(200)
    expect(await ended).toContain('event: beat')
  })

  it('are compressed as the caller likes', async () => {
    const cookie = await signIn()
    const coding = async (accepted: string) => (await send('GET', ORDER, { cookie, 'accept-encoding': accepted })).headers.get('content-encoding')
    expect([await coding('gzip, br'), await coding('gzip'), await coding('br;q=0, gzip;q=0.5'), await coding('identity')]).toEqual(['br', 'gzip', 'gzip', null])
  })

  it('leave one line of JSON each in the log, without passwords or cookies', async () => {
    const answer = await send('GET', '/api/auth/me')
    await expect.poll(() => server.log()).toContain(answer.headers.get('x-request-id'))
    const lines = server.log().split('\n').filter(line => line && !line.startsWith('Listening'))
    const parsed = lines.map(line => JSON.parse(line) as { time: string, level: string, message: string, requestId?: string, status?: number })
    expect(parsed.every(line => !Number.isNaN(Date.parse(line.time)) && line.level && line.message)).toBe(true)
    expect(parsed.filter(line => line.requestId === answer.headers.get('x-request-id') && line.status === 200)).toHaveLength(1)
    expect(server.log()).not.toContain(server.password)
    expect(server.log()).not.toContain('Fe26')
  })
})
