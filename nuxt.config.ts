import { migrationsModule } from './server/db/migrations-module'

export default defineNuxtConfig({
  modules: ['@nuxt/eslint', '@nuxtjs/tailwindcss', '@pinia/nuxt', 'nuxt-auth-utils'],
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
  eslint: { config: { stylistic: true } },
  tailwindcss: { cssPath: false, viewer: false },
})
