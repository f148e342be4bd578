import { StorageSerializers, useDebounceFn, useLocalStorage } from '@vueuse/core'
import type { Editing } from '~/stores/planner'
import { emptyDraft, type PlannerDraft } from '~/utils/plannerDraft'

/** How long after the last keystroke the plan is worked out again, ms. */
const PAUSE_MS = 200

/** Ties the planner to this browser: the draft survives a reload, and each change works the plan out again. */
export function usePlannerDraft() {
  const planner = usePlannerStore()
  const session = useSessionStore()
  const kept = useLocalStorage<PlannerDraft>('thimbleful.draft', emptyDraft(), { initOnMounted: true, mergeDefaults: true, writeDefaults: false })
  // Beside it, which saved plan the draft changes: a reload must not turn a new version into a second plan.
  const keptEditing = useLocalStorage<Editing | null>('thimbleful.editing', null, { initOnMounted: true, writeDefaults: false, serializer: StorageSerializers.object })
  const again = useDebounceFn(() => planner.preview(), PAUSE_MS)
  // What is watched after an await belongs to no screen by itself, and would go on asking after this one is left.
  const scope = getCurrentScope()

  onMounted(async () => {
    await nextTick()
    // A saved plan that is being changed stands; anything else begins where this browser left off.
    if (!planner.editing && planner.draft.speciesId === '') {
      planner.editing = keptEditing.value
      planner.draft = { ...emptyDraft(), ...JSON.parse(JSON.stringify(kept.value)) }
    }
    if (session.team && session.may('plan.edit')) planner.fillFromTeam(session.team)
    planner.fillFromBrowser()
    scope?.run(() => {
      watch(() => planner.draft, (draft) => {
        kept.value = JSON.parse(JSON.stringify(draft))
        again()
      }, { deep: true })
      watch(() => planner.editing, one => keptEditing.value = one, { immediate: true })
    })
    planner.preview()
  })
}
