import type { H3Event } from 'h3'
import { renderSVG } from 'uqr'
import type { Me } from '#shared/types/team'
import type { UserRecord } from '#shared/types/rows'
import { hashOfKey } from '../access/linkKey'
import { codeStep, newCodesSecret, newRecoveryCodes } from '../access/oneTimeCodes'
import { actorOf } from '../access/requireMember'
import { readCookie, writeCookie } from '../access/sealedCookie'
import { openSecret, sealSecret } from '../access/sealing'
import type { Who } from '../access/signedIn'
import { database, replaceRecoveryCodes, updateUser, useCodeStep, useRecoveryCode, writeAudit, WRITING } from '../data'
import { fail } from '../http/fail'
import { meOf } from './meOf'
import { serverSecret } from './secrets'

/** Whether a code of the app or a recovery code opens this account now. Each works once. */
export function checkCode(user: UserRecord, code: string): boolean {
  const written = code.replace(/\s/g, '').toLowerCase()
  const step = codeStep(openSecret(serverSecret(), user.codesSealed!), written, new Date())
  if (step !== null) return useCodeStep(database(), user.id, step)
  return useRecoveryCode(database(), user.id, hashOfKey(written), new Date().toISOString())
}

/** A secret for the app. It waits in the sealed cookie: the account changes only when a code has shown that the app has it. */
export async function beginCodes(event: H3Event, user: UserRecord): Promise<{ secret: string, uri: string, svg: string }> {
  const { secret, uri } = newCodesSecret(user.email)
  await writeCookie(event, { codes: secret })
  return { secret, uri, svg: renderSVG(uri) }
}

/** @returns the recovery codes, shown this once. @throws 422 `auth.codeWrong`, `auth.codesNotBegun`. */
export async function confirmCodes(event: H3Event, { user, team }: Who, code: string): Promise<string[]> {
  const { codes: secret } = await readCookie(event)
  if (!secret) throw fail({ status: 422, code: 'auth.codesNotBegun', message: 'Begin again: the square code on the screen is too old.' })
  const step = codeStep(secret, code.replace(/\s/g, ''), new Date())
  if (step === null) throw fail({ status: 422, code: 'auth.codeWrong', message: 'This code does not fit. Is the clock of the phone right? Wait for the next one and try again.', issues: [{ path: 'code', message: 'This code does not fit.' }] })
  const { codes, hashes } = newRecoveryCodes()
  const at = new Date().toISOString()
  database().transaction((tx) => {
    updateUser(tx, user.id, { codesSealed: sealSecret(serverSecret(), secret), codesLastStep: step })
    replaceRecoveryCodes(tx, user.id, hashes)
    writeAudit(tx, { at, actor: actorOf(user), teamId: team?.id ?? null, action: 'user.codesOn', objectType: 'user', objectId: user.id, objectName: user.name })
  }, WRITING)
  await writeCookie(event, { codes: undefined })
  return codes
}

export function endCodes(who: Who): Me {
  const { user, team } = who
  database().transaction((tx) => {
    updateUser(tx, user.id, { codesSealed: null, codesLastStep: null })
    replaceRecoveryCodes(tx, user.id, [])
    writeAudit(tx, { at: new Date().toISOString(), actor: actorOf(user), teamId: team?.id ?? null, action: 'user.codesOff', objectType: 'user', objectId: user.id, objectName: user.name })
  }, WRITING)
  return meOf({ ...who, user: { ...user, codesSealed: null } })
}
