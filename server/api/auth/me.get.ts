import { listFarmsOfPerson } from '../../db/queries/people'
import { personOfSession } from '../../services/sign-in'

/** Who is signed in; `person: null` for nobody, so that the sign-in page can ask without an error. */
export default defineEventHandler(async (event) => {
  const { db, clock } = allowAnyone(event)
  const sessionId = await readSessionId(event)
  const person = sessionId ? personOfSession(db, clock.now(), sessionId) : undefined
  if (!person) return { person: null, farms: [] }
  return { person: { id: person.id, name: person.name, email: person.email }, farms: listFarmsOfPerson(db, person.id) }
})
