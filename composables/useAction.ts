import { apiProblemOf, type ApiProblem } from '~/utils/apiError'

/** Something a button does: while it runs nothing else of it starts, and what went wrong is kept to be said. */
export function useAction() {
  const busy = ref(false)
  const problem = ref<ApiProblem | null>(null)
  const said = ref('')

  /** @param words what to say when it is done. @returns whether it was. */
  async function run(act: () => Promise<unknown>, words = ''): Promise<boolean> {
    if (busy.value) return false
    busy.value = true
    said.value = ''
    try {
      await act()
      problem.value = null
      said.value = words
      return true
    }
    catch (error) {
      problem.value = apiProblemOf(error)
      return false
    }
    finally { busy.value = false }
  }
  return { busy, problem, said, run }
}
