import { describe, expect, it } from 'vitest'
import { ABILITIES, can, HELPER_ABILITIES, ROLES, type Ability, type Role } from '../../../shared/utils/abilities'

const of = (role: Role) => (Object.keys(ABILITIES) as Ability[]).filter(ability => can(role, ability))

describe('abilities', () => {
  it('of a carer are to see, print and log', () => expect(of('carer')).toEqual(['plan.see', 'plan.print', 'plan.log', 'team.see']))
  it('of approving are a vet\'s alone', () => expect(ROLES.filter(role => can(role, 'plan.approve'))).toEqual(['vet']))
  it('of a coordinator are all but approving', () => expect((Object.keys(ABILITIES) as Ability[]).filter(ability => !can('coordinator', ability))).toEqual(['plan.approve']))
  it('of people and settings are a coordinator\'s alone', () => {
    for (const ability of ['team.change', 'people.change', 'mail.see', 'plan.transfer'] as const) expect(ROLES.filter(role => can(role, ability))).toEqual(['coordinator'])
  })
  it('of a keeper end before checking', () => expect(can('keeper', 'plan.check')).toBe(false))
  it('of nobody are none', () => {
    for (const ability of Object.keys(ABILITIES) as Ability[]) for (const nobody of [null, undefined]) expect(can(nobody, ability)).toBe(false)
  })
  it('of a helper are those of a carer at most', () => {
    for (const ability of HELPER_ABILITIES) expect(can('carer', ability)).toBe(true)
  })
})
