/** Who may do what. One closed list of roles, one table of named abilities, read by the button and by the route. */

export const ROLES = ['coordinator', 'vet', 'technician', 'keeper', 'carer'] as const
export type Role = (typeof ROLES)[number]

export const ROLE_LABELS: Record<Role, { label: string, may: string }> = {
  coordinator: { label: 'Coordinator', may: 'People, settings, plans: everything but approving' },
  vet: { label: 'Vet', may: 'Approves plans and changes limits' },
  technician: { label: 'Technician', may: 'Plans, checks and edits' },
  keeper: { label: 'Keeper', may: 'Plans, takes animals in, logs' },
  carer: { label: 'Carer', may: 'Sees, prints and logs' },
}

const EVERYONE: readonly Role[] = ROLES
const PLANNERS: readonly Role[] = ['coordinator', 'vet', 'technician', 'keeper']
const COORDINATOR: readonly Role[] = ['coordinator']

/** `noun.verb`, each with the roles that have it. */
export const ABILITIES = {
  'plan.see': EVERYONE,
  'plan.print': EVERYONE,
  'plan.log': EVERYONE,
  'plan.edit': PLANNERS,
  'plan.use': PLANNERS,
  'plan.weigh': PLANNERS,
  'plan.check': ['coordinator', 'vet', 'technician'],
  'plan.approve': ['vet'],
  'plan.transfer': ['coordinator'],
  'link.make': PLANNERS,
  'team.see': EVERYONE,
  'team.change': COORDINATOR,
  'people.change': COORDINATOR,
  'mail.see': COORDINATOR,
  'record.see': ['coordinator', 'vet', 'technician', 'keeper'],
} as const satisfies Record<string, readonly Role[]>
export type Ability = keyof typeof ABILITIES

/** Whether a role has an ability. @example can('carer', 'plan.edit') // false */
export function can(role: Role | null | undefined, ability: Ability): boolean {
  return role !== null && role !== undefined && (ABILITIES[ability] as readonly Role[]).includes(role)
}

/** What a helper without an account may do with the animals of the link, and nothing else. */
export const HELPER_ABILITIES: readonly Ability[] = ['plan.see', 'plan.print', 'plan.log']
