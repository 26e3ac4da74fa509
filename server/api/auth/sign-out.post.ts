import { signOut } from '../../services/sign-in'

export default defineEventHandler(async (event) => {
  const { db, clock } = allowAnyone(event)
  const sessionId = await readSessionId(event)
  if (sessionId) signOut(db, clock.now(), sessionId)
  await clearSessionId(event)
  setResponseHeader(event, 'clear-site-data', '"cache", "storage"')
  return { signedOut: true }
})
