import type { AddressInfo } from 'node:net'

import { SMTPServer } from 'smtp-server'

/** A mail server of a test. */
export interface TestMailServer {
  url: string
  /** The Message-IDs it took, in their order. */
  taken: string[]
  close(): Promise<void>
}

/**
 * A mail server that answers as it is told.
 * @param answer what it says to its so-manieth letter, from 1: null takes it, `drop` hangs up
 */
export async function makeMailServer(
  answer: (count: number) => Error | 'drop' | null,
): Promise<TestMailServer> {
  const taken: string[] = []
  let count = 0
  const made = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData(stream, _session, done) {
      let message = ''
      stream.on('data', (chunk) => (message += chunk))
      stream.on('end', () => {
        const said = answer(++count)
        if (said === 'drop') return dropAll(made)
        if (!said) taken.push(/^Message-ID: (.*)$/im.exec(message)![1]!)
        done(said)
      })
    },
  })
  made.on('error', () => {})
  await new Promise<void>((ready) => made.listen(0, '127.0.0.1', ready))
  const { port } = made.server.address() as AddressInfo
  const close = () => new Promise<void>((done) => made.close(done))
  return { url: `smtp://127.0.0.1:${port}`, taken, close }
}

function dropAll(smtp: SMTPServer) {
  for (const connection of (
    smtp as unknown as { connections: Set<{ _socket: { destroy(): void } }> }
  ).connections)
    connection._socket.destroy()
}
