import type { H3Event } from 'h3'
import type { HelperLinkRecord, RegimenRow } from '#shared/types/rows'
import { database, findOpenHelperLink, regimensOfLink, type Actor } from '../data'
import { fail } from '../http/fail'
import { readCookie } from './sealedCookie'

/** A helper without an account, let in by a link that is open now. */
export interface Visit { link: HelperLinkRecord, initials: string, regimens: RegimenRow[], actor: Actor }

/** The visit of this browser; null when it has none or its link ended. */
export async function visitOf(event: H3Event): Promise<Visit | null> {
  const { help } = await readCookie(event)
  const link = help && findOpenHelperLink(database(), { id: help.link }, new Date().toISOString())
  if (!link) return null
  return { link, initials: help.initials, regimens: regimensOfLink(database(), link), actor: { id: `helper:${link.id}`, name: `${help.initials} (helper: ${link.purpose})` } }
}

/** @throws 401 `help.closed`. */
export async function requireVisit(event: H3Event): Promise<Visit> {
  const visit = await visitOf(event)
  if (!visit) throw fail({ status: 401, code: 'help.closed', message: 'This link is closed: its time is over, or it was taken back. Ask who sent it for a new one.' })
  return visit
}
