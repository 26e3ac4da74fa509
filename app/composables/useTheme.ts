export type Theme = 'light' | 'night'

/** Day or night, kept in a cookie so that the server draws it right at once; null: as the device says. */
export function useTheme() {
  const cookie = useCookie<Theme | null>('theme', { sameSite: 'lax', maxAge: 365 * 24 * 3600, default: () => null })
  useHead({ htmlAttrs: { 'data-theme': () => cookie.value ?? undefined } })
  /** To the other of the two, from the one that shows now. */
  function toggle(): void {
    const shown = cookie.value ?? (matchMedia('(prefers-color-scheme: dark)').matches ? 'night' : 'light')
    cookie.value = shown === 'night' ? 'light' : 'night'
  }
  return { toggle }
}
