/** Who is signed in is known before any page decides what to show: asked once, on the server where the page is made there. */
export default defineNuxtRouteMiddleware(async () => {
  const session = useSessionStore()
  if (!session.known) await session.load()
})
