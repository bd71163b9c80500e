/** Follows the system unless the person says otherwise; the choice lives in a cookie, so that the first byte already has it. */
export const themes = ['system', 'light', 'dark'] as const
export type Theme = (typeof themes)[number]

export const themeCookie = 'theme'
/** A year, in seconds. */
export const themeMaxAge = 31_536_000

export const readTheme = (value: string | undefined): Theme => themes.find((theme) => theme === value) ?? 'system'
