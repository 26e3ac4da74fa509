import { describe, expect, it } from 'vitest'
import { closeAllStreams, closeStreamsOf, dropStream, keepStream, type OpenStream } from '../../../server/services/open-streams'
import type { PersonId } from '../../../shared/types/ids'

describe('open streams', () => {
  const closed: string[] = []
  const stream = (person: string, sessionId: string): OpenStream => ({ personId: person as PersonId, sessionId, close: () => closed.push(`${person} ${sessionId}`) })

  it('are twelve a person at most, until one ends', () => {
    const own = Array.from({ length: 12 }, () => stream('many', 's'))
    expect(own.every(keepStream)).toBe(true)
    expect(keepStream(stream('many', 's'))).toBe(false)
    expect(keepStream(stream('another', 't'))).toBe(true)
    dropStream(own[0]!)
    expect(keepStream(stream('many', 's'))).toBe(true)
  })

  it('end with their session, and only with theirs', () => {
    keepStream(stream('two', 'phone'))
    keepStream(stream('two', 'office'))
    closeStreamsOf('phone')
    expect(closed).toEqual(['two phone'])
  })

  it('all end when the server stops, and none begins after', () => {
    closed.length = 0
    closeAllStreams()
    expect(closed).toContain('two office')
    expect(closed.length).toBeGreaterThan(13)
    expect(keepStream(stream('late', 's'))).toBe(false)
  })
})
