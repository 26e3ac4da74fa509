import { afterEach, describe, expect, it } from 'vitest'
import { eventHandler, setResponseStatus, type H3Event } from 'h3'
import { markAsked, withholdUnasked } from '../../../server/utils/asked'
import { smallServer, type SmallServer } from './small-server'

describe('withholdUnasked', () => {
  let server: SmallServer
  afterEach(() => server.close())
  const answerOf = async (path: string, asks: (event: H3Event) => void) => {
    server = await smallServer(eventHandler((event) => {
      asks(event)
      return { secret: 'acres' }
    }), { onBeforeResponse: withholdUnasked })
    const answer = await fetch(server.address + path)
    return { status: answer.status, text: await answer.text() }
  }
  const withheld = { status: 500, text: expect.not.stringContaining('acres') as string }

  it.each([
    ['a handler that asked nothing', '/api/auth/me', () => {}],
    ['a farm’s handler that asked nothing', '/api/farms/a/fields', () => {}],
    ['a farm’s handler that is open to anybody', '/api/farms/a/fields', (event: H3Event) => markAsked(event, 'nothing')],
    ['a farm’s handler that only asked who is there', '/api/farms/a?all=1', (event: H3Event) => markAsked(event, 'person')],
    ['one that says so with a client’s error', '/api/farms/a/fields', (event: H3Event) => setResponseStatus(event, 404)],
  ])('gives nothing away of %s', async (_, path, asks) => {
    expect(await answerOf(path, asks)).toEqual(withheld)
  })

  it.each([
    ['a farm’s handler that asked for a permission', '/api/farms/a/fields', (event: H3Event) => markAsked(event, 'farm:see')],
    ['the list of a person’s farms', '/api/farms', (event: H3Event) => markAsked(event, 'person')],
    ['an open handler that says so', '/api/auth/me', (event: H3Event) => markAsked(event, 'nothing')],
    ['a page', '/sign-in', () => {}],
  ])('lets through %s', async (_, path, asks) => {
    const { status, text } = await answerOf(path, asks)
    expect({ status, body: JSON.parse(text) as unknown }).toEqual({ status: 200, body: { secret: 'acres' } })
  })
})
