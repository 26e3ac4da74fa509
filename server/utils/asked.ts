import { getResponseStatus, setResponseHeader, setResponseStatus, type H3Event } from 'h3'
import type { FarmId, PersonId } from '../../shared/types/ids'
import type { Permission } from '../../shared/utils/permissions'
import { log } from '../services/log'
import { routeOf } from '../services/log-request'

/** What a handler asked before it answered: nothing of anybody, a signed-in person, or a permission on the farm. */
export type Asked = 'nothing' | 'person' | Permission

declare module 'h3' {
  interface H3EventContext {
    asked?: Asked
    requestId?: string
    nonce?: string
    personId?: PersonId
    farmId?: FarmId
  }
}

/** Remembers what the handler has asked. */
export function markAsked(event: H3Event, asked: Asked): void {
  event.context.asked = asked
}

/**
 * Fails closed: an API handler that answers without having asked gives nothing away, and one below a farm must have
 * asked for a permission there.
 *
 * @param response - what is about to be sent; its body is replaced when it must not go out
 */
export function withholdUnasked(event: H3Event, response: { body?: unknown }): void {
  const path = event.path.split('?')[0]!
  if (!path.startsWith('/api/') || mayAnswer(path, event.context.asked)) return
  log('error', 'A route answered without asking for a permission.', { requestId: event.context.requestId, route: routeOf(event), status: getResponseStatus(event) })
  setResponseStatus(event, 500)
  setResponseHeader(event, 'content-type', 'application/json')
  response.body = { error: { code: 'internal', message: 'Something went wrong on our side.', requestId: event.context.requestId ?? '' } }
}

function mayAnswer(path: string, asked: Asked | undefined): boolean {
  const belowFarm = /^\/api\/farms\/[^/]/.test(path)
  return asked !== undefined && !(belowFarm && (asked === 'nothing' || asked === 'person'))
}
