import { createServer } from 'node:net'

import { expect, onTestFinished, test } from 'vitest'

import {
  findFreePorts,
  isPortFree,
  requireFreePort,
  waitForPort,
} from '../../../scripts/lib/ports.mjs'

async function listenSomewhere(): Promise<number> {
  const server = createServer()
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done))
  onTestFinished(() => void server.close())
  return (server.address() as { port: number }).port
}

test('a taken port is refused in a sentence that names it and the setting that changes it', async () => {
  const port = await listenSomewhere()
  const wanted = { port, purpose: 'the local database', setting: 'LOCAL_DATABASE_PORT' }
  await expect(requireFreePort(wanted)).rejects.toThrow(
    new RegExp(`^Port ${port} is already taken.*the local database.*LOCAL_DATABASE_PORT=<number>`),
  )
  await expect(requireFreePort(wanted)).rejects.toMatchObject({ name: 'Refusal' })
})

test('free ports are different ones, and free', async () => {
  const ports = await findFreePorts(4)
  expect(new Set(ports).size).toBe(4)
  for (const port of ports) expect(await isPortFree(port)).toBe(true)
})

test('an address this machine does not have is refused by name', async () => {
  await expect(isPortFree(4199, '203.0.113.7')).rejects.toThrow(/no address "203\.0\.113\.7"/)
})

test('waiting for a port ends when it accepts, and when whoever should listen is gone', async () => {
  expect(await waitForPort(await listenSomewhere())).toBe(true)
  const [port] = (await findFreePorts(1)) as [number]
  expect(await waitForPort(port, { alive: () => false })).toBe(false)
})
