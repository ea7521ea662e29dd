/**
 * The local mail server: files each message it is given as <time>-<number>.eml, with a .json beside
 * it that says from whom, to whom and what, for people and tests to read.
 *
 * Settings: MAIL_FOLDER, MAIL_PORT.
 */
import { renameSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'

const { MAIL_FOLDER, MAIL_PORT } = process.env
const LARGEST = 20 * 1024 * 1024

let filed = 0

const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  onAuth: (_auth, _session, done) => done(null, { user: 'anyone' }),
  size: LARGEST,
  onData(stream, session, done) {
    read(stream)
      .then((message) => file(message, session.envelope))
      .then((name) => done(null, `Filed as ${name}`), done)
  },
})

async function read(stream) {
  const chunks = []
  for await (const chunk of stream) chunks.push(chunk)
  if (stream.sizeExceeded) {
    throw Object.assign(new Error('The message is larger than 20 MB.'), { responseCode: 552 })
  }
  return Buffer.concat(chunks)
}

async function file(message, envelope) {
  const { subject, text, html } = await simpleParser(message)
  const receivedAt = new Date().toISOString()
  const name = `${receivedAt.replaceAll(':', '-')}-${String(++filed).padStart(4, '0')}`
  put(`${name}.eml`, message)
  // The .json comes last and whole: whoever waits for it finds both.
  put(
    `${name}.json`,
    JSON.stringify(
      {
        from: envelope.mailFrom ? envelope.mailFrom.address : '',
        to: envelope.rcptTo.map(({ address }) => address),
        subject: subject ?? '',
        text: text ?? '',
        html: html || '',
        receivedAt,
        message: `${name}.eml`,
      },
      null,
      2,
    ),
  )
  return name
}

function put(name, content) {
  const draft = join(MAIL_FOLDER, `.${name}`)
  writeFileSync(draft, content)
  renameSync(draft, join(MAIL_FOLDER, name))
}

server.on('error', (error) => {
  process.stderr.write(`${error.message}\n`)
  if (error.syscall === 'listen') process.exit(1)
})
server.listen(Number(MAIL_PORT), '127.0.0.1')

for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, () => process.exit(0))
