import { getCookie, type H3Event } from 'h3'

declare module '#auth-utils' {
  interface SecureSessionData {
    sessionId: string
  }
}

/** The session id in the sealed cookie; undefined without one, or when the seal is broken. */
export async function readSessionId(event: H3Event): Promise<string | undefined> {
  // Asking would make a cookie for everybody who has none.
  if (!getCookie(event, useRuntimeConfig(event).session.name!)) return undefined
  const session = await getUserSession(event)
  return session.secure?.sessionId
}

/** Seals a new session id into a new cookie; whatever cookie came with the request is dropped. */
export async function writeSessionId(event: H3Event, sessionId: string): Promise<void> {
  await replaceUserSession(event, { secure: { sessionId } })
}

export async function clearSessionId(event: H3Event): Promise<void> {
  await clearUserSession(event)
}
