import { and, count, eq, isNull } from 'drizzle-orm'
import type { PersonId } from '../../../shared/types/ids'
import type { DbOrTransaction } from '../client'
import { farms, memberships, people } from '../schema'

export type Person = typeof people.$inferSelect

/** @param email - lower case, trimmed */
export function findPersonByEmail(db: DbOrTransaction, email: string): Person | undefined {
  return db.select().from(people).where(eq(people.email, email)).get()
}

export function findActivePerson(db: DbOrTransaction, id: PersonId): Person | undefined {
  return db.select().from(people).where(and(eq(people.id, id), isNull(people.disabledAt))).get()
}

export function updatePasswordHash(db: DbOrTransaction, id: PersonId, passwordHash: string): void {
  db.update(people).set({ passwordHash }).where(eq(people.id, id)).run()
}

export function countDemoPeople(db: DbOrTransaction): number {
  return db.select({ n: count() }).from(people).where(eq(people.demo, true)).get()!.n
}

/** The farms that a person belongs to, with the role on each. */
export function listFarmsOfPerson(db: DbOrTransaction, personId: PersonId) {
  return db.select({ slug: farms.slug, name: farms.name, zone: farms.zone, units: farms.units, invented: farms.invented, role: memberships.role })
    .from(memberships).innerJoin(farms, eq(farms.id, memberships.farmId))
    .where(eq(memberships.personId, personId)).orderBy(farms.createdAt, farms.name).all()
}

/** A farm as one person sees it: undefined both when it isn't there and when it isn't theirs. */
export function findFarmOfPerson(db: DbOrTransaction, slug: string, personId: PersonId) {
  return db.select({ farm: farms, role: memberships.role })
    .from(memberships).innerJoin(farms, eq(farms.id, memberships.farmId))
    .where(and(eq(farms.slug, slug), eq(memberships.personId, personId))).get()
}
