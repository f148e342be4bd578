import { useForm, type GenericObject } from 'vee-validate'
import type { z } from 'zod'
import { apiProblemOf, type ApiProblem } from '~/utils/apiError'
import { formSchema } from '~/utils/formSchema'

/**
 * A form that checks with the schema of the API and shows what the server says beside the field it is about.
 * Nothing typed is lost when sending fails. Fields complain only once the person has tried to send.
 *
 * @example
 * const { field, issueAt, problem, sending, submit } = useSchemaForm(SignInInput, { email: '', password: '' }, values => session.signIn(values))
 * const email = field('email')   // v-model="email" :error="issueAt('email')"
 */
export function useSchemaForm<Schema extends z.ZodType<unknown, GenericObject>>(schema: Schema, initial: z.input<Schema>, send: (values: z.output<Schema>) => Promise<unknown>) {
  const form = useForm({ validationSchema: formSchema(schema), initialValues: initial as never })
  const problem = ref<ApiProblem | null>(null)
  const done = ref(false)

  function field<Value = string>(path: string): Ref<Value> {
    const [model] = form.defineField(path as never, state => ({ validateOnModelUpdate: state.errors.length > 0, validateOnBlur: false, validateOnChange: false, validateOnInput: false }))
    return model as unknown as Ref<Value>
  }
  function issueAt(path: string): string | undefined {
    return (form.errors.value as Record<string, string | undefined>)[path]
  }
  const submit = form.handleSubmit(async (values) => {
    done.value = false
    try {
      await send(values as z.output<Schema>)
      problem.value = null
      done.value = true
    }
    catch (error) {
      problem.value = apiProblemOf(error)
      for (const issue of problem.value.issues ?? []) form.setFieldError(issue.path as never, issue.message)
    }
  })

  return { values: form.values as z.input<Schema>, field, issueAt, problem, done, sending: form.isSubmitting, submit, reset: form.resetForm, setValues: form.setValues }
}
