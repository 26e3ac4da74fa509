declare module '#migrations' {
  export const migrations: { name: string, sql: string }[]
}

declare module '#nitro-internal-virtual/server-handlers' {
  export const handlers: { route?: string, method?: string, middleware?: boolean }[]
}
