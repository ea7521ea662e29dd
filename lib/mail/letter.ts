import { env } from '@/lib/env'

/** What a letter says, before it is set as text and as HTML. */
export interface LetterContent {
  /** Names the occasion; kept with the letter. */
  kind: string
  subject: string
  /** Who is spoken to; none for an address we know nothing of. */
  name?: string
  paragraphs: readonly string[]
  /** The one thing to do: a button in HTML, an address on a line of its own in text. */
  action?: { label: string; path: string }
  /** What to know if it was not asked for. */
  closing?: string
}

const escape = (text: string) => text.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`)

function linkTo(path: string): string {
  const { href, origin } = new URL(path, env().APP_ORIGIN)
  if (origin !== new URL(env().APP_ORIGIN).origin) throw new RangeError(`${path} leads elsewhere.`)
  return href
}

/**
 * A letter as text and as HTML; its links begin with APP_ORIGIN, whatever a request said.
 * @throws RangeError for a path that leads elsewhere
 */
export function setLetter(content: LetterContent): { text: string; html: string } {
  const { name, paragraphs, action, closing } = content
  const link = action && linkTo(action.path)
  const greeting = name ? `Hello ${name},` : 'Hello,'
  const text = [
    greeting,
    ...paragraphs,
    ...(action ? [`${action.label}:\n${link}`] : []),
    ...(closing ? [closing] : []),
    'Woadmap',
  ].join('\n\n')
  const p = (inner: string) => `<p style="margin:0 0 16px">${inner}</p>`
  const button = action
    ? `<p style="margin:24px 0"><a href="${escape(link!)}" style="background:#20324f;color:#ffffff;padding:12px 18px;border-radius:2px;text-decoration:none;font-weight:600">${escape(action.label)}</a></p>${p(`<span style="color:#5c5a57">Or copy this address:<br>${escape(link!)}</span>`)}`
    : ''
  const html = `<!doctype html>
<html lang="en-GB"><head><meta charset="utf-8"><title>${escape(content.subject)}</title></head>
<body style="margin:0;background:#f7f6f5;color:#1d1c1a;font:16px/24px sans-serif">
<div style="max-width:560px;margin:0 auto;padding:32px 20px">
<p style="margin:0 0 24px;font:22px/28px serif;color:#20324f">Woadmap</p>
${p(escape(greeting))}
${paragraphs.map((one) => p(escape(one))).join('\n')}
${button}
${closing ? p(`<span style="color:#5c5a57">${escape(closing)}</span>`) : ''}
</div></body></html>`
  return { text: `${text}\n`, html }
}
