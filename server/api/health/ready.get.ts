import { whyNotReady } from '../../services/health'
import { log } from '../../services/log'

/** The database can be written, the disk has room, and every place has had a forecast. Says no more to whoever asks. */
export default defineEventHandler((event) => {
  const reason = whyNotReady(allowAnyone(event))
  if (reason) {
    log('warn', 'Not ready.', { reason })
    fail(503, 'not-ready', 'Not ready yet.')
  }
  return { ready: true }
})
