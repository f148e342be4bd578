import { useIntervalFn } from '@vueuse/core'
import { dateInZone } from '~/utils/dates'

/** How often a page that stays open looks whether a new day has begun, ms. */
const LOOK_EVERY_MS = 60_000

/** Today in a time zone. Null until the page is in the browser: the server's page must not depend on its hour. */
export function useToday(timeZone: () => string) {
  const today = ref<string | null>(null)
  const look = () => today.value = dateInZone(new Date(), timeZone())
  onMounted(look)
  watch(timeZone, () => today.value !== null && look())
  useIntervalFn(look, LOOK_EVERY_MS, { immediate: import.meta.client })
  return today
}
