import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto'

/**
 * Seals a small secret with the server's own, for keeping in the database: a copy of the database alone opens nothing.
 * AES-256-GCM; nonce, tag and text in one base64url string.
 */
export function sealSecret(serverSecret: string, text: string): string {
  const nonce = randomBytes(12)
  const cipher = createCipheriv('aes-256-gcm', keyOf(serverSecret), nonce)
  const sealed = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()])
  return Buffer.concat([nonce, cipher.getAuthTag(), sealed]).toString('base64url')
}

/** @throws when it was sealed with another secret, or changed. */
export function openSecret(serverSecret: string, sealed: string): string {
  const bytes = Buffer.from(sealed, 'base64url')
  const decipher = createDecipheriv('aes-256-gcm', keyOf(serverSecret), bytes.subarray(0, 12))
  decipher.setAuthTag(bytes.subarray(12, 28))
  return Buffer.concat([decipher.update(bytes.subarray(28)), decipher.final()]).toString('utf8')
}

function keyOf(serverSecret: string): Buffer {
  return Buffer.from(hkdfSync('sha256', serverSecret, '', 'thimbleful one-time codes', 32))
}
