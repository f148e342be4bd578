import type { Issue } from '#shared/types/error'
import type { Plan, SavedRegimen, SavedRegimenReceipt } from '#shared/types/plan'
import type { Me } from '#shared/types/team'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'
import { draftOfInput, draftInHouse, emptyDraft, inputOfDraft, isUntouched, localOf, nextDraft, startIsOld, stillNeeded, type PlannerDraft } from '~/utils/plannerDraft'

/** What the planner is changing, when it is a saved plan. */
export interface Editing { id: string, version: number, key: string | null, /** A team's plan, opened by a member. */ team?: boolean }

/** A plan that was just saved, so that the emptied form can say where it went. */
export interface JustSaved { name: string, to: string }

/** The planner: what was typed, the plan that follows, and what is wrong with it. Works nothing out itself. */
export const usePlannerStore = defineStore('planner', () => {
  const draft = ref<PlannerDraft>(emptyDraft())
  const editing = ref<Editing | null>(null)
  const plan = ref<Plan | null>(null)
  const problem = ref<ApiProblem | null>(null)
  const localIssues = ref<Issue[]>([])
  const working = ref(false)
  const saving = ref(false)
  const undone = ref<{ draft: PlannerDraft, editing: Editing | null } | null>(null)
  const justSaved = ref<JustSaved | null>(null)
  /** The day an old draft begins on, until the person says what to do about it. */
  const begunOn = ref('')
  /** The team whose settings the form was filled in from. */
  const filledFrom = ref('')
  /** What changed, for the version that is about to be saved. */
  const note = ref('')
  /** Weight and day of the saved plan that is being changed. */
  let weighedBefore: { weight: string, on: string } | null = null
  let sequence = 0
  let aborter: AbortController | null = null

  const needed = computed(() => stillNeeded(draft.value))
  const issues = computed<Issue[]>(() => [...localIssues.value, ...(problem.value?.issues ?? [])])
  /** The plan shown is not the plan of what is typed: it is dimmed, and neither saved nor printed. */
  const behind = computed(() => working.value || problem.value !== null || localIssues.value.length > 0)

  /** Fills in the house from the team's settings, as long as nothing of an animal is typed. */
  function fillFromTeam(team: NonNullable<Me['team']>) {
    if (editing.value !== null || !isUntouched(draft.value)) return
    draft.value = draftInHouse(draft.value, team)
    filledFrom.value = team.name
  }

  /** Fills what only the browser knows. Called once it is there, so that server and browser agree on the first page. */
  function fillFromBrowser() {
    if (draft.value.timeZone === '') draft.value.timeZone = Intl.DateTimeFormat().resolvedOptions().timeZone || 'Etc/UTC'
    if (draft.value.startAt === '') draft.value.startAt = localOf(new Date())
    // The plan of a saved animal goes on from where it began; an unsaved one from days ago is asked about.
    if (editing.value === null && draft.value.speciesId !== '' && startIsOld(draft.value, new Date())) begunOn.value = draft.value.startAt.slice(0, 10)
  }

  /** Lets an old draft begin now: with a weight to be typed anew, or with the old one and the day it is from. */
  function startNow(weight: 'new' | 'old') {
    if (weight === 'new') {
      draft.value.weight.text = ''
      draft.value.weighedOn = ''
    }
    else if (draft.value.weighedOn === '') draft.value.weighedOn = begunOn.value
    draft.value.startAt = localOf(new Date())
    begunOn.value = ''
  }

  function issueAt(path: string): string | undefined {
    return issues.value.find(one => one.path === path)?.message
  }

  /** Whatever is still on its way answers an older question from here on, even when nothing new is asked. */
  function overtake(): number {
    aborter?.abort()
    working.value = false
    return ++sequence
  }

  /** Another weight of a saved plan was weighed today, unless its day is given too: an old day under a new weight would be untrue. */
  function dateNewWeight() {
    const { weight, weighedOn } = draft.value
    if (!weighedBefore || weight.text === weighedBefore.weight || weight.text.trim() === '') return
    if (weighedOn === weighedBefore.on) draft.value.weighedOn = localOf(new Date()).slice(0, 10)
    weighedBefore = null
  }

  /** Works the plan out again. An answer that a newer question has overtaken is dropped. */
  async function preview() {
    dateNewWeight()
    const { input, issues: found } = inputOfDraft(draft.value)
    localIssues.value = found
    const mine = overtake()
    if (needed.value.length > 0 || found.length > 0) {
      problem.value = null
      if (needed.value.length > 0) plan.value = null
      return
    }
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
        await $fetch(`/api/regimens/${id}`, { method: 'PATCH', query: key ? { key } : {}, body: { ...input, baseVersion: version, ...(note.value.trim() && { note: note.value.trim() }) } })
        return leaveWith(`/plans/${id}${key ? `?key=${encodeURIComponent(key)}` : ''}`)
      }
      const { id, key } = await $fetch<SavedRegimenReceipt>('/api/regimens', { method: 'POST', body: input })
      // A plan of a team has no key: being a member opens it.
      return leaveWith(`/plans/${id}${key ? `?key=${encodeURIComponent(key)}` : ''}`)
    }
    catch (error) {
      problem.value = apiProblemOf(error)
      return null
    }
    finally { saving.value = false }
  }

  /** Somebody saved meanwhile, and the person has read what: theirs becomes the version after it. */
  async function saveOnTop(): Promise<string | null> {
    if (!editing.value) return null
    const { id, key } = editing.value
    try {
      const { latestVersion } = await $fetch<SavedRegimen>(`/api/regimens/${id}`, { query: key ? { key } : {} })
      editing.value = { ...editing.value, version: latestVersion }
    }
    catch (error) {
      problem.value = apiProblemOf(error)
      return null
    }
    return save()
  }

  /**
   * Empties the form once its plan is kept: typing the next animal over it must neither double this plan nor replace it
   * under a sheet that hangs on an enclosure.
   */
  function leaveWith(to: string): string {
    justSaved.value = { name: draft.value.name.trim() || plan.value?.animal?.speciesName || 'The plan', to }
    clear()
    undone.value = null
    return to
  }

  function clear() {
    overtake()
    weighedBefore = null
    draft.value = nextDraft(draft.value)
    editing.value = null
    plan.value = null
    problem.value = null
    localIssues.value = []
    begunOn.value = ''
    note.value = ''
    fillFromBrowser()
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
    undone.value = { draft: draft.value, editing: editing.value }
    clear()
  }

  /** Empties everything, for the next person at a shared computer. */
  function forget() {
    clear()
    draft.value = emptyDraft()
    undone.value = null
    justSaved.value = null
  }

  function undo() {
    if (!undone.value) return
    draft.value = undone.value.draft
    editing.value = undone.value.editing
    undone.value = null
  }

  function change(saved: SavedRegimen & { team?: unknown }, key: string | null) {
    overtake()
    draft.value = draftOfInput(saved.input)
    weighedBefore = { weight: draft.value.weight.text, on: draft.value.weighedOn }
    editing.value = { id: saved.id, version: saved.latestVersion, key, ...(saved.team ? { team: true } : {}) }
    plan.value = saved.plan
    undone.value = null
    begunOn.value = ''
    filledFrom.value = ''
    note.value = ''
  }

  return { draft, editing, plan, problem, working, saving, undone, justSaved, begunOn, filledFrom, note, needed, issues, behind, fillFromTeam, fillFromBrowser, startNow, issueAt, preview, save, saveOnTop, printPreview, startOver, forget, undo, change }
})
