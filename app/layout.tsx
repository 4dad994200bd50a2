import type { Metadata, Viewport } from 'next'
import { cookies, headers } from 'next/headers'
import type { ReactNode } from 'react'
import { Providers } from '@/components/ui/providers'
import { fontVariables } from './fonts'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Tenth Summer', template: '%s - Tenth Summer' },
  description: 'Foundation plantings drawn at the size they grow to.',
}

export const viewport: Viewport = { width: 'device-width', initialScale: 1 }

/** Reading the nonce makes every page of the moment it is asked for: all of them are somebody's own. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  const nonce = (await headers()).get('x-nonce') ?? undefined
  const theme = (await cookies()).get('theme')?.value === 'outdoors' ? 'outdoors' : 'paper'
  return (
    <html lang="en" data-theme={theme} className={fontVariables}>
      <body>
        <Providers nonce={nonce}>{children}</Providers>
      </body>
    </html>
  )
}
