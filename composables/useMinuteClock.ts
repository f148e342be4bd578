import { useIntervalFn } from '@vueuse/core'

const LOOK_EVERY_MS = 30_000

/** The present moment, ms. Null until the page is in the browser: the server's page must not depend on its hour. */
export function useMinuteClock() {
  const now = ref<number | null>(null)
  const look = () => now.value = Date.now()
  onMounted(look)
  useIntervalFn(look, LOOK_EVERY_MS, { immediate: import.meta.client })
  return now
}
