export type Theme = 'light' | 'night'

/** Day or night, kept in a cookie so that the server draws it right at once; null: as the device says. */
export function useTheme() {
  const cookie = useCookie<Theme | null>('theme', { sameSite: 'lax', maxAge: 365 * 24 * 3600, default: () => null })
  useHead({ htmlAttrs: { 'data-theme': () => cookie.value ?? undefined } })
  return { theme: cookie, set: (theme: Theme) => cookie.value = theme }
}
