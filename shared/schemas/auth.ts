/** The API contract of accounts: what a person may send about themselves. */
import { z } from 'zod'
import { Email, RowId, text, Token } from './fields'

export const SHORTEST_PASSWORD = 12

/** Any characters, long enough. Whether it is a common one only the server knows (`server/utils/access/commonPassword`). */
export const NewPassword = z.string({ error: 'Give a password.' })
  .min(SHORTEST_PASSWORD, `A password needs at least ${SHORTEST_PASSWORD} characters. Four words that do not belong together are easy to keep.`)
  .max(200, 'A password can have at most 200 characters.')

const GivenPassword = z.string({ error: 'Give your password.' }).min(1, 'Give your password.').max(200, 'A password can have at most 200 characters.')
const PersonName = text('your name', 80).min(1, 'Give your name, as others will read it.')
const Code = z.string({ error: 'Give the code.' }).trim().min(6, 'A code from the app has 6 digits, a recovery code has 10 letters and digits.').max(20, 'A code from the app has 6 digits, a recovery code has 10 letters and digits.')

export const SignUpInput = z.object({
  name: PersonName,
  email: Email,
  password: NewPassword,
  teamName: text('the name of the team', 60).min(1, 'Give the team a name. It stands on every sheet.'),
  timeZone: z.string().max(64).optional(),
})
export type SignUpInput = z.infer<typeof SignUpInput>

export const SignInInput = z.object({
  email: Email,
  password: GivenPassword,
  /** From the authenticator app, or a recovery code; only for accounts that use them. */
  code: Code.optional(),
})
export type SignInInput = z.infer<typeof SignInInput>

export const ForgotInput = z.object({ email: Email })
export const ResetInput = z.object({ token: Token, password: NewPassword })
export const ProfileInput = z.object({
  name: PersonName,
  registration: text('the registration', 80).default(''),
})
export const PasswordChange = z.object({ password: GivenPassword, newPassword: NewPassword })
export const EmailChange = z.object({ password: GivenPassword, newEmail: Email })
export const TokenInput = z.object({ token: Token })
export const CodesSetUp = z.object({ password: GivenPassword })
export const CodesConfirm = z.object({ code: Code })
export const CodesOff = z.object({ password: GivenPassword })
export const TeamSwitch = z.object({ teamId: RowId })
export const SessionParams = z.object({ id: RowId })
