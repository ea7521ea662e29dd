'use client'

import { Printer } from 'lucide-react'

import { Button } from '@/components/ui/button'

/** Prints the sheet it stands on. */
export function LabelPrintButton() {
  return (
    <Button variant="primary" icon={<Printer aria-hidden="true" />} onClick={() => window.print()}>
      Print proof sheet
    </Button>
  )
}
