/** What people typed, made safe to stand in a mail: a name must not become a header, a link or markup. */

// Control characters and line ends; signs that turn the direction of reading or cannot be seen.
const UNSEEN = /[\p{Cc}\u2028\u2029\u00AD\u200B\u200E\u200F\u202A-\u202E\u2060-\u2069\uFEFF]+/gu
const LINE_END = /\r\n|[\n\r\v\f\u0085\u2028\u2029]/

/**
 * One line without control characters. Addresses of the web lose their "https://": the only link of a mail is its own.
 * @example mailLine('Juniper\r\nBcc: all@example.org') // 'Juniper Bcc: all@example.org'
 */
export function mailLine(text: string, most = 300): string {
  const clean = text.replace(UNSEEN, ' ').replace(/\b[a-z][a-z\d+.-]*:\/\//gi, '').replace(/ {2,}/g, ' ').trim()
  const signs = [...clean]
  return signs.length > most ? `${signs.slice(0, most - 1).join('').trimEnd()}…` : clean
}

/** Lines of a longer text, each made safe, none empty. */
export function mailLines(text: string): string[] {
  return text.split(LINE_END).map(line => mailLine(line, 2000)).filter(Boolean)
}

const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', '\'': '&#39;' }

export function escapeMailHtml(text: string): string {
  return text.replace(/[&<>"']/g, sign => ENTITIES[sign]!)
}

/** A whole web address and nothing else: it is what the button opens. */
export function mailLink(link: string): string {
  const url = new URL(link)
  if (url.protocol !== 'https:' && url.protocol !== 'http:') throw new TypeError('The link of a mail must begin with https or http.')
  return url.href
}
