/** Sends people to the sign-in page and back. A courtesy: what may be seen is decided by the routes. */
export default defineNuxtRouteMiddleware((to) => {
  const session = useSessionStore()
  if (session.known && !session.user) return navigateTo({ path: '/sign-in', query: { to: to.fullPath } })
})
