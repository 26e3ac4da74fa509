import { isReady } from '../../services/health'

/** The database can be written and every place has had a forecast once. Says no more to whoever asks. */
export default defineEventHandler((event) => {
  const { db, clock } = allowAnyone(event)
  if (!isReady(db, clock.now())) fail(503, 'not-ready', 'Not ready yet.')
  return { ready: true }
})
