import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const alias = {
  '#shared': fileURLToPath(new URL('./shared', import.meta.url)),
  '#server': fileURLToPath(new URL('./server', import.meta.url)),
}
// Files share one module cache (a third of the time): a spec that stubs something puts it back.
const plain = (name: string) => ({ resolve: { alias }, test: { name, environment: 'node' as const, setupFiles: ['tests/seed.ts'], isolate: false, include: [`tests/${name}/**/*.spec.ts`] } })

/** Checks that need no framework: plain Node, seconds. Components and the built server have configs of their own. */
export default defineConfig({ test: { projects: [plain('unit'), plain('reference'), plain('guards')] } })
