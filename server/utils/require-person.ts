import type { H3Event } from 'h3'
import type { Person } from '../db/queries/people'
import { useApp, type App } from '../services/app'
import { personOfSession } from '../services/sign-in'
import { markAsked } from './asked'
import { fail } from './fail'
import { readSessionId } from './session-cookie'

export interface PersonContext extends App {
  person: Person
  now: Date
  sessionId: string
}

/** For a route that anybody may call. Says so in the one place where it must be said. */
export function allowAnyone(event: H3Event): App {
  markAsked(event, 'nothing')
  return useApp()
}

/** The signed-in person; ends the request with 401 when nobody is. */
export async function requirePerson(event: H3Event): Promise<PersonContext> {
  const app = useApp()
  const now = app.clock.now()
  const sessionId = await readSessionId(event)
  const person = sessionId ? personOfSession(app.db, now, sessionId) : undefined
  if (!sessionId || !person) fail(401, 'not-signed-in', 'Sign in first.')
  markAsked(event, 'person')
  event.context.personId = person.id
  return { ...app, person, now, sessionId }
}
