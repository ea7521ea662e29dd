'use client'

import { Check, Copy } from 'lucide-react'
import { useState } from 'react'

import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'

/** A text that goes into a post, with a button that copies it. */
export function CopyText({
  what,
  of: title,
  text,
  code = false,
}: {
  /** "Alt text". */
  what: string
  /** Of which combination, for those who hear the button alone. */
  of: string
  text: string
  /** It is set as code, in a box that scrolls. */
  code?: boolean
}) {
  const [said, setSaid] = useState<string>()

  async function copy() {
    try {
      await navigator.clipboard.writeText(text)
      setSaid('Copied')
    } catch {
      setSaid('Not copied: select the text and copy it yourself')
    }
  }

  return (
    <section className="border-t border-hairline py-3">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h3 className="font-body text-sm text-ink-faint">{what}</h3>
        <Button
          size="small"
          icon={said === 'Copied' ? <Check aria-hidden="true" /> : <Copy aria-hidden="true" />}
          aria-label={`Copy ${what} of ${title}`}
          onClick={() => void copy()}
        >
          Copy
        </Button>
      </div>
      {code ? (
        <pre
          tabIndex={0}
          aria-label={`${what} of ${title}`}
          className="mt-2 max-h-56 overflow-auto border border-hairline bg-wash p-3 text-sm"
        >
          {text}
        </pre>
      ) : (
        <p className="mt-1 max-w-measure">{text}</p>
      )}
      <LiveRegion>{said}</LiveRegion>
    </section>
  )
}
