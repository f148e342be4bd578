import type { EquationValue } from '#shared/types/reference'
import { EquationParams, EquationQuery } from '#shared/schemas/reference'
import { CalcInputError } from '#server/utils/calc/calcInputError'
import { fail } from '#server/utils/http/fail'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { currentEdition } from '#server/utils/reference'
import { equationAnswer, queryNameOf } from '#server/utils/reference/equationAnswer'

defineRouteMeta({ openAPI: { tags: ['Reference'], summary: 'One equation worked out, with its working', parameters: [{ in: 'path', name: 'id', required: true, schema: { type: 'string' } }, { in: 'query', name: 'massG', description: 'Weight, g', schema: { type: 'number' } }, { in: 'query', name: 'temperatureC', description: 'Body temperature, deg C', schema: { type: 'number' } }, { in: 'query', name: 'state', description: '0 standard, 1 resting', schema: { type: 'number' } }, { in: 'query', name: 'lengthMm', description: 'Length, mm', schema: { type: 'number' } }, { in: 'query', name: 'referenceLengthMm', description: 'Reference length, mm', schema: { type: 'number' } }, { in: 'query', name: 'exponent', description: 'Exponent of weight on length', schema: { type: 'number' } }], responses: { 200: { description: 'EquationValue' }, 400: { description: 'A value is missing or not as expected: data.issues' }, 404: { description: 'No such equation' } } } })

export default defineEventHandler(async (event): Promise<EquationValue> => {
  await limitRequests(event, 'read', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, EquationParams)
  const equation = currentEdition().equations.get(id)
  if (!equation) throw fail({ status: 404, code: 'equation.notFound', message: 'There is no equation of this name in the current reference data.' })
  const query = readQueryOf(event, EquationQuery)
  try {
    return equationAnswer(equation, query)
  }
  catch (error) {
    if (!(error instanceof CalcInputError)) throw error
    throw fail({ status: 400, code: error.code, message: error.message, issues: [{ path: queryNameOf(error.path ?? ''), message: error.message }] })
  }
})
