/**
 * Settings with which a built server runs as the demo on plain http.
 *
 * @param {{ port: string, dataDir: string, secret: string }} demo
 * @returns {Record<string, string>}
 */
export function demoEnv({ port, dataDir, secret }) {
  return {
    NODE_ENV: 'production',
    SILLION_DEMO: '1',
    DATA_DIR: dataDir,
    PORT: port,
    NITRO_PORT: port,
    PUBLIC_ORIGIN: `http://localhost:${port}`,
    NUXT_SESSION_NAME: 'sillion',
    NUXT_SESSION_COOKIE_SECURE: 'false',
    NUXT_SESSION_PASSWORD: secret,
  }
}
