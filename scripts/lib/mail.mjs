import { mkdirSync } from 'node:fs'
import { join } from 'node:path'

import { ROOT } from './paths.mjs'
import { waitForPort } from './ports.mjs'
import { Refusal } from './say.mjs'

/**
 * Starts the local mail server, which delivers nothing and files everything.
 * @param {import('./processes.mjs').Fleet} fleet
 * @param {{folder: string, port: number}} options where the letters go
 * @returns {Promise<string>} its SMTP address
 */
export async function startMail(fleet, { folder, port }) {
  mkdirSync(folder, { recursive: true })
  await fleet.start({
    name: 'mail',
    command: process.execPath,
    args: [join(ROOT, 'scripts/services/mail.mjs')],
    cwd: ROOT,
    env: { PATH: process.env.PATH, MAIL_FOLDER: folder, MAIL_PORT: String(port) },
    restart: true,
  })
  if (!(await waitForPort(port, { alive: () => fleet.isRunning('mail') }))) {
    throw new Refusal(`The local mail server did not start.\n${fleet.tail('mail')}`)
  }
  return `smtp://127.0.0.1:${port}`
}
