import type { Session } from '@/models'

import { browserInWords } from './browser-words'

/** A session as its person sees it. */
export interface SessionView {
  id: string
  /** "Firefox on Linux". */
  browser: string
  /** The network address it was opened from; empty when not known. */
  address: string
  /** "1 December 2026 at 09:40 UTC". */
  signedIn: string
  lastSeen: string
  /** The one that asks. */
  current: boolean
}

const moment = new Intl.DateTimeFormat('en-GB', {
  dateStyle: 'long',
  timeStyle: 'short',
  timeZone: 'UTC',
})
const inWords = (date: Date) => `${moment.format(date)} UTC`

/** A session row as its view. */
export function presentSession(session: Session, currentId: string): SessionView {
  return {
    id: session.id,
    browser: browserInWords(session.userAgent),
    address: session.address,
    signedIn: inWords(session.createdAt),
    lastSeen: inWords(session.lastSeenAt),
    current: session.id === currentId,
  }
}
