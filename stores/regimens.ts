import type { SavedRegimen } from '#shared/types/plan'
import type { LifeStep, TeamPlanInfo } from '#shared/types/planLife'
import type { SheetLook } from '#shared/types/sheet'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'

export interface RememberedPlan { id: string, version: number, animalName: string, speciesName: string, createdAt: string, linkExpiresAt: string }

/** A saved plan; with what its life says, when a member of its team opened it. */
export type OpenedRegimen = SavedRegimen & { team?: TeamPlanInfo }

/** Saved plans: those this browser remembers, the one being looked at, and the sheet whose code was scanned. */
export const useRegimensStore = defineStore('regimens', () => {
  const remembered = ref<RememberedPlan[]>([])
  const saved = ref<OpenedRegimen | null>(null)
  const sheet = ref<SheetLook | null>(null)
  const problem = ref<ApiProblem | null>(null)
  const loading = ref(false)

  /** Fetches into a place; what stood there of before goes when it cannot be had. */
  async function fetchInto<Answer>(into: Ref<Answer | null>, path: string, query: Record<string, string | number>) {
    loading.value = true
    try {
      into.value = await useRequestFetch()<Answer>(path, { query }) as Answer
      problem.value = null
    }
    catch (error) {
      into.value = null
      problem.value = apiProblemOf(error)
    }
    finally { loading.value = false }
  }

  async function loadRemembered() {
    loading.value = true
    try {
      remembered.value = (await useRequestFetch()<{ items: RememberedPlan[] }>('/api/regimens', { query: { of: 'browser' } })).items
      problem.value = null
    }
    catch (error) { problem.value = apiProblemOf(error) }
    finally { loading.value = false }
  }

  const load = (id: string, key: string | null, version?: number) => fetchInto(saved, `/api/regimens/${id}`, { ...(key && { key }), ...(version && { version }) })
  /** By the code on the paper; without one by the visit of a helper or by who is signed in. */
  const loadSheet = (id: string, version: number | null, code: string | null) => fetchInto(sheet, `/api/sheets/${id}`, { ...(version && { version }), ...(code && { code }) })

  /** What the life of the plan on the screen says now, after something was done to it. */
  function takeTeam(id: string, team: TeamPlanInfo) {
    if (saved.value?.id === id) saved.value = { ...saved.value, team }
  }
  async function takeStep(id: string, step: LifeStep, body: { version: number, note?: string, reason?: string }) {
    takeTeam(id, await $fetch<TeamPlanInfo>(`/api/regimens/${id}/${step}`, { method: 'POST', body }))
  }
  /** A guest's plan of this browser becomes the team's. @returns its id there. */
  async function takeIn(id: string): Promise<string> {
    return (await $fetch<{ id: string }>(`/api/regimens/${id}/take`, { method: 'POST', body: {} })).id
  }

  return { remembered, saved, sheet, problem, loading, loadRemembered, load, loadSheet, takeTeam, takeStep, takeIn }
})
