/** The API contract of the reference data: what a request may ask of an equation. */
import { z } from 'zod'

/** A number out of an address. An empty text would become 0, so it is refused before it is read. */
const queryNumber = (what: string, unit: string, low: number, high: number) => {
  const sentence = `Give ${what} as a number${unit && ` in ${unit}`}, from ${low} to ${high.toLocaleString('en-GB')}.`
  return z.string({ error: sentence }).trim().regex(/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i, sentence)
    .transform(Number).pipe(z.number({ error: sentence }).min(low, sentence).max(high, sentence)).optional()
}

/** What may be known of an animal or a feed when one equation is worked out. Each equation needs only some of it. */
export const EquationQuery = z.strictObject({
  massG: queryNumber('the weight', 'g', 0.001, 10_000_000),
  temperatureC: queryNumber('the body temperature', 'deg C', -5, 60),
  /** 0 standard (fasted, in its inactive time), 1 resting (fasted, in its active time). */
  state: queryNumber('the state', '', 0, 1).refine(state => state === undefined || state === 0 || state === 1, 'The state is 0 (standard) or 1 (resting).'),
  lengthMm: queryNumber('the length', 'mm', 0.1, 100_000),
  referenceLengthMm: queryNumber('the reference length', 'mm', 0.1, 100_000),
  exponent: queryNumber('the exponent of weight on length', '', 0.1, 10),
  coefficient: queryNumber('the weight at 1 mm', 'g', 0, 1000),
  proteinPercent: queryNumber('protein', '%', 0, 100),
  fatPercent: queryNumber('fat', '%', 0, 100),
  carbohydratePercent: queryNumber('carbohydrate', '%', 0, 100),
})
export type EquationQuery = z.infer<typeof EquationQuery>

export const EquationParams = z.object({
  id: z.string().regex(/^[a-z0-9-]{1,80}$/, 'An equation is named in lower-case letters, digits and hyphens.'),
})
