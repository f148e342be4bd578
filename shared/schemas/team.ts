/** The API contract of teams: settings, people, links, lists. */
import { z } from 'zod'
import { ROLES } from '../utils/abilities'
import { INVITATION_STATES, LINK_STATES } from '../types/team'
import { PAPERS } from '../types/regimenLists'
import { ClockTime, Email, listQuery, number, RowId, text, TimeZone, Token } from './fields'
import { NewPassword } from './auth'
import { SyringeInput } from './regimen'

const Contact = z.object({
  role: text('the role of a contact', 60).min(1, 'Say who this is, for example: Vet, by day.'),
  name: text('the name of a contact', 60).default(''),
  phone: text('the phone number of a contact', 40).min(1, 'Give a phone number to call.'),
})

const ScaleInput = z.object({ name: text('the name of a scale', 40).min(1, 'Name the scale.'), stepG: number('the step of a scale', 'g', 0.001, 1000), mostG: number('the most a scale can carry', 'g', 1, 500_000) })
const TubeInput = z.object({ name: text('the name of a tube', 40).min(1, 'Name the tube.'), deadVolumeMl: number('the volume that stays in a tube', 'mL', 0, 50) })
/** Who is told when something stands too long. Minutes; 0 turns a rule off. */
const Escalation = z.object({
  approvalWaitsHours: number('the hours an approval may wait', 'h', 0, 168).default(12),
  approvalWaitsTell: z.enum(['coordinators', 'vets', 'both'], { error: 'Tell coordinators, vets or both.' }).default('both'),
  broughtUpTell: z.enum(['nobody', 'coordinators', 'vets', 'both'], { error: 'Tell nobody, coordinators, vets or both.' }).default('both'),
})

export const TeamSettings = z.object({
  address: text('the address', 200).default(''),
  timeZone: TimeZone.default('Europe/London'),
  paper: z.enum(PAPERS, { error: 'Paper is a4 or letter.' }).default('a4'),
  feedingHours: z.object({ from: ClockTime, to: ClockTime }).default({ from: '07:30', to: '20:30' }),
  /** Printed on every sheet. */
  contacts: z.array(Contact).max(3, 'List at most three contacts; the ladder is apart.').default([]),
  /** Who is rung out of hours, in this order; the first number is printed. */
  ladder: z.array(Contact).max(10, 'List at most ten people.').default([]),
  /** Whether a plan may be in use only with a vet's approval. */
  approvalRequired: z.boolean({ error: 'Say yes or no.' }).default(true),
  /** Whether the code on a sheet answers someone who is not signed in. */
  sheetCodes: z.boolean({ error: 'Say yes or no.' }).default(true),
  /** Whether vets and coordinators need one-time codes to sign in. */
  codesRequired: z.boolean({ error: 'Say yes or no.' }).default(false),
  syringes: z.array(SyringeInput).max(20, 'List at most 20 syringes.').default([]),
  scales: z.array(ScaleInput).max(20, 'List at most 20 scales.').default([]),
  tubes: z.array(TubeInput).max(20, 'List at most 20 tubes.').default([]),
  escalation: Escalation.default({ approvalWaitsHours: 12, approvalWaitsTell: 'both', broughtUpTell: 'both' }),
})
export type TeamSettings = z.infer<typeof TeamSettings>

export const TeamChange = z.object({ name: text('the name of the team', 60).min(1, 'Give the team a name. It stands on every sheet.'), settings: TeamSettings })
export type TeamChange = z.input<typeof TeamChange>

const role = z.enum(ROLES, { error: `Choose a role: ${ROLES.join(', ')}.` })
export const MemberChange = z.object({ role })
export const InvitationInput = z.object({ email: Email, role, days: number('how long the invitation is good for', 'days', 1, 30).default(7) })
export type InvitationInput = z.input<typeof InvitationInput>
export const InvitationToken = z.object({ token: Token })
/** A newcomer gives a name and a password; somebody with an account is signed in, or gives that account's password. */
export const InvitationAccept = z.object({ token: Token, name: text('your name', 80).min(1, 'Give your name, as others will read it.').optional(), password: NewPassword.optional() })

export const HelperLinkInput = z.object({
  regimenId: RowId.optional(),
  room: text('the room', 60).optional(),
  purpose: text('what the link is for', 80).min(1, 'Say what the link is for, for example: night shift, Thursday.'),
  hours: number('how long the link is good for', 'hours', 1, 24 * 60),
}).refine(link => Boolean(link.regimenId) !== Boolean(link.room), 'A link is for one animal or for one room.')
export type HelperLinkInput = z.infer<typeof HelperLinkInput>

export const HelperOpen = z.object({ token: Token, initials: text('your initials', 6).min(2, 'Give your initials: 2 to 6 letters.') })
export const SheetParams = z.object({ id: RowId })
/** The code from the paper; a member or a helper on a visit needs none, and sees the newest version without one. */
export const SheetCodeQuery = z.object({
  version: z.coerce.number({ error: 'The address of this sheet is incomplete. Scan its code again.' }).int().min(1).optional(),
  code: z.string({ error: 'The address of this sheet is incomplete. Scan its code again.' }).max(64).optional(),
})

export const TransferInput = z.object({ days: number('how long the link is good for', 'days', 1, 30).default(7), note: text('the note', 500).default('') })
export const TransferToken = z.object({ token: Token })

export const RowParams = z.object({ id: RowId })

export const MembersQuery = listQuery(['name', 'role', 'joinedAt'], 'name').extend({ role: role.optional() })
export const InvitationsQuery = listQuery(['createdAt', 'email', 'expiresAt'], '-createdAt').extend({ state: z.enum(INVITATION_STATES).optional() })
export const LinksQuery = listQuery(['createdAt', 'expiresAt', 'opened'], '-createdAt').extend({ state: z.enum(LINK_STATES).optional() })
export const MailsQuery = listQuery(['createdAt'], '-createdAt').extend({ state: z.enum(['waiting', 'sent', 'failed', 'kept']).optional() })
export const TransfersQuery = listQuery(['createdAt'], '-createdAt')
export const SessionsQuery = listQuery(['lastSeenAt'], '-lastSeenAt')
export const RecordQuery = listQuery(['at'], '-at').extend({
  /** Of one plan. */
  regimenId: RowId.optional(),
  /** Of one animal, by its case number. */
  caseNumber: text('the case number', 40).optional(),
  action: text('the action', 60).optional(),
})
export const MailParams = z.object({ id: z.coerce.number({ error: 'Mails are numbered.' }).int().min(1) })
export const DeskQuery = z.object({ page: MembersQuery.shape.page, pageSize: MembersQuery.shape.pageSize })
