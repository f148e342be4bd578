import { escapeMailHtml as escaped, mailLine, mailLines, mailLink } from './mailText'

export const MAIL_KINDS = ['invitation', 'passwordReset', 'emailChangeAsk', 'emailChangeTold', 'approvalAsked', 'approved', 'sentBack', 'approvalLapsed', 'newSignIn', 'checkAsked', 'approvalWaits', 'broughtUp'] as const
export type MailKind = (typeof MAIL_KINDS)[number]

export interface MailContent { kind: MailKind, subject: string, text: string, html: string }

/** What a mail says, in the order in which it says it. Everything may come from people: it is cleaned here. */
export interface MailModel {
  kind: MailKind
  subject: string
  /** What a mail program shows beside the subject. */
  preheader: string
  heading: string
  paragraphs: string[]
  facts?: [label: string, value: string][]
  list?: { title: string, items: string[] }
  /** Words of a person, as they wrote them. */
  quote?: { title: string, text: string }
  action: { label: string, link: string }
  after?: string[]
  care?: { title: string, text: string }
  /** Whose plans these are, for the last lines. */
  teamName?: string
}

/** The application's own colours. Each cell says both of its colours: a mail program that darkens a page then darkens the pair. */
const PAPER = '#f7f3ea'
const SHEET = '#fffdf8'
const INK = '#1d2b2a'
const INK_SOFT = '#4b5a57'
const RULE = '#d9d2c2'
const MOSS = '#24594a'
const FOOD_FILL = '#e2ad45'
const FOOD_TINT = '#fbefd3'
const FONT = 'font-family:\'Source Sans 3\',\'Source Sans Pro\',system-ui,-apple-system,\'Segoe UI\',Roboto,Helvetica,Arial,sans-serif'
const TABLE = 'role="presentation" cellpadding="0" cellspacing="0" border="0"'

/** Draws one mail twice: as text, and as the sheet that the application shows. */
export function drawMail(asked: MailModel): MailContent {
  const model = cleaned(asked)
  return { kind: model.kind, subject: model.subject, text: textOfMail(model), html: htmlOfMail(model) }
}

interface CleanMail extends Omit<MailModel, 'quote' | 'teamName'> { quote?: { title: string, lines: string[] }, footer: string[] }

function cleaned(asked: MailModel): CleanMail {
  const { action, care, list, quote } = asked
  const link = mailLink(action.link)
  const long = (text: string) => mailLine(text, 1000)
  const facts = (asked.facts ?? []).map(([label, value]): [string, string] => [mailLine(label), mailLine(value)]).filter(([, value]) => value)
  const items = (list?.items ?? []).map(item => mailLine(item)).filter(Boolean)
  const lines = mailLines(quote?.text ?? '')
  return {
    kind: asked.kind, subject: mailLine(asked.subject, 150), preheader: mailLine(asked.preheader), heading: mailLine(asked.heading, 150),
    paragraphs: asked.paragraphs.map(long),
    facts: facts.length > 0 ? facts : undefined,
    list: list && items.length > 0 ? { title: mailLine(list.title), items } : undefined,
    quote: quote && lines.length > 0 ? { title: mailLine(quote.title), lines } : undefined,
    action: { label: mailLine(action.label), link },
    after: asked.after?.map(long),
    care: care && { title: mailLine(care.title), text: long(care.text) },
    footer: [runsHere(new URL(link).host, mailLine(asked.teamName ?? '', 80)), 'Thimbleful supports a vet and does not replace one. When an animal is getting worse, call the vet; do not wait for a mail.'],
  }
}

function runsHere(host: string, teamName: string): string {
  const whom = teamName ? ` for ${teamName}` : ''
  return `Sent by Thimbleful at ${host}${whom}. The coordinator of ${teamName || 'your team'} looks after it: ask there if something in this mail looks wrong.`
}

function textOfMail(model: CleanMail): string {
  const { heading, paragraphs, facts, list, quote, action, after = [], care, footer } = model
  return [
    heading,
    ...paragraphs,
    ...facts ? [facts.map(([label, value]) => `${label}: ${value}`).join('\n')] : [],
    ...list ? [[`${list.title}:`, ...list.items.map(item => `- ${item}`)].join('\n')] : [],
    ...quote ? [[`${quote.title}:`, ...quote.lines.map(line => `    ${line}`)].join('\n')] : [],
    `${action.label}:\n${action.link}`,
    ...after,
    ...care ? [`${care.title}\n${care.text}`] : [],
    '----',
    ...footer,
  ].join('\n\n') + '\n'
}

function htmlOfMail(model: CleanMail): string {
  const { subject, preheader, heading, paragraphs, facts, list, quote, action, after = [], care, footer } = model
  const sheet = [
    `<h1 style="margin:0 0 14px;${FONT};font-size:25px;line-height:1.2;font-weight:700;color:${INK}">${escaped(heading)}</h1>`,
    ...paragraphs.map(paragraph),
    ...facts ? [factsTable(facts)] : [],
    ...list ? [label(list.title), `<ul style="margin:0 0 18px;padding:0 0 0 20px">${list.items.map(item => `<li style="margin:0 0 4px;${body()}">${escaped(item)}</li>`).join('')}</ul>`] : [],
    ...quote ? [noted(MOSS, SHEET, quote.title, quote.lines)] : [],
    button(action.label, action.link),
    ...after.map(paragraph),
    ...care ? [noted(FOOD_FILL, FOOD_TINT, care.title, [care.text])] : [],
    `<p style="margin:20px 0 0;padding:12px 0 0;border-top:1px solid ${RULE};${FONT};font-size:14px;line-height:1.45;color:${INK_SOFT}">Does the button not work? Copy this address into the browser:<br><a href="${escaped(action.link)}" style="color:${MOSS};word-break:break-all">${escaped(action.link)}</a></p>`,
  ].join('\n')
  return `<!DOCTYPE html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light">
<meta name="supported-color-schemes" content="light">
<meta name="format-detection" content="telephone=no, date=no, address=no, email=no">
<title>${escaped(subject)}</title>
</head>
<body bgcolor="${PAPER}" style="margin:0;padding:0;background-color:${PAPER};color:${INK};-webkit-text-size-adjust:100%">
<div style="display:none;max-height:0;overflow:hidden;mso-hide:all;font-size:1px;line-height:1px;color:${PAPER}">${escaped(preheader)}</div>
<table ${TABLE} width="100%" bgcolor="${PAPER}" style="background-color:${PAPER}"><tr><td align="center" style="padding:20px 12px 28px">
<table ${TABLE} width="100%" style="max-width:560px">
<tr><td align="left" style="padding:0 2px 10px;${FONT};font-size:19px;line-height:1.3;font-weight:700;color:${MOSS}">Thimbleful</td></tr>
<tr><td align="left" bgcolor="${SHEET}" style="background-color:${SHEET};color:${INK};border:1px solid ${RULE};border-top:6px solid ${INK};padding:22px 22px 24px;word-break:break-word">
${sheet}
</td></tr>
<tr><td align="left" bgcolor="${PAPER}" style="background-color:${PAPER};padding:16px 2px 0">
${footer.map(line => `<p style="margin:0 0 8px;${FONT};font-size:14px;line-height:1.45;color:${INK_SOFT}">${escaped(line)}</p>`).join('\n')}
</td></tr>
</table>
</td></tr></table>
</body>
</html>
`
}

function body(): string {
  return `${FONT};font-size:17px;line-height:1.45;color:${INK}`
}

function paragraph(text: string): string {
  return `<p style="margin:0 0 14px;${body()}">${escaped(text)}</p>`
}

function label(text: string): string {
  return `<p style="margin:0 0 4px;${FONT};font-size:15px;line-height:1.4;font-weight:600;color:${INK}">${escaped(text)}</p>`
}

function factsTable(facts: [string, string][]): string {
  const rows = facts.map(([name, value]) => `<tr><th scope="row" align="left" valign="baseline" width="34%" style="padding:8px 10px 8px 0;border-bottom:1px solid ${RULE};${FONT};font-size:15px;line-height:1.45;font-weight:400;color:${INK_SOFT}">${escaped(name)}</th><td align="left" valign="baseline" style="padding:8px 0;border-bottom:1px solid ${RULE};${FONT};font-size:17px;line-height:1.3;font-weight:600;color:${INK};font-variant-numeric:lining-nums tabular-nums">${escaped(value)}</td></tr>`)
  return `<table cellpadding="0" cellspacing="0" border="0" width="100%" style="margin:0 0 18px;border-collapse:collapse;border-top:1px solid ${RULE}">${rows.join('')}</table>`
}

function button(text: string, link: string): string {
  return `<table ${TABLE} style="margin:6px 0 20px"><tr><td bgcolor="${MOSS}" style="background-color:${MOSS};border-radius:3px"><a href="${escaped(link)}" style="display:inline-block;padding:13px 22px;border:1px solid ${MOSS};border-radius:3px;background-color:${MOSS};${FONT};font-size:17px;line-height:1.3;font-weight:600;color:${SHEET};text-decoration:none">${escaped(text)}</a></td></tr></table>`
}

/** A card with a rule on its left: words of a person, or what to take care of. */
function noted(rule: string, ground: string, title: string, lines: string[]): string {
  return `<table ${TABLE} width="100%" style="margin:0 0 18px"><tr><td bgcolor="${ground}" style="background-color:${ground};border-left:4px solid ${rule};padding:10px 14px">${label(title)}${lines.map((line, index) => `<p style="margin:${index === 0 ? 0 : 6}px 0 0;${body()}">${escaped(line)}</p>`).join('')}</td></tr></table>`
}
