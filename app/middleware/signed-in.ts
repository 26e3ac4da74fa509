/** For comfort only: the server decides. Sends whoever is not signed in to the sign-in page, and back after it. */
export default defineNuxtRouteMiddleware(async (to) => {
  const me = useMeStore()
  // When the server fails here, the page asks it as well and says so.
  await me.load().catch(() => undefined)
  if (me.asked && !me.person) return navigateTo({ path: '/sign-in', query: { next: to.path } })
})
