import { defineNitroPlugin } from 'nitropack/runtime'
import { z } from 'zod'
import * as auth from '#shared/schemas/auth'
import * as planLife from '#shared/schemas/planLife'
import * as regimen from '#shared/schemas/regimen'
import * as team from '#shared/schemas/team'

interface Operation { requestBody?: { description?: string, content?: Record<string, unknown> } }
interface OpenApiDocument { components?: { schemas?: Record<string, unknown> }, paths?: Record<string, Record<string, Operation>> }

/**
 * Puts the shape of what may be sent into the generated OpenAPI document, from the schemas that check it: described by
 * hand it would drift from them. A route names its schema first in the description of its body.
 */
export default defineNitroPlugin((nitroApp) => {
  const known = Object.fromEntries(Object.entries({ ...auth, ...planLife, ...regimen, ...team }).flatMap(([name, schema]) => schema instanceof z.ZodType ? [[name, jsonSchemaOf(schema)]] : []))
  nitroApp.hooks.hook('beforeResponse', (event, response) => {
    if (event.path.split('?')[0] !== '/_openapi.json' || typeof response.body !== 'object') return
    const document = response.body as OpenApiDocument
    const schemas: Record<string, unknown> = {}
    for (const { requestBody } of Object.values(document.paths ?? {}).flatMap(operations => Object.values(operations))) {
      const name = /^\w+/.exec(requestBody?.description ?? '')?.[0] ?? ''
      if (!requestBody || !(name in known)) continue
      schemas[name] = known[name]
      requestBody.content = { 'application/json': { schema: { $ref: `#/components/schemas/${name}` } } }
    }
    document.components = { ...document.components, schemas: { ...document.components?.schemas, ...schemas } }
  })
})

function jsonSchemaOf(schema: z.ZodType): unknown {
  const { $schema: _, ...shape } = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' })
  return shape
}
