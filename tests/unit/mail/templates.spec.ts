import { describe, expect, it } from 'vitest'
import { MAIL_KINDS, type MailContent } from '../../../server/utils/mail/layout'
import * as templates from '../../../server/utils/mail/templates'

const LINK = 'https://plans.saltings.example/plans/JUN26-041/approve?a=1&b=2'
const TEAM = { teamName: 'Saltings Rescue' }

/** Every template, with every word that comes from outside as `say`. */
function all(say: (text: string) => string = text => text): MailContent[] {
  const link = LINK
  const animal = say('Juniper')
  const name = say('Ines')
  const team = { teamName: say(TEAM.teamName) }
  return [
    templates.invitationMail({ teamName: team.teamName, roleLabel: say('Keeper'), invitedBy: say('Dr Osei'), link, expiresAt: say('Wed 9 Dec, 14:00') }),
    templates.passwordResetMail({ name, link }, team),
    templates.emailChangeAskMail({ name, link, expiresAt: say('Thu 3 Dec, 14:00') }, team),
    templates.emailChangeToldMail({ name, newEmail: say('new@keepers.example'), changed: false, link }, team),
    templates.emailChangeToldMail({ name, newEmail: say('new@keepers.example'), changed: true, link }, team),
    templates.newSignInMail({ name, when: say('Wed 9 Dec, 14:05'), device: say('Firefox on Android'), address: say('203.0.113.7'), link }, team),
    templates.checkAskedMail({ animal, version: 3, askedBy: name, link }, team),
    templates.approvalAskedMail({ animal, caseNumber: say('26-041'), species: say('Inland bearded dragon'), version: 3, askedBy: name, link, weight: say('193\u00A0g, weighed Wed 9 Dec'), changed: [say('Weight: 187\u00A0g to 193\u00A0g'), say('Feeds a day: 4 to 3')] }, team),
    templates.approvalWaitsMail({ animal, hours: 4, link }, team),
    templates.approvedMail({ animal, version: 3, vet: say('Dr Osei'), note: say('Hold on Friday.\nThen go on.'), until: say('Wed 16 Dec'), link }, team),
    templates.sentBackMail({ animal, version: 3, by: say('Dr Osei'), reason: say('Too steep.'), link }, team),
    templates.approvalLapsedMail({ animal, version: 3, reason: say('Weighed 12 % less than expected.'), link }, team),
    templates.broughtUpMail({ animal, when: say('Wed 9 Dec, 14:05'), initials: say('MO'), link }, team),
  ]
}

/** What a person reads of the HTML. */
function readable(html: string): string {
  return html.replace(/<head>[\s\S]*<\/head>/, '').replace(/<[^>]+>/g, ' ').replace(/&lt;/g, '<').replace(/&gt;/g, '>').replace(/&quot;/g, '"').replace(/&#39;/g, '\'').replace(/&amp;/g, '&').replace(/[ \n]+/g, ' ')
}
const linksOf = (html: string) => [...html.matchAll(/(?:href|src|background|action)="([^"]*)"/g)].map(match => match[1]!.replace(/&amp;/g, '&'))

it('there is one for each kind', () => {
  expect([...new Set(all().map(mail => mail.kind))].sort()).toEqual([...MAIL_KINDS].sort())
})

describe.each(all().map(mail => [mail.subject, mail] as const))('%s', (_, mail) => {
  it('says the same in text and in HTML', () => {
    const html = readable(mail.html)
    const lines = mail.text.split('\n').map(line => line.replace(/^- |^ {4}|:$/g, '').trim()).filter(line => line && line !== '----')
    expect(lines.length).toBeGreaterThan(5)
    // Facts are "name: value" in text and two cells in HTML.
    expect(lines.filter(line => !html.includes(line) && !line.split(': ').every(part => html.includes(part)))).toEqual([])
  })
  it('has one link, the same in both', () => {
    expect(new Set(linksOf(mail.html))).toEqual(new Set([LINK]))
    expect(mail.text.match(/https?:\/\/\S+/g)).toEqual([LINK])
  })
  it('loads nothing: no image, style sheet, font or script', () => {
    expect(mail.html).not.toMatch(/<(img|style|link|script|iframe|object|svg|form|base)\b|url\(|@import|\son\w+=|cid:|data:/i)
    expect(readable(mail.html).replaceAll(LINK, '')).not.toMatch(/https?:/)
  })
  it('speaks plainly', () => {
    for (const text of [mail.subject, mail.text, readable(mail.html)]) {
      expect(text).not.toMatch(/!|\bcc\b|µg|\bIU\b|\b[BTQ]ID\b|regurgitat|undefined|null|NaN|\[object| {2,}(?=\S.*@)/i)
    }
    expect(mail.subject.length).toBeLessThan(70)
    expect(mail.text).toMatch(/\n$/)
  })
  it('ends with who runs this, and that a vet stays the vet', () => {
    const end = mail.text.trimEnd().split('\n\n').slice(-2)
    expect(end[0]).toContain('Sent by Thimbleful at plans.saltings.example for Saltings Rescue. The coordinator of Saltings Rescue')
    expect(end[1]).toMatch(/^Thimbleful supports a vet and does not replace one\./)
  })
  it('says both colours wherever it says one, for mail programs that darken', () => {
    expect(mail.html).toContain('<meta name="color-scheme" content="light">')
    for (const style of [...mail.html.matchAll(/<(?:p|h1|th|a|li|body)[^>]*style="([^"]*)"/g)].map(match => match[1]!)) expect(style).toMatch(/(?:^|;)color:#/)
    for (const [tag] of mail.html.matchAll(/<[^>]*background-color:(#\w+)[^>]*>/g)) if (!tag.startsWith('<a')) expect(tag).toContain(`bgcolor="${/background-color:(#\w+)/.exec(tag)![1]}"`)
  })
})

describe('words from outside', () => {
  const NASTY = '<img src=x onerror="alert(1)">\'"&\r\nBcc: all@elsewhere.example\u2028\u202Ehttps://elsewhere.example/\u0000'
  it.each(all(text => `${text}${NASTY}`).map(mail => [mail.kind, mail] as const))('stay words in %s', (_, mail) => {
    expect(mail.subject).not.toMatch(/[\p{Cc}\u2028\u202E]/u)
    expect(mail.html).not.toMatch(/<img|[\u2028\u202E]/)
    expect(mail.html).not.toContain(String.fromCharCode(0))
    expect(new Set(linksOf(mail.html))).toEqual(new Set([LINK]))
    expect(mail.text.match(/https?:\/\/\S+/g)).toEqual([LINK])
    // A line of its own only where somebody writes several lines, and then indented.
    expect(mail.text).not.toMatch(/^Bcc:/m)
    expect(mail.html).toContain('&lt;img src=x onerror=&quot;alert(1)&quot;&gt;&#39;&quot;&amp;')
  })
  it('of any length leave a subject that can be read', () => {
    const [mail] = all(text => text.padEnd(4000, 'Ž🦎'))
    expect([...mail!.subject].length).toBeLessThanOrEqual(150)
    expect(mail!.subject).toMatch(/…$/)
    expect(mail!.subject.isWellFormed()).toBe(true)
  })
  it('that are empty leave their place out', () => {
    const mail = templates.approvalAskedMail({ animal: 'Juniper', caseNumber: ' ', species: 'Inland bearded dragon', version: 1, askedBy: 'Ines', link: LINK, weight: '', changed: [] })
    expect(mail.text).not.toMatch(/Case|Weight|What changed/)
    expect(mail.html).not.toMatch(/Case|Weight|What changed/)
    expect(templates.approvedMail({ animal: 'Juniper', version: 1, vet: 'Dr Osei', note: '\n', until: 'Wed 16 Dec', link: LINK }).text).not.toContain('Note from')
    expect(mail.text).toContain('Sent by Thimbleful at plans.saltings.example. The coordinator of your team looks after it')
  })
  it('keep the line ends of a note', () => {
    const mail = templates.approvedMail({ animal: 'Juniper', version: 1, vet: 'Dr Osei', note: 'Hold on Friday.\r\n\r\nThen go on.', until: 'Wed 16 Dec', link: LINK })
    expect(mail.text).toContain('Note from Dr Osei:\n    Hold on Friday.\n    Then go on.\n')
    expect(mail.html).toMatch(/Hold on Friday\.<\/p><p[^>]*>Then go on\./)
  })
})

it('writes hours as hours', () => {
  const subject = (hours: number) => templates.approvalWaitsMail({ animal: 'Juniper', hours, link: LINK }).subject
  expect(subject(1)).toBe('Juniper: approval has been waiting for 1\u00A0hour')
  expect(subject(26)).toBe('Juniper: approval has been waiting for 26\u00A0hours')
})

it.each(['/plans/JUN26-041', 'javascript:alert(1)', 'file:///etc/passwd', ''])('refuses %j as its link', (link) => {
  expect(() => templates.passwordResetMail({ name: 'Ines', link })).toThrow()
})
