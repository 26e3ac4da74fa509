import { routeMethods } from '../services/routes'

/** What no route answers: 405 where another method would be answered, else 404. */
export default defineEventHandler((event) => {
  allowAnyone(event)
  const methods = routeMethods(event.path.split('?')[0]!)
  if (methods.length === 0) fail(404, 'not-found', 'There is nothing here.')
  setResponseHeader(event, 'allow', methods.join(', '))
  fail(405, 'method', `This address answers ${methods.join(' and ')} only.`)
})
