'use client'

import dynamic from 'next/dynamic'
import type { ReactNode } from 'react'
import type { ExternalToast } from 'sonner'

/** Where toasts appear; it stands once, in the root layout, and loads after the page. */
export const Toaster = dynamic(() => import('./toaster').then((it) => it.Toaster), { ssr: false })

function say(kind: 'success' | 'error', message: ReactNode, terms?: ExternalToast) {
  void import('sonner').then(({ toast }) => toast[kind](message, terms))
}

/** Says that something is done. */
export const toastDone = (message: ReactNode) => say('success', message)

/** Says that something went wrong and what was kept; it stays longer. */
export const toastProblem = (message: string, description?: string) =>
  say('error', message, { description, duration: 12_000 })

/** Says what was done and offers to take it back for ten seconds. */
export const toastUndo = (message: string, onUndo: () => void, label = 'Undo') =>
  say('success', message, { duration: 10_000, action: { label, onClick: onUndo } })
