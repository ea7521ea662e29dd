import type { Metadata, Viewport } from 'next'
import { cookies } from 'next/headers'
import type { ReactNode } from 'react'
import { Toaster } from '@/components/ui/toast'
import { GROUND_COOKIE, parseGround } from '@/components/yarn/grounds'
import { besley, besleyExtended, hanken, hankenExtended } from './fonts'
import './globals.css'

/** Every page's title ends with the product's name. */
export const metadata: Metadata = {
  title: { template: '%s · Woadmap', default: 'Woadmap' },
  description: 'Woadmap carries a yarn line from the first photograph to launch day.',
}

/** The browser's own furniture takes the colour of the paper. */
export const viewport: Viewport = { themeColor: '#f7f6f5', colorScheme: 'light' }

const fonts = [besley, besleyExtended, hanken, hankenExtended].map((font) => font.variable)

/** The frame of every page: language, typefaces, the viewing ground and the place for messages. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  const ground = parseGround((await cookies()).get(GROUND_COOKIE)?.value)
  return (
    <html lang="en-GB" data-ground={ground} className={fonts.join(' ')}>
      <body>
        {children}
        <Toaster />
      </body>
    </html>
  )
}
