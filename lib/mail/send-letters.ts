import { createTransport, type Transporter } from 'nodemailer'
import { Op } from 'sequelize'

import { unseal } from '@/lib/auth/seal'
import { env } from '@/lib/env'
import { inTransaction, Letter } from '@/models'

const WAIT = 10_000
/** Letters of one round. */
const ROUND = 50

let transport: Transporter | undefined

/** The way to a mail server, given up after ten seconds of silence. */
export const mailServer = (url: string): Transporter =>
  createTransport({ url, connectionTimeout: WAIT, greetingTimeout: WAIT, socketTimeout: WAIT })

const ours = () => (transport ??= mailServer(env().SMTP_URL))

/** A mail server's "no, and do not ask again". @source RFC 5321 § 4.2.1 */
const isRefusal = (error: unknown) =>
  Number((error as { responseCode?: number }).responseCode) >= 500

/**
 * The work of the job `send-letter`: sends a letter that has not been sent. Its Message-ID is the
 * letter's own, so that one sent twice by a process that died in between is known as one.
 * @throws Error when the server does not take it just now; the next try or round goes on
 */
export async function sendLetter(
  letterId: string,
  server = ours(),
): Promise<'sent' | 'refused' | 'done before'> {
  return inTransaction(async (transaction) => {
    const letter = await Letter.findOne({
      where: { id: letterId, sentAt: null, failedAt: null },
      lock: transaction.LOCK.UPDATE,
      skipLocked: true,
      transaction,
    })
    if (!letter) return 'done before'
    const { text, html } = JSON.parse(unseal(letter.sealedBody, 'letter')) as {
      text: string
      html: string
    }
    const emptied = { sealedBody: '' }
    try {
      await server.sendMail({
        messageId: `<${letter.id}@${new URL(env().APP_ORIGIN).hostname}>`,
        from: env().MAIL_FROM,
        to: letter.recipient,
        subject: letter.subject,
        text,
        html,
        disableFileAccess: true,
        disableUrlAccess: true,
      })
    } catch (error) {
      if (!isRefusal(error)) throw error
      const failure = (error as Error).message.slice(0, 500)
      await letter.update({ ...emptied, failedAt: new Date(), failure }, { transaction })
      return 'refused'
    }
    await letter.update({ ...emptied, sentAt: new Date() }, { transaction })
    return 'sent'
  })
}

/**
 * The work of the job `send-letters`: sends what is still in the outbox, oldest first, until the
 * server fails. However long it was away, nothing is lost.
 */
export async function sendLetters(server = ours()): Promise<{ sent: number; left: number }> {
  const unsent = { sentAt: null, failedAt: null, createdAt: { [Op.lte]: new Date() } }
  const waiting = await Letter.findAll({
    attributes: ['id'],
    where: unsent,
    order: [['createdAt', 'ASC']],
    limit: ROUND,
  })
  let sent = 0
  for (const { id } of waiting) {
    await sendLetter(id, server)
    sent++
  }
  return { sent, left: await Letter.count({ where: unsent }) }
}
