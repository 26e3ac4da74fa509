import { onChange } from '../../../services/changes'
import { dropStream, keepStream, type OpenStream } from '../../../services/open-streams'

const HEARTBEAT_MS = 25_000
const GRACE_MS = 1000

/** Server-sent events: 'changed' whenever the farm's data or weather did. The page then asks for it anew. */
export default defineEventHandler(async (event) => {
  const { farm, person, sessionId } = await requireFarm(event, 'farm:see')
  const stream = createEventStream(event)
  const open: OpenStream = { personId: person.id, sessionId, close }
  if (!keepStream(open)) {
    setResponseHeader(event, 'retry-after', 30)
    fail(429, 'too-many-pages', 'Too many pages are open. Close some, then load this one again.')
  }
  const stop = onChange(farm.id, () => void stream.push({ event: 'changed', data: '1' }))
  // Each beat asks again, so that a person who was disabled or left the farm stops hearing.
  const beat = setInterval(() => {
    requireFarm(event, 'farm:see').then(() => stream.push({ event: 'beat', data: '1' }), close)
  }, HEARTBEAT_MS)
  event.node.res.once('close', () => {
    stop()
    clearInterval(beat)
    dropStream(open)
    void stream.close()
  })
  // Without a first word the browser would not know that it is connected.
  void stream.push({ event: 'beat', data: '1' })
  return stream.send()

  /** Says goodbye; whoever does not read it is cut off, so that a stopping server need not wait. */
  function close(): void {
    void stream.close()
    setTimeout(() => event.node.res.writableFinished || event.node.req.socket.destroy(), GRACE_MS).unref()
  }
})
