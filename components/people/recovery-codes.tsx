'use client'

import { Copy, Download, Printer } from 'lucide-react'
import { useEffect, useRef } from 'react'

import { Button } from '@/components/ui/button'
import { toastDone, toastProblem } from '@/components/ui/toast'

/** The codes as a text to keep. */
const asText = (codes: readonly string[], email: string) =>
  [
    `Recovery codes for ${email} on Woadmap (${window.location.origin})`,
    'Each signs in once, after the password, in place of a code of the authenticator.',
    '',
    ...codes,
    '',
  ].join('\n')

function download(text: string) {
  const address = URL.createObjectURL(new Blob([text], { type: 'text/plain;charset=utf-8' }))
  const link = document.createElement('a')
  link.href = address
  link.download = 'woadmap-recovery-codes.txt'
  link.click()
  URL.revokeObjectURL(address)
}

/** Recovery codes, shown this once, and the ways to keep them. */
export function RecoveryCodes({
  codes,
  email,
  onKept,
}: {
  codes: readonly string[]
  email: string
  onKept: () => void
}) {
  const heading = useRef<HTMLHeadingElement>(null)
  // They take the place of what had the focus.
  useEffect(() => heading.current?.focus(), [])
  const copy = () =>
    Promise.resolve()
      .then(() => navigator.clipboard.writeText(asText(codes, email)))
      .then(
        () => toastDone('Recovery codes copied.'),
        () => toastProblem('They could not be copied.', 'Download them, or write them down.'),
      )
  return (
    <section>
      <h2 ref={heading} tabIndex={-1} className="text-xl outline-none">
        Keep your recovery codes
      </h2>
      <p className="mt-1 text-ink-soft print:hidden">
        Without your authenticator, each of these signs you in once. They are shown now and never
        again; keep them where you will find them without your telephone.
      </p>
      <p className="mt-1 hidden print:block">
        Recovery codes of {email} on Woadmap. Each signs in once, after the password, in place of a
        code of the authenticator.
      </p>
      <ol
        aria-label="Recovery codes"
        className="mt-4 grid max-w-xs grid-cols-2 gap-x-8 gap-y-1.5 border-y border-hairline py-4 text-lg font-medium tracking-wide tabular-nums"
      >
        {codes.map((code) => (
          <li key={code}>{code}</li>
        ))}
      </ol>
      <div className="mt-4 flex flex-wrap gap-3 print:hidden">
        <Button icon={<Copy aria-hidden="true" />} onClick={() => void copy()}>
          Copy codes
        </Button>
        <Button
          icon={<Download aria-hidden="true" />}
          onClick={() => download(asText(codes, email))}
        >
          Download codes
        </Button>
        <Button icon={<Printer aria-hidden="true" />} onClick={() => window.print()}>
          Print codes
        </Button>
      </div>
      <div className="mt-8 print:hidden">
        <Button variant="primary" onClick={onKept}>
          I have kept my codes
        </Button>
      </div>
    </section>
  )
}
