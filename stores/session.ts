import type { z } from 'zod'
import type { SignInInput, SignUpInput } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { can, type Ability } from '#shared/utils/abilities'

/** Who is signed in, in which team, and what that role may do. What it may do is decided again by each route. */
export const useSessionStore = defineStore('session', () => {
  const me = ref<Me | null>(null)
  const known = ref(false)

  function take(answer: Me | { user: null }): Me | null {
    me.value = answer.user ? answer as Me : null
    known.value = true
    return me.value
  }
  /** Asked once for each page that is loaded, on the server where the page is made there. */
  async function load() {
    try {
      take(await useRequestFetch()<Me | { user: null }>('/api/auth/me'))
    }
    catch {
      // Without an answer nobody counts as signed in; the routes decide in any case.
      known.value = true
    }
  }
  async function signIn(input: z.input<typeof SignInInput>) {
    return take(await $fetch<Me>('/api/auth/sign-in', { method: 'POST', body: input }))
  }
  async function signUp(input: z.input<typeof SignUpInput>) {
    return take(await $fetch<Me>('/api/auth/sign-up', { method: 'POST', body: input }))
  }
  async function signOut() {
    await $fetch('/api/auth/sign-out', { method: 'POST', body: {} })
    me.value = null
  }
  async function switchTeam(teamId: string) {
    return take(await $fetch<Me>('/api/auth/team', { method: 'POST', body: { teamId } }))
  }

  const user = computed(() => me.value?.user ?? null)
  const team = computed(() => me.value?.team ?? null)
  const may = (ability: Ability) => can(team.value?.role, ability)

  return { me, known, user, team, may, take, load, signIn, signUp, signOut, switchTeam }
})
