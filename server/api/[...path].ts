/** What no route answers. A known path with another method is answered before, with the methods that it has. */
export default defineEventHandler((event) => {
  allowAnyone(event)
  fail(404, 'not-found', 'There is nothing here.')
})
