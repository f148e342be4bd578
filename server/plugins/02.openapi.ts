import { defineNitroPlugin } from 'nitropack/runtime'
import { z } from 'zod'
import { RegimenChange, RegimenInput } from '#shared/schemas/regimen'

interface Operation { requestBody?: { content?: Record<string, unknown> } }
interface OpenApiDocument { components?: { schemas?: Record<string, unknown> }, paths?: Record<string, Record<string, Operation>> }

/**
 * Puts the shape of what may be sent into the generated OpenAPI document, from the schemas that check it: described by
 * hand it would drift from them.
 */
export default defineNitroPlugin((nitroApp) => {
  const schemas = { RegimenInput: jsonSchemaOf(RegimenInput), RegimenChange: jsonSchemaOf(RegimenChange) }
  nitroApp.hooks.hook('beforeResponse', (event, response) => {
    if (event.path.split('?')[0] !== '/_openapi.json' || typeof response.body !== 'object') return
    const document = response.body as OpenApiDocument
    document.components = { ...document.components, schemas: { ...document.components?.schemas, ...schemas } }
    for (const operations of Object.values(document.paths ?? {})) {
      for (const [method, { requestBody }] of Object.entries(operations)) {
        if (requestBody) requestBody.content = { 'application/json': { schema: { $ref: `#/components/schemas/${method === 'patch' ? 'RegimenChange' : 'RegimenInput'}` } } }
      }
    }
  })
})

function jsonSchemaOf(schema: z.ZodType): unknown {
  const { $schema: _, ...shape } = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' })
  return shape
}
