import type { Page } from '#shared/types/team'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'

/** How long after the last keystroke a search is sent, ms. */
const PAUSE_MS = 250

/**
 * One page of a list that the server pages, sorts, filters and searches. What is asked for stands in the address of the
 * page, so that going back or sending it on shows the same.
 *
 * @param path  of the API.
 * @param filters  names of further parts of the query that this list knows.
 */
export function useServerList<Row>(path: () => string, usualSort: string, filters: string[] = []) {
  const route = useRoute()
  const router = useRouter()
  const text = (name: string) => typeof route.query[name] === 'string' ? route.query[name] : ''
  const asked = computed(() => ({
    page: Math.max(1, Number(text('page')) || 1),
    sort: text('sort') || usualSort,
    q: text('q'),
    ...Object.fromEntries(filters.map(name => [name, text(name)])) as Record<string, string>,
  }))
  const rows = ref<Row[]>([]) as Ref<Row[]>
  const total = ref(0)
  const pageSize = ref(25)
  const loading = ref(false)
  const loaded = ref(false)
  const problem = ref<ApiProblem | null>(null)
  const fetcher = useRequestFetch()
  let sequence = 0

  async function load() {
    const mine = ++sequence
    loading.value = true
    try {
      const query = Object.fromEntries(Object.entries(asked.value).filter(([, value]) => value !== ''))
      const answer = await fetcher<Page<Row>>(path(), { query })
      if (mine !== sequence) return
      rows.value = answer.items
      total.value = answer.total
      pageSize.value = answer.pageSize
      problem.value = null
      loaded.value = true
    }
    catch (error) {
      if (mine === sequence) problem.value = apiProblemOf(error)
    }
    finally {
      if (mine === sequence) loading.value = false
    }
  }

  /** Any change of what is asked begins at the first page. */
  function ask(changes: Record<string, string | number>) {
    const query = { ...route.query, ...('page' in changes ? {} : { page: undefined }), ...Object.fromEntries(Object.entries(changes).map(([name, value]) => [name, value === '' ? undefined : String(value)])) }
    return router.replace({ query, hash: route.hash })
  }
  const search = useDebounceFn((q: string) => ask({ q }), PAUSE_MS)

  watch(asked, load, { deep: true })
  onMounted(load)

  return { rows, total, pageSize, loading, loaded, problem, asked, load, ask, search }
}
