import { randomBytes } from 'node:crypto'
import { Secret, TOTP } from 'otpauth'
import { hashOfKey } from './linkKey'

const STEP_S = 30
const totpOf = (secret: string, email = '') => new TOTP({ issuer: 'Thimbleful', label: email, algorithm: 'SHA1', digits: 6, period: STEP_S, secret: Secret.fromBase32(secret) })

/** A new secret for an authenticator app (RFC 6238: SHA-1, 6 digits, 30 seconds), and the address its square code holds. */
export function newCodesSecret(email: string): { secret: string, uri: string } {
  const secret = new Secret({ size: 20 }).base32
  return { secret, uri: totpOf(secret, email).toString() }
}

/**
 * The time step a code belongs to; null when it is none of now, the one before or the one after. Clocks differ a little.
 * Whoever calls it must see to it that a step counts once.
 */
export function codeStep(secret: string, code: string, now: Date): number | null {
  if (!/^\d{6}$/.test(code)) return null
  const delta = totpOf(secret).validate({ token: code, timestamp: now.getTime(), window: 1 })
  return delta === null ? null : Math.floor(now.getTime() / 1000 / STEP_S) + delta
}

const RECOVERY_CODES = 10

/** Codes for the day the phone is lost, each good once; only their hashes are stored. */
export function newRecoveryCodes(): { codes: string[], hashes: string[] } {
  const codes = Array.from({ length: RECOVERY_CODES }, () => randomBytes(8).toString('hex').slice(0, 10))
  return { codes, hashes: codes.map(hashOfKey) }
}
