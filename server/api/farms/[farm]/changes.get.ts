import { onChange } from '../../../services/changes'

const HEARTBEAT_MS = 25_000

/** Server-sent events: 'changed' whenever the farm's data or weather did. The page then asks for it anew. */
export default defineEventHandler(async (event) => {
  const { farm } = await requireFarm(event, 'farm:see')
  const stream = createEventStream(event)
  const stop = onChange(farm.id, () => void stream.push({ event: 'changed', data: '1' }))
  // Each beat asks again, so that a signed-out or disabled person stops hearing.
  const beat = setInterval(() => {
    requireFarm(event, 'farm:see').then(() => stream.push({ event: 'beat', data: '1' }), () => stream.close())
  }, HEARTBEAT_MS)
  stream.onClosed(async () => {
    stop()
    clearInterval(beat)
    await stream.close()
  })
  // Without a first word the browser would not know that it is connected.
  void stream.push({ event: 'beat', data: '1' })
  return stream.send()
})
