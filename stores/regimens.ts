import type { SavedRegimen } from '#shared/types/plan'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'

export interface RememberedPlan { id: string, version: number, animalName: string, speciesName: string, createdAt: string, linkExpiresAt: string }

/** Saved plans: those this browser remembers, and the one being looked at. */
export const useRegimensStore = defineStore('regimens', () => {
  const remembered = ref<RememberedPlan[]>([])
  const saved = ref<SavedRegimen | null>(null)
  const problem = ref<ApiProblem | null>(null)
  const loading = ref(false)

  async function loadRemembered() {
    loading.value = true
    try {
      remembered.value = (await useRequestFetch()<{ items: RememberedPlan[] }>('/api/regimens')).items
      problem.value = null
    }
    catch (error) { problem.value = apiProblemOf(error) }
    finally { loading.value = false }
  }

  async function load(id: string, key: string | null, version?: number) {
    loading.value = true
    try {
      saved.value = await useRequestFetch()<SavedRegimen>(`/api/regimens/${id}`, { query: { ...(key && { key }), ...(version && { version }) } })
      problem.value = null
    }
    catch (error) {
      saved.value = null
      problem.value = apiProblemOf(error)
    }
    finally { loading.value = false }
  }

  return { remembered, saved, problem, loading, loadRemembered, load }
})
