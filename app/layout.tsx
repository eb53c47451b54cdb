import './styles/theme.css'
import './styles/base.css'
import './styles/page.css'
import './styles/figure.css'
import './styles/ingredients.css'
import './styles/tables.css'
import './styles/live.css'
import './styles/cursor.css'
import './styles/ruler.css'
import './styles/method.css'
import './styles/take-away.css'
import './styles/views.css'
import './styles/print.css'
import type { Metadata, Viewport } from 'next'
import localFont from 'next/font/local'
import { connection } from 'next/server'
import type { ReactNode } from 'react'

const sans = localFont({
  src: [
    { path: './fonts/longhence-sans-regular.woff2', style: 'normal', weight: '400' },
    { path: './fonts/longhence-sans-semibold.woff2', style: 'normal', weight: '600' },
    { path: './fonts/longhence-sans-italic.woff2', style: 'italic', weight: '400' },
  ],
  variable: '--sans',
  display: 'swap',
})

export const metadata: Metadata = {
  title: { default: 'Longhence', template: '%s · Longhence' },
  description:
    'How expanding universes begin, grow and end: ages, horizons and endings of the cosmologies you choose, in figures, numbers and links.',
}

export const viewport: Viewport = {
  colorScheme: 'light dark',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#fbfaf7' },
    { media: '(prefers-color-scheme: dark)', color: '#0e1116' },
  ],
}

export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  // Pages are drawn for each request: only those can carry the nonce of a strict content policy.
  await connection()
  return (
    <html lang="en" className={sans.variable}>
      <body>{children}</body>
    </html>
  )
}
