import { formatQuantity } from '#shared/utils/quantity'
import { drawMail, type MailContent } from './layout'

/**
 * The mails of this application. Pure: facts in, subject, text and HTML out. Dates, weights and roles come in as the
 * finished text that a screen would show.
 */

/** For whom a mail is sent, named in its last lines. */
export interface MailTeam { teamName?: string }

const UNAPPROVED = 'Until it is approved, every sheet of it says NOT APPROVED BY A VET.'
const planTitle = (animal: string, version: number) => `${animal}, version ${version}`

// ── Accounts ──────────────────────────────────────────────────────────────────────────────────────────────────────

export interface InvitationFacts { teamName: string, roleLabel: string, invitedBy: string, link: string, /** In words. */ expiresAt: string }
export function invitationMail({ teamName, roleLabel, invitedBy, link, expiresAt }: InvitationFacts): MailContent {
  return drawMail({
    kind: 'invitation', teamName,
    subject: `${invitedBy} invites you to ${teamName}`,
    preheader: `Accept by ${expiresAt}.`,
    heading: `Join ${teamName}`,
    paragraphs: [`${invitedBy} invites you to the team ${teamName} on Thimbleful, where its feeding plans are made, checked and logged.`],
    facts: [['Team', teamName], ['Your role', roleLabel], ['Invited by', invitedBy], ['Link works until', expiresAt]],
    action: { label: 'Accept the invitation', link },
    after: ['With an account you sign in and are in the team. Without one you choose a name and a password first.'],
    care: { title: 'Did you not expect this?', text: 'Then do nothing. Nobody joins in your name without this link.' },
  })
}

export interface PasswordResetFacts { name: string, link: string }
export function passwordResetMail({ name, link }: PasswordResetFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'passwordReset', ...team,
    subject: 'Choose a new password for Thimbleful',
    preheader: 'The link works for one hour.',
    heading: 'Choose a new password',
    paragraphs: [`Hello ${name}, someone asked for a new password for your account.`, 'The link works for one hour and opens only 1 time.'],
    action: { label: 'Choose a new password', link },
    after: ['Is the hour over? Ask for a new link on the page where you sign in.'],
    care: { title: 'Was it not you?', text: 'Then ignore this mail. Nothing has changed and your password still works.' },
  })
}

export interface EmailChangeAskFacts { name: string, link: string, /** In words. */ expiresAt?: string }
/** To the new address. */
export function emailChangeAskMail({ name, link, expiresAt }: EmailChangeAskFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'emailChangeAsk', ...team,
    subject: 'Confirm your new address for Thimbleful',
    preheader: 'Your old address counts until you confirm this one.',
    heading: 'Confirm this address',
    paragraphs: [`Hello ${name}, you asked to sign in with this address from now on. Confirm it, and mails come here too.`, `Until then your old address counts. The link opens only 1 time${expiresAt ? ` and works until ${expiresAt}` : ''}.`],
    action: { label: 'Confirm this address', link },
    care: { title: 'Was it not you?', text: 'Then ignore this mail. Nothing changes.' },
  })
}

export interface EmailChangeToldFacts { name: string, newEmail: string, /** False while the new address is not confirmed yet. */ changed: boolean, /** To the profile. */ link: string }
/** To the old address. */
export function emailChangeToldMail({ name, newEmail, changed, link }: EmailChangeToldFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'emailChangeTold', ...team,
    subject: changed ? 'Your address for Thimbleful has changed' : 'Your address for Thimbleful is about to change',
    preheader: 'Was it you? Then there is nothing to do.',
    heading: changed ? 'Your address has changed' : 'Your address is about to change',
    paragraphs: [
      changed ? `Hello ${name}, your account now has another address. You sign in with it, and mails go there.` : `Hello ${name}, someone who is signed in as you asked for another address. It counts once it is confirmed from a mail sent there.`,
      'Was it you? Then there is nothing to do here.',
    ],
    facts: [['New address', newEmail]],
    action: { label: 'Open your profile', link },
    care: {
      title: 'Was it not you?',
      text: changed
        ? 'Tell the coordinator of your team now, by telephone or in person: your account can be taken out of the team at once. Use another password wherever you used the same one.'
        : 'Open your profile now, choose a new password and end every sign-in you do not know. Then tell the coordinator of your team.',
    },
  })
}

export interface NewSignInFacts { name: string, when: string, device: string, address: string, /** To the profile. */ link: string }
export function newSignInMail({ name, when, device, address, link }: NewSignInFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'newSignIn', ...team,
    subject: 'New sign-in to your Thimbleful account',
    preheader: `${when}, ${device}.`,
    heading: 'New sign-in to your account',
    paragraphs: [`Hello ${name}, your account was opened from a device it was not opened from before.`, 'Was it you? Then there is nothing to do.'],
    facts: [['When', when], ['Device', device], ['Network address', address]],
    action: { label: 'Open your profile', link },
    care: { title: 'Was it not you?', text: 'Open your profile, end this sign-in and choose a new password. Then tell the coordinator of your team.' },
  })
}

// ── Plans ─────────────────────────────────────────────────────────────────────────────────────────────────────────

export interface CheckAskedFacts { animal: string, version: number, askedBy: string, link: string }
export function checkAskedMail({ animal, version, askedBy, link }: CheckAskedFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'checkAsked', ...team,
    subject: `${planTitle(animal, version)}: please check`,
    preheader: `${askedBy} asks for a check.`,
    heading: `Please check the plan for ${animal}`,
    paragraphs: [`${askedBy} asks for a second pair of eyes on this version.`],
    facts: [['Animal', animal], ['Version', String(version)], ['Asked by', askedBy]],
    action: { label: 'Check the plan', link },
    after: ['Look at species, weight, feed and amounts yourself. Is something wrong? Send the version back and say what.'],
  })
}

export interface ApprovalAskedFacts { animal: string, caseNumber: string, species: string, version: number, askedBy: string, /** To `/plans/ID/approve`. */ link: string, /** With the date weighed. */ weight: string, /** Line by line, empty for a first version. */ changed: string[] }
export function approvalAskedMail({ animal, caseNumber, species, version, askedBy, link, weight, changed }: ApprovalAskedFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'approvalAsked', ...team,
    subject: `${planTitle(animal, version)}: approval asked`,
    preheader: [species, weight, `asked by ${askedBy}`].filter(Boolean).join(', '),
    heading: `${animal} waits for your approval`,
    paragraphs: [`${askedBy} asks you to look at this feeding plan and to approve it or send it back.`],
    facts: [['Animal', animal], ['Case', caseNumber], ['Species', species], ['Weight', weight], ['Version', String(version)], ['Asked by', askedBy]],
    list: { title: 'What changed', items: changed },
    action: { label: 'Look at the plan and decide', link },
    after: [UNAPPROVED],
  })
}

export interface ApprovalWaitsFacts { animal: string, hours: number, link: string }
export function approvalWaitsMail({ animal, hours, link }: ApprovalWaitsFacts, team: MailTeam = {}): MailContent {
  const time = formatQuantity(hours, hours === 1 ? 'hour' : 'hours', 0)
  return drawMail({
    kind: 'approvalWaits', ...team,
    subject: `${animal}: approval has been waiting for ${time}`,
    preheader: 'Approve it, or send it back and say what is missing.',
    heading: `${animal} still waits for approval`,
    paragraphs: [`The plan for ${animal} has been waiting for a vet for ${time}.`],
    action: { label: 'Look at the plan and decide', link },
    after: ['Is something missing? Send it back and say what, so that the keeper can go on.', UNAPPROVED],
  })
}

export interface ApprovedFacts { animal: string, version: number, vet: string, note: string, /** In words. */ until: string, link: string }
export function approvedMail({ animal, version, vet, note, until, link }: ApprovedFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'approved', ...team,
    subject: `${planTitle(animal, version)}: approved`,
    preheader: `Approved by ${vet}, until ${until}.`,
    heading: `The plan for ${animal} is approved`,
    paragraphs: [`${vet} approved this version.`],
    facts: [['Animal', animal], ['Version', String(version)], ['Approved by', vet], ['Approved until', until]],
    quote: { title: `Note from ${vet}`, text: note },
    action: { label: 'Open the plan', link },
    after: ['Print the new sheet and take the old one off the enclosure.'],
  })
}

export interface SentBackFacts { animal: string, version: number, by: string, reason: string, link: string }
export function sentBackMail({ animal, version, by, reason, link }: SentBackFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'sentBack', ...team,
    subject: `${planTitle(animal, version)}: sent back`,
    preheader: `From ${by}: ${reason}`,
    heading: `The plan for ${animal} came back`,
    paragraphs: [`${by} sent version ${version} back. It is not approved.`],
    quote: { title: `Reason, from ${by}`, text: reason },
    action: { label: 'Open the plan', link },
    after: ['Change what is asked for, save a new version and ask again.', UNAPPROVED],
  })
}

export interface ApprovalLapsedFacts { animal: string, version: number, reason: string, link: string }
export function approvalLapsedMail({ animal, version, reason, link }: ApprovalLapsedFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'approvalLapsed', ...team,
    subject: `${planTitle(animal, version)}: the approval has ended`,
    preheader: reason,
    heading: `The approval for ${animal} has ended`,
    paragraphs: [`Version ${version} is no longer approved.`],
    quote: { title: 'Why', text: reason },
    action: { label: 'Open the plan', link },
    after: ['Look at the animal and the plan, save a new version if something changed, and ask for approval again.', 'A sheet printed before still says that it is approved: take it off the enclosure.'],
  })
}

export interface BroughtUpFacts { animal: string, when: string, initials: string, link: string }
export function broughtUpMail({ animal, when, initials, link }: BroughtUpFacts, team: MailTeam = {}): MailContent {
  return drawMail({
    kind: 'broughtUp', ...team,
    subject: `${animal}: a feed was brought up`,
    preheader: `${when}, logged by ${initials}.`,
    heading: `${animal} brought up a feed`,
    paragraphs: ['Look at the log and at the animal before the next feed, and decide how the plan goes on.'],
    facts: [['Animal', animal], ['When', when], ['Logged by', initials]],
    action: { label: 'Open the log', link },
    care: { title: 'Not sure?', text: 'Do not feed. Leave a note. Call the vet.' },
  })
}
