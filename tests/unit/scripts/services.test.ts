import { readFileSync, readdirSync } from 'node:fs'
import { join } from 'node:path'

import { createTransport } from 'nodemailer'
import { beforeEach, expect, onTestFinished, test } from 'vitest'

import { startMail } from '../../../scripts/lib/mail.mjs'
import { startObjectStore } from '../../../scripts/lib/object-store.mjs'
import { findFreePorts } from '../../../scripts/lib/ports.mjs'
import { Fleet } from '../../../scripts/lib/processes.mjs'
import { temporaryFolder } from './temporary-folder'

let local: string
let fleet: Fleet
let port: number

beforeEach(async () => {
  local = temporaryFolder()
  fleet = new Fleet({ local, onLoss: () => {} })
  onTestFinished(() => fleet.stopAll())
  port = (await findFreePorts(1))[0]!
})

test('the mail server files each message whole, with a note of what it is', async () => {
  const folder = join(local, 'mail')
  const transport = createTransport(await startMail(fleet, { folder, port }))
  await transport.sendMail({
    from: 'studio@teasel.example',
    to: ['dyer@teasel.example', 'owner@teasel.example'],
    subject: 'Föhn over the fells',
    text: 'Five shades are ready.',
  })
  await transport.sendMail({ from: 'a@b.example', to: 'c@d.example', subject: 'Another' })
  transport.close()

  const names = readdirSync(folder).sort()
  expect(names.filter((name) => name.endsWith('.eml'))).toHaveLength(2)
  const note = JSON.parse(
    readFileSync(
      join(
        folder,
        names.find((name) => /json$/.test(name))!,
      ),
      'utf8',
    ),
  )
  expect(note).toMatchObject({
    from: 'studio@teasel.example',
    to: ['dyer@teasel.example', 'owner@teasel.example'],
    subject: 'Föhn over the fells',
  })
  expect(note.text.trim()).toBe('Five shades are ready.')
  expect(readFileSync(join(folder, note.message), 'utf8')).toContain('Five shades are ready.')
})

test('a browser may post to the object store from the product and from nowhere else', async () => {
  const origin = 'http://localhost:3000'
  const endpoint = await startObjectStore(fleet, {
    folder: join(local, 'uploads'),
    port,
    buckets: ['woadmap'],
    origins: [origin],
  })
  const preflight = (from: string) =>
    fetch(`${endpoint}/woadmap`, {
      method: 'OPTIONS',
      headers: { origin: from, 'access-control-request-method': 'POST' },
    })
  expect((await preflight(origin)).status).toBe(200)
  expect((await preflight('http://elsewhere.example')).status).toBe(403)
})
