import { SignInBody } from '#shared/schemas/auth'
import { listFarmsOfPerson } from '../../db/queries/people'
import { log } from '../../services/log'
import { signIn, signOut } from '../../services/sign-in'

export default defineEventHandler(async (event) => {
  const { db, clock } = allowAnyone(event)
  const { email, password } = await readBodyAs(event, SignInBody)
  const result = await signIn(db, clock.now(), { email, password, address: clientAddress(event) })
  log('info', 'sign-in', { outcome: result.outcome, requestId: event.context.requestId })
  switch (result.outcome) {
    case 'too-many-tries':
      setResponseHeader(event, 'retry-after', result.retryAfterSeconds)
      return fail(429, 'too-many-tries', `Too many tries. Wait ${Math.ceil(result.retryAfterSeconds / 60)} minutes, then try again.`)
    case 'busy': return fail(503, 'busy', 'Many people are signing in just now. Try again in a moment.')
    case 'refused': return fail(401, 'wrong-sign-in', 'That e-mail and password don\'t go together.')
    case 'signed-in': {
      const before = await readSessionId(event)
      if (before) signOut(db, clock.now(), before)
      await writeSessionId(event, result.sessionId)
      const { id, name } = result.person
      return { person: { id, name, email: result.person.email }, farms: listFarmsOfPerson(db, id) }
    }
  }
})
