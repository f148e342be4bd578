import type { TypedSchema } from 'vee-validate'
import type { z } from 'zod'

/** Lets the form package check with the very schema of the API. It knows no other way to be given one of zod 4. */
export function formSchema<Schema extends z.ZodType>(schema: Schema): TypedSchema<z.input<Schema>, z.output<Schema>> {
  return {
    __type: 'VVTypedSchema',
    async parse(values) {
      const result = await schema.safeParseAsync(values)
      if (result.success) return { value: result.data, errors: [] }
      const byPath = new Map<string, string[]>()
      for (const { path, message } of result.error.issues) {
        const written = path.map(String).join('.')
        byPath.set(written, [...byPath.get(written) ?? [], message])
      }
      return { errors: [...byPath].map(([path, errors]) => ({ path, errors })) }
    },
  }
}
