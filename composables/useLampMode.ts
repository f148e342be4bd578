/** Lamp mode for rooms under red light. A cookie remembers it, so the first page already comes dark. */
export function useLampMode() {
  return useCookie<boolean>('lamp', { default: () => false, maxAge: 60 * 60 * 24 * 365, sameSite: 'lax' })
}
