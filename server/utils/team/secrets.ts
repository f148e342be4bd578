/** The secret that seals cookies, sheet codes and one-time codes: from the environment, or made at the first start. */
export function serverSecret(): string {
  const secret = process.env.NUXT_SESSION_PASSWORD
  if (!secret) throw new Error('The server has no secret. server/plugins/00.secret.ts makes one at the start.')
  return secret
}
