import { useDebounceFn, useLocalStorage } from '@vueuse/core'
import { emptyDraft, type PlannerDraft } from '~/utils/plannerDraft'

/** How long after the last keystroke the plan is worked out again, ms. */
const PAUSE_MS = 200

/** Ties the planner to this browser: the draft survives a reload, and each change works the plan out again. */
export function usePlannerDraft() {
  const planner = usePlannerStore()
  const kept = useLocalStorage<PlannerDraft>('thimbleful.draft', emptyDraft(), { initOnMounted: true, mergeDefaults: true, writeDefaults: false })
  const again = useDebounceFn(() => planner.preview(), PAUSE_MS)

  onMounted(async () => {
    await nextTick()
    // A saved plan that is being changed stands; anything else begins where this browser left off.
    if (!planner.editing && planner.draft.speciesId === '') planner.draft = { ...emptyDraft(), ...JSON.parse(JSON.stringify(kept.value)) }
    planner.fillFromBrowser()
    watch(() => planner.draft, (draft) => {
      kept.value = JSON.parse(JSON.stringify(draft))
      again()
    }, { deep: true })
    planner.preview()
  })
}
