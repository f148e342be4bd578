/** What Nitro knows of its routes; it makes the OpenAPI document from the same list. */
declare module '#nitro-internal-virtual/server-handlers-meta' {
  export const handlersMeta: readonly { route?: string, method?: string }[]
}
