import type { Metadata, Viewport } from 'next'
import { cookies, headers } from 'next/headers'
import type { ReactNode } from 'react'
import { readTheme, themeCookie } from '@/components/shell/theme'
import { fontVariables } from './fonts'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Halfspeed', template: '%s · Halfspeed' },
  description: 'A workbench for dual-channel ignition of small homebuilt-aircraft engines.',
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [{ media: '(prefers-color-scheme: light)', color: '#FBF7EE' }, { media: '(prefers-color-scheme: dark)', color: '#1A1916' }],
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  // Reading the headers makes every page per-request, which the nonce of the content policy needs.
  await headers()
  const theme = readTheme((await cookies()).get(themeCookie)?.value)
  return (
    <html lang="en" className={fontVariables} data-theme={theme === 'system' ? undefined : theme} suppressHydrationWarning>
      <body>
        <a className="skip" href="#main">To the content</a>
        {children}
      </body>
    </html>
  )
}
