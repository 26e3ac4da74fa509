import { fileURLToPath } from 'node:url'
import { migrationsModule } from './server/db/migrations-module'

export default defineNuxtConfig({
  modules: ['@nuxt/eslint', '@nuxtjs/tailwindcss', '@pinia/nuxt', 'nuxt-auth-utils'],
  // npm run dev answers for the outside services itself; a built server is given the fakes when it starts, or has none.
  $development: { nitro: { plugins: ['~~/mocks/nitro-plugin.ts'] } },
  components: [{ path: '~/components', pathPrefix: false }],
  devtools: { enabled: false },
  app: {
    head: {
      htmlAttrs: { lang: 'en' },
      titleTemplate: '%s · Sillion',
      meta: [
        { name: 'viewport', content: 'width=device-width, initial-scale=1' },
        { name: 'referrer', content: 'same-origin' },
      ],
      link: [{ rel: 'icon', type: 'image/svg+xml', href: '/mark.svg' }],
    },
  },
  css: ['~/assets/css/main.css'],
  runtimeConfig: {
    session: {
      name: '__Host-sillion',
      password: '',
      maxAge: 90 * 24 * 3600,
      // The seal travels in the cookie alone, where scripts can't reach it.
      sessionHeader: false,
      cookie: { sameSite: 'lax', secure: true, httpOnly: true, path: '/' },
    },
  },
  routeRules: {
    '/**': {
      headers: {
        'x-content-type-options': 'nosniff',
        'referrer-policy': 'same-origin',
        'x-frame-options': 'DENY',
        'cross-origin-opener-policy': 'same-origin',
        'cross-origin-embedder-policy': 'require-corp',
        'cross-origin-resource-policy': 'same-origin',
        'permissions-policy': 'camera=(), microphone=(), geolocation=(), payment=(), usb=()',
      },
    },
  },
  features: { inlineStyles: false },
  compatibilityDate: '2025-05-06',
  nitro: {
    preset: 'node-server',
    compressPublicAssets: true,
    exportConditions: ['module-sync'],
    experimental: { tasks: true },
    scheduledTasks: { '* * * * *': ['weather:pull'] },
    // The built server must find its migrations wherever it is copied to, so they travel as a module.
    virtual: { '#migrations': migrationsModule },
    typescript: { strict: true },
  },
  typescript: { strict: true },
  telemetry: false,
  hooks: {
    // Ours answers the API and leaves pages to Nuxt's own.
    'nitro:config': (config) => {
      config.errorHandler = [fileURLToPath(new URL('server/error.ts', import.meta.url)), config.errorHandler ?? []].flat()
    },
  },
  auth: { loadStrategy: 'none' },
  eslint: { config: { stylistic: true } },
  tailwindcss: { cssPath: false, viewer: false },
})
