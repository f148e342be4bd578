import { randomBytes } from 'node:crypto'
import { cpSync, mkdirSync } from 'node:fs'
import { resolve } from 'node:path'
import packageInfo from './package.json'

export default defineNuxtConfig({
  modules: ['@nuxtjs/tailwindcss', '@pinia/nuxt', '@vueuse/nuxt', 'nuxt-auth-utils', 'nuxt-security', '@nuxt/eslint'],

  // Said aloud: a stray app/ folder would otherwise move everything.
  srcDir: '.',
  serverDir: 'server',
  compatibilityDate: '2026-11-01',
  telemetry: false,
  devtools: { enabled: false },

  app: {
    head: {
      title: 'Thimbleful',
      htmlAttrs: { lang: 'en' },
      meta: [
        { name: 'viewport', content: 'width=device-width, initial-scale=1' },
        { name: 'description', content: 'Feeding plans for starved reptiles and other animals: from a weight to a sheet on the enclosure.' },
      ],
      link: [{ rel: 'icon', type: 'image/svg+xml', href: '/mark.svg' }],
    },
  },

  // File names carry the feature already: components/plan/PlanBarrel.vue is <PlanBarrel>.
  components: [{ path: '~/components', pathPrefix: false }],
  // Who is signed in is asked for by our own store: the module's would tell no more than an id.
  auth: { loadStrategy: 'none' },
  tailwindcss: { cssPath: ['~/assets/css/main.css', { injectPosition: 'first' }], viewer: false },

  runtimeConfig: {
    // Multiplies the limits of requests per address; raised in tests and benchmarks.
    rateLimitFactor: 1,
    // The password is made on first start (server/plugins/00.secret.ts). The cookie says only which plans this browser knows;
    // each link in it ends after 30 days by itself. Secure is set where the request came by https (guestPlans.ts).
    session: { name: 'thimbleful', sessionHeader: false, password: '', maxAge: 60 * 60 * 24 * 365, cookie: { sameSite: 'lax', httpOnly: true, secure: false } },
    // Where people reach this server, for links in mails: https://plans.rescue.example. Must be set once mail leaves the house.
    origin: '',
    // Mail leaves only when a server is set: NUXT_SMTP_URL, NUXT_SMTP_FROM, NUXT_SMTP_RETRY_SECONDS.
    smtp: { url: '', from: '', retrySeconds: 60 },
    public: { appVersion: packageInfo.version },
  },

  // While developing, the sealing password lives as long as the process: the cookie module would otherwise write one to .env.
  $development: { runtimeConfig: { session: { password: randomBytes(32).toString('hex') } } },

  security: {
    // Plain http on a laptop or in a barn is the usual case: nothing may force https.
    headers: {
      strictTransportSecurity: false,
      referrerPolicy: 'no-referrer',
      crossOriginEmbedderPolicy: false,
      contentSecurityPolicy: {
        'default-src': ['\'self\''],
        'base-uri': ['\'none\''],
        'connect-src': ['\'self\''],
        'font-src': ['\'self\''],
        'form-action': ['\'self\''],
        'frame-ancestors': ['\'self\''],
        'frame-src': ['\'self\'', 'blob:'],
        'img-src': ['\'self\'', 'data:', 'blob:'],
        'object-src': ['\'self\'', 'blob:'],
        'script-src': ['\'self\'', '\'nonce-{{nonce}}\'', '\'strict-dynamic\''],
        'script-src-attr': ['\'none\''],
        'style-src': ['\'self\'', '\'unsafe-inline\''],
        'upgrade-insecure-requests': false,
      },
    },
    // Ours know the error shape and count per route (server/utils/http).
    rateLimiter: false,
    requestSizeLimiter: false,
    xssValidator: false,
    corsHandler: false,
  },

  nitro: {
    compressPublicAssets: true,
    experimental: { openAPI: true },
    openAPI: { production: 'runtime', route: '/_openapi.json', meta: { title: 'Thimbleful', description: 'Feeding plans for starved animals. Every number carries its unit in its name.', version: packageInfo.version }, ui: { scalar: false, swagger: false } },
  },

  hooks: {
    // Ours answers for /api and leaves the rest to Nuxt's, which shows error.vue. Set in the configuration it would replace Nuxt's.
    'nitro:config'(config) {
      // The cookie is read through requireMember and ended through sign-out; the module's own addresses would go around both.
      config.handlers = config.handlers?.filter(one => one?.route !== '/api/_auth/session')
      config.errorHandler = [resolve(config.rootDir ?? '.', 'server/error.ts'), ...[config.errorHandler ?? []].flat()]
    },
    // Migrations and print fonts are read from disk: beside the built server, and in the sources while developing.
    'nitro:init'(nitro) {
      nitro.hooks.hook('compiled', () => {
        if (nitro.options.dev) return
        const { rootDir, output } = nitro.options
        cpSync(resolve(rootDir, 'server/db/migrations'), resolve(output.serverDir, 'migrations'), { recursive: true })
        mkdirSync(resolve(output.serverDir, 'fonts'), { recursive: true })
        for (const weight of ['Regular', 'Bold']) {
          cpSync(resolve(rootDir, `node_modules/source-sans/TTF/SourceSans3-${weight}.ttf`), resolve(output.serverDir, 'fonts', `SourceSans3-${weight}.ttf`))
        }
      })
    },
  },

  typescript: { strict: true, typeCheck: false },
})
