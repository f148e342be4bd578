/** The secret behind the # of a link: taken out of the address bar at once, and kept only in this page. Null until the page is in the browser. */
export function useLinkToken() {
  const token = ref<string | null>(null)
  onMounted(() => {
    token.value = location.hash.slice(1)
    if (token.value) history.replaceState(history.state, '', location.pathname + location.search)
  })
  return token
}
