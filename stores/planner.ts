import type { Issue } from '#shared/types/error'
import type { Plan, SavedRegimen, SavedRegimenReceipt } from '#shared/types/plan'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'
import { draftOfInput, emptyDraft, inputOfDraft, localOf, stillNeeded, type PlannerDraft } from '~/utils/plannerDraft'

/** What the planner is changing, when it is a saved plan. */
export interface Editing { id: string, version: number, key: string | null }

/** The planner: what was typed, the plan that follows, and what is wrong with it. Works nothing out itself. */
export const usePlannerStore = defineStore('planner', () => {
  const draft = ref<PlannerDraft>(emptyDraft())
  const editing = ref<Editing | null>(null)
  const plan = ref<Plan | null>(null)
  const problem = ref<ApiProblem | null>(null)
  const localIssues = ref<Issue[]>([])
  const working = ref(false)
  const saving = ref(false)
  const undone = ref<PlannerDraft | null>(null)
  let sequence = 0
  let aborter: AbortController | null = null

  const needed = computed(() => stillNeeded(draft.value))
  const issues = computed<Issue[]>(() => [...localIssues.value, ...(problem.value?.issues ?? [])])

  /** Fills what only the browser knows. Called once it is there, so that server and browser agree on the first page. */
  function fillFromBrowser() {
    if (draft.value.timeZone === '') draft.value.timeZone = Intl.DateTimeFormat().resolvedOptions().timeZone || 'Etc/UTC'
    if (draft.value.startAt === '') draft.value.startAt = localOf(new Date())
  }

  function issueAt(path: string): string | undefined {
    return issues.value.find(one => one.path === path)?.message
  }

  /** Works the plan out again. An answer that a newer question has overtaken is dropped. */
  async function preview() {
    const { input, issues: found } = inputOfDraft(draft.value)
    localIssues.value = found
    if (needed.value.length > 0 || found.length > 0) {
      if (needed.value.length > 0) plan.value = null
      return
    }
    const mine = ++sequence
    aborter?.abort()
    aborter = new AbortController()
    working.value = true
    try {
      const answer = await $fetch<Plan>('/api/regimens/preview', { method: 'POST', body: input, signal: aborter.signal })
      if (mine !== sequence) return
      plan.value = answer
      problem.value = null
    }
    catch (error) {
      if (mine === sequence) problem.value = apiProblemOf(error)
    }
    finally {
      if (mine === sequence) working.value = false
    }
  }

  /** Saves a new plan, or a new version of the one being changed. @returns where it can be seen. */
  async function save(): Promise<string | null> {
    const { input } = inputOfDraft(draft.value)
    saving.value = true
    try {
      if (editing.value) {
        const { id, version, key } = editing.value
        await $fetch(`/api/regimens/${id}`, { method: 'PATCH', query: key ? { key } : {}, body: { ...input, baseVersion: version } })
        editing.value = null
        return `/plans/${id}${key ? `?key=${encodeURIComponent(key)}` : ''}`
      }
      const { id, key } = await $fetch<SavedRegimenReceipt>('/api/regimens', { method: 'POST', body: input })
      return `/plans/${id}?key=${encodeURIComponent(key)}`
    }
    catch (error) {
      problem.value = apiProblemOf(error)
      return null
    }
    finally { saving.value = false }
  }

  /** An unsaved plan on paper. @returns an address of the PDF in this browser, or null with the problem said. */
  async function printPreview(kind: 'sheet' | 'mixing' | 'label', paper: string, days: string): Promise<string | null> {
    try {
      const { input } = inputOfDraft(draft.value)
      const pdf = await $fetch<Blob>(`/api/regimens/${kind}.pdf`, { method: 'POST', query: { paper, days }, body: input, responseType: 'blob' })
      return URL.createObjectURL(pdf)
    }
    catch (error) {
      problem.value = apiProblemOf(error)
      return null
    }
  }

  function startOver() {
    undone.value = draft.value
    draft.value = emptyDraft()
    editing.value = null
    plan.value = null
    problem.value = null
    fillFromBrowser()
  }

  function undo() {
    if (!undone.value) return
    draft.value = undone.value
    undone.value = null
  }

  function change(saved: SavedRegimen, key: string | null) {
    draft.value = draftOfInput(saved.input)
    editing.value = { id: saved.id, version: saved.latestVersion, key }
    plan.value = saved.plan
  }

  return { draft, editing, plan, problem, working, saving, undone, needed, issues, fillFromBrowser, issueAt, preview, save, printPreview, startOver, undo, change }
})
