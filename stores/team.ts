import { TeamChange } from '#shared/schemas/team'
import type { Issue } from '#shared/types/error'
import type { Me } from '#shared/types/team'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'
import { changeOfDraft, draftOfTeam, type TeamDraft } from '~/utils/teamDraft'

/** The settings of the team as they are being changed. */
export const useTeamStore = defineStore('team', () => {
  const session = useSessionStore()
  const draft = ref<TeamDraft | null>(null)
  /** The draft as it was last saved, written out. */
  const kept = ref('')
  const issues = ref<Issue[]>([])
  const problem = ref<ApiProblem | null>(null)
  const saving = ref(false)
  const saved = ref(false)

  function begin() {
    draft.value = session.team && draftOfTeam(session.team)
    kept.value = JSON.stringify(draft.value)
    issues.value = []
    problem.value = null
    saved.value = false
  }
  const dirty = computed(() => JSON.stringify(draft.value) !== kept.value)
  const issueAt = (path: string) => issues.value.find(issue => issue.path === path)?.message

  /** @returns whether everything is saved. */
  async function save(): Promise<boolean> {
    if (!draft.value || saving.value) return false
    const sent = JSON.stringify(draft.value)
    const { change, issues: unread } = changeOfDraft(draft.value)
    const checked = TeamChange.safeParse(change)
    // What cannot be read as a number says so itself; that it is missing would be no news.
    const found = (checked.error?.issues ?? []).map(({ path, message }) => ({ path: path.map(String).join('.'), message }))
    issues.value = [...unread, ...found]
    problem.value = null
    saved.value = false
    if (issues.value.length > 0) return false
    saving.value = true
    try {
      const team = await $fetch<Me['team']>('/api/team', { method: 'PATCH', body: change })
      if (session.me) session.take({ ...session.me, team })
      // What was typed while it was on its way stays, unsaved.
      if (JSON.stringify(draft.value) === sent) begin()
      else kept.value = sent
      saved.value = true
      return !dirty.value
    }
    catch (error) {
      problem.value = apiProblemOf(error)
      issues.value = problem.value.issues ?? []
      return false
    }
    finally { saving.value = false }
  }

  return { draft, kept, issues, problem, saving, saved, dirty, begin, issueAt, save }
})
