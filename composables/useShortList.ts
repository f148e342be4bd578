import type { Page } from '#shared/types/team'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'

/** A list inside a page that has others: its newest rows, and more on request. Nothing of it stands in the address. */
export function useShortList<Row>(path: () => string) {
  const rows = ref<Row[]>([]) as Ref<Row[]>
  const total = ref(0)
  const loading = ref(false)
  const problem = ref<ApiProblem | null>(null)
  let page = 0
  let sequence = 0

  async function fetchPage(wanted: number) {
    const mine = ++sequence
    loading.value = true
    try {
      const answer = await $fetch<Page<Row>>(path(), { query: { page: wanted } })
      if (mine !== sequence) return
      rows.value = wanted === 1 ? answer.items : [...rows.value, ...answer.items]
      total.value = answer.total
      page = wanted
      problem.value = null
    }
    catch (error) {
      if (mine === sequence) problem.value = apiProblemOf(error)
    }
    finally {
      if (mine === sequence) loading.value = false
    }
  }
  const load = () => fetchPage(1)
  const more = () => fetchPage(page + 1)

  onMounted(load)
  watch(path, load)

  return { rows, total, loading, problem, load, more }
}
