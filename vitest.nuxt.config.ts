import { defineVitestConfig } from '@nuxt/test-utils/config'

/** Components and stores, mounted as Nuxt mounts them. */
export default defineVitestConfig({
  test: {
    name: 'nuxt',
    environment: 'nuxt',
    environmentOptions: { nuxt: { domEnvironment: 'happy-dom' } },
    include: ['tests/nuxt/**/*.spec.ts'],
    testTimeout: 20_000,
    hookTimeout: 60_000,
  },
})
