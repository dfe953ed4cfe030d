import type { Metadata, Viewport } from 'next'
import localFont from 'next/font/local'
import type { ReactNode } from 'react'
import { PhoneTabs } from '@/components/ui/phone-tabs'
import { SiteHeader } from '@/components/ui/site-header'
import './globals.css'

const text = localFont({
  src: '../fonts/atkinson-hyperlegible-next-latin-wght-normal.woff2',
  variable: '--font-text',
  weight: '200 800',
  display: 'swap',
  fallback: ['text spare', 'text wide spare'],
})
const head = localFont({
  src: '../fonts/barlow-condensed-latin-600-normal.woff2',
  variable: '--font-head',
  weight: '600',
  display: 'swap',
  adjustFontFallback: 'Arial',
  fallback: ['head spare', 'head wide spare'],
})
const mono = localFont({
  src: '../fonts/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  variable: '--font-mono',
  weight: '200 800',
  display: 'swap',
  adjustFontFallback: false,
  fallback: ['mono spare'],
})

export const metadata: Metadata = {
  title: { default: 'Longpoint', template: '%s · Longpoint' },
  description:
    'Learning platform and calculator handbook for apprentice welders: measure the stair, set the saw, cut it once.',
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: '#20272b',
}

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" className={`${text.variable} ${head.variable} ${mono.variable}`} suppressHydrationWarning>
      <head>
        {/* A theme of the reader's own must stand before the first paint, or it would flash. */}
        <script src="/theme.js" async blocking="render" />
      </head>
      <body>
        <SiteHeader />
        <main id="main" tabIndex={-1}>
          {children}
        </main>
        <PhoneTabs />
      </body>
    </html>
  )
}
