/** For comfort only: the server decides. Sends whoever is not signed in to the sign-in page, and back after it. */
export default defineNuxtRouteMiddleware(async (to) => {
  const { data } = await useFetch('/api/auth/me', { key: 'signed-in' })
  if (data.value && !data.value.person) return navigateTo({ path: '/sign-in', query: { next: to.path } })
})
