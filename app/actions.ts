'use server'

import { cookies } from 'next/headers'
import { readTheme, themeCookie, themeMaxAge } from '@/components/shell/theme'

/** Keeps the chosen theme in this browser. Anyone may; it touches no record. */
export async function setTheme(formData: FormData): Promise<void> {
  const jar = await cookies()
  jar.set(themeCookie, readTheme(String(formData.get('theme') ?? '')), { path: '/', maxAge: themeMaxAge, sameSite: 'lax' })
}
