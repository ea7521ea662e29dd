import { connect, createServer } from 'node:net'
import { setTimeout as sleep } from 'node:timers/promises'

import { Refusal } from './say.mjs'

/** Whether nobody listens on this port of the host yet. */
export function isPortFree(port, host = '127.0.0.1') {
  return new Promise((done, fail) => {
    const probe = createServer()
    probe.once('error', (error) => {
      if (error.code === 'EADDRINUSE') done(false)
      else fail(bindProblem(error, port, host))
    })
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => done(true)))
  })
}

function bindProblem(error, port, host) {
  if (error.code === 'EACCES') {
    return new Refusal(`Port ${port} may not be used by an ordinary user. Choose one above 1023.`)
  }
  if (error.code === 'EADDRNOTAVAIL' || error.code === 'ENOTFOUND') {
    return new Refusal(`This machine has no address "${host}". Set HOST to one it has.`)
  }
  return error
}

/**
 * Makes sure a port is ours to take.
 * @throws {Refusal} naming the port, what wants it and the setting that changes it
 */
export async function requireFreePort({ port, host = '127.0.0.1', purpose, setting }) {
  if (await isPortFree(port, host)) return
  throw new Refusal(
    `Port ${port} is already taken by another program, and ${purpose} needs one: ` +
      `stop that program, or choose another port with ${setting}=<number>.`,
  )
}

/** As many different free ports of the loopback as asked for, picked by the system. */
export async function findFreePorts(count) {
  const servers = await Promise.all(Array.from({ length: count }, openAnywhere))
  const ports = servers.map((server) => server.address().port)
  await Promise.all(servers.map((server) => new Promise((done) => server.close(done))))
  return ports
}

function openAnywhere() {
  return new Promise((done, fail) => {
    const server = createServer()
    server.once('error', fail)
    server.listen({ port: 0, host: '127.0.0.1' }, () => done(server))
  })
}

/**
 * Waits until something accepts connections on the port; false when `alive` says to give up.
 * @param {number} port
 * @param {{host?: string, within?: number, alive?: () => boolean}} [options] `within` in milliseconds
 */
export async function waitForPort(port, { host = '127.0.0.1', within = 30_000, alive } = {}) {
  const deadline = Date.now() + within
  while (Date.now() < deadline && (alive?.() ?? true)) {
    if (await accepts(port, host)) return true
    await sleep(60)
  }
  return false
}

function accepts(port, host) {
  return new Promise((done) => {
    const socket = connect({ port, host, timeout: 1000 })
    const end = (answer) => {
      socket.destroy()
      done(answer)
    }
    socket.once('connect', () => end(true))
    socket.once('error', () => end(false))
    socket.once('timeout', () => end(false))
  })
}
