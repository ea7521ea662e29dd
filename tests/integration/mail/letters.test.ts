import { randomUUID } from 'node:crypto'

import { afterEach, describe, expect, it } from 'vitest'

import { unseal } from '@/lib/auth/seal'
import { postLetter } from '@/lib/mail/post-letter'
import { mailServer, sendLetter, sendLetters } from '@/lib/mail/send-letters'
import { inTransaction, Letter, sequelize } from '@/models'
import { makeMailServer, type TestMailServer } from '@/tests/integration/setup/mail-server'

const CONTENT = {
  kind: 'test',
  subject: 'A letter',
  paragraphs: ['What it says.'],
  action: { label: 'Open', path: '/invitations/a-token-of-a-test' },
}

let server: TestMailServer | undefined
afterEach(() => server?.close())

const makeServer = async (answer: Parameters<typeof makeMailServer>[0]) =>
  (server = await makeMailServer(answer))

async function post(): Promise<Letter> {
  const recipient = `${randomUUID()}@people.example`
  await inTransaction((transaction) => postLetter(recipient, CONTENT, transaction))
  return (await Letter.findOne({ where: { recipient } }))!
}

describe('a letter in the outbox', () => {
  it('is there, with its job, only if what it tells of is', async () => {
    const recipient = `${randomUUID()}@people.example`
    await inTransaction(async (transaction) => {
      await postLetter(recipient, CONTENT, transaction)
      throw new Error('no')
    }).catch(() => {})
    expect(await Letter.count({ where: { recipient } })).toBe(0)
    const letter = await post()
    const [jobs] = await sequelize().query(
      "SELECT FROM pgboss.job WHERE name = 'send-letter' AND data->>'letterId' = $1",
      { bind: [letter.id] },
    )
    expect(jobs).toHaveLength(1)
  })

  it('does not show what it says', async () => {
    const { sealedBody } = await post()
    expect(sealedBody).not.toContain('a-token-of-a-test')
    expect(unseal(sealedBody, 'letter')).toContain('a-token-of-a-test')
  })

  it('is sent once, under its own Message-ID, and then emptied', async () => {
    const { url, taken } = await makeServer(() => null)
    const letter = await post()
    const outcomes = await Promise.all([
      sendLetter(letter.id, mailServer(url)),
      sendLetter(letter.id, mailServer(url)),
    ])
    expect(outcomes.sort()).toEqual(['done before', 'sent'])
    expect(taken).toEqual([`<${letter.id}@localhost>`])
    await letter.reload()
    expect(letter).toMatchObject({ sealedBody: '', failedAt: null })
    expect(letter.sentAt).not.toBeNull()
  })

  it('waits for a server that is away, and is lost by none of the tries', async () => {
    // What other files left in the outbox would be sent first, a tenth of a second each.
    await Letter.destroy({ where: {} })
    const letter = await post()
    const away = mailServer('smtp://127.0.0.1:1')
    for (let time = 0; time < 3; time++)
      await expect(sendLetter(letter.id, away)).rejects.toThrow(/ECONNREFUSED/)
    const { url, taken } = await makeServer(() => null)
    expect(await sendLetters(mailServer(url))).toEqual({ sent: 1, left: 0 })
    expect(taken).toEqual([`<${letter.id}@localhost>`])
  })

  it('is sent again when the server drops the line before it has taken it, or asks to wait', async () => {
    const letter = await post()
    const busy = Object.assign(new Error('Come back later'), { responseCode: 451 })
    const { url, taken } = await makeServer((count) => [, 'drop' as const, busy, null][count]!)
    const way = mailServer(url)
    await expect(sendLetter(letter.id, way)).rejects.toThrow()
    await expect(sendLetter(letter.id, way)).rejects.toThrow(/Come back later/)
    expect(await sendLetter(letter.id, way)).toBe('sent')
    expect(taken).toHaveLength(1)
  })

  it('that is refused for good says so and is not sent again', async () => {
    const letter = await post()
    const unknown = Object.assign(new Error('No such mailbox'), { responseCode: 550 })
    const { url } = await makeServer(() => unknown)
    expect(await sendLetter(letter.id, mailServer(url))).toBe('refused')
    await letter.reload()
    expect(letter).toMatchObject({ sealedBody: '', sentAt: null })
    expect(letter.failure).toContain('No such mailbox')
    expect(await sendLetter(letter.id, mailServer(url))).toBe('done before')
  })
})
