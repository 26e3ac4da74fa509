import { listFarmsOfPerson } from '../../db/queries/people'

/** The farms of whoever is signed in, with their role on each. */
export default defineEventHandler(async (event) => {
  const { db, person } = await requirePerson(event)
  return { farms: listFarmsOfPerson(db, person.id) }
})
