export default defineNuxtConfig({ srcDir: '.', serverDir: 'server', telemetry: false, compatibilityDate: '2026-11-01' })
