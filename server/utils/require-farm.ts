import { getRouterParam, type H3Event } from 'h3'
import { mayDo, type Permission, type Role } from '../../shared/utils/permissions'
import { findFarmOfPerson } from '../db/queries/people'
import type { Farm } from '../db/queries/farms'
import { markAsked } from './asked'
import { fail } from './fail'
import { requirePerson, type PersonContext } from './require-person'

export interface FarmContext extends PersonContext {
  farm: Farm
  role: Role
}

/**
 * The farm of the path, for a person who may do what the route does.
 *
 * Ends the request with 401 when nobody is signed in, 404 when the farm isn't there or isn't theirs (they can't tell
 * which), 403 when their role may not.
 */
export async function requireFarm(event: H3Event, permission: Permission): Promise<FarmContext> {
  const context = await requirePerson(event)
  const found = findFarmOfPerson(context.db, getRouterParam(event, 'farm') ?? '', context.person.id)
  if (!found) fail(404, 'not-found', 'There is no such farm.')
  if (!mayDo(found.role, permission)) fail(403, 'role', `Your role on this farm (${found.role}) does not allow this. The owner can.`)
  markAsked(event, permission)
  event.context.farmId = found.farm.id
  return { ...context, ...found }
}
