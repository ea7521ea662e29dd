import { spawn } from 'node:child_process'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'

import { beforeEach, describe, expect, onTestFinished, test, vi } from 'vitest'

import { beginningOf, readLivingIdentity, writeIdentity } from '../../../scripts/lib/identity.mjs'
import { takeLock } from '../../../scripts/lib/lock.mjs'
import { Fleet, stopLeftovers } from '../../../scripts/lib/processes.mjs'
import { temporaryFolder } from './temporary-folder'

const FOREVER = 'setInterval(() => {}, 1000)'

let local: string
let fleet: Fleet
let onLoss: ReturnType<typeof vi.fn<(error: Error) => void>>

beforeEach(() => {
  local = temporaryFolder()
  onLoss = vi.fn<(error: Error) => void>()
  fleet = new Fleet({ local, onLoss })
  onTestFinished(() => fleet.killAll())
})

const node = (name: string, script: string, more: object = {}) =>
  fleet.start({ name, command: process.execPath, args: ['-e', script], ...more })

const pidOf = (name: string) => readLivingIdentity(join(local, 'run', `${name}.json`))?.pid

describe('stopping', () => {
  test('goes in the reverse of the order of starting, one after the other', async () => {
    const diary = join(local, 'diary')
    const dutiful = (name: string) =>
      `process.on('SIGTERM', () => setTimeout(() => {
         require('fs').appendFileSync(${JSON.stringify(diary)}, '${name} '); process.exit() }, 50));
       console.log('ready'); ${FOREVER}`
    for (const name of ['database', 'jobs', 'web']) {
      await node(name, dutiful(name))
      await vi.waitFor(() => expect(fleet.tail(name)).toBe('ready'), 5000)
    }
    await fleet.stopAll()
    expect(readFileSync(diary, 'utf8')).toBe('web jobs database ')
    expect(onLoss).not.toHaveBeenCalled()
  })

  test('of one process alone leaves the others, and its name can be used again', async () => {
    await node('web-a', FOREVER, { restart: true })
    await node('web-b', FOREVER)
    await fleet.stop('web-a', 'SIGKILL')
    expect(pidOf('web-a')).toBeUndefined()
    expect(fleet.isRunning('web-a')).toBe(false)
    expect(fleet.isRunning('web-b')).toBe(true)
    await node('web-a', FOREVER)
    expect(fleet.isRunning('web-a')).toBe(true)
    expect(onLoss).not.toHaveBeenCalled()
  })

  test('ends by force what does not listen', async () => {
    await node('deaf', `process.on('SIGTERM', () => {}); console.log('ready'); ${FOREVER}`, {
      stopWithin: 100,
    })
    await vi.waitFor(() => expect(fleet.tail('deaf')).toBe('ready'), 5000)
    const pid = pidOf('deaf')!
    await fleet.stopAll()
    expect(beginningOf(pid)).toBeUndefined()
  })

  test('one process only leaves the others, is no loss, and lets it be started anew', async () => {
    await node('database', FOREVER, { restart: true })
    await node('jobs', FOREVER, { restart: true })
    const [database, jobs] = [fleet.pidOf('database')!, fleet.pidOf('jobs')!]
    expect(await fleet.stop('jobs')).toBe('SIGTERM')
    expect(beginningOf(jobs)).toBeUndefined()
    expect(fleet.pidOf('jobs')).toBeUndefined()
    await node('jobs', FOREVER)
    expect(fleet.pidOf('jobs')).not.toBe(jobs)
    expect(fleet.pidOf('database')).toBe(database)
    expect(onLoss).not.toHaveBeenCalled()
  })

  test('one that is about to be started again keeps it stopped', async () => {
    await node('jobs', FOREVER, { restart: true })
    const pid = fleet.pidOf('jobs')!
    process.kill(pid, 'SIGKILL')
    await vi.waitFor(() => expect(fleet.pidOf('jobs')).toBeUndefined(), 5000)
    await fleet.stop('jobs')
    // Longer than it waits before it starts one again.
    await sleep(800)
    expect(pidOf('jobs')).toBeUndefined()
  })

  test('nothing can be started any more', async () => {
    await fleet.stopAll()
    await expect(node('late', FOREVER)).rejects.toThrow('Stopped')
  })
})

describe('a process that dies', () => {
  test('is started again when it is to be', async () => {
    await node('jobs', FOREVER, { restart: true })
    const first = pidOf('jobs')!
    process.kill(first, 'SIGKILL')
    await vi.waitFor(() => {
      expect(pidOf('jobs')).toBeDefined()
      expect(pidOf('jobs')).not.toBe(first)
    }, 5000)
    expect(onLoss).not.toHaveBeenCalled()
  })

  test('is a loss otherwise, told with where its last words are', async () => {
    await node('web', 'console.error("no such page"); process.exit(3)')
    await vi.waitFor(() => expect(onLoss).toHaveBeenCalledOnce(), 5000)
    expect(onLoss.mock.calls[0]![0].message).toMatch(/web ended unexpectedly \(code 3\).*web\.log/)
    await vi.waitFor(() => expect(fleet.tail('web')).toBe('no such page'))
  })

  test('a program that is not there is a sentence', async () => {
    const start = fleet.start({ name: 'web', command: '/nowhere/program', args: [] })
    await expect(start).rejects.toThrow(/^web could not be started/)
  })
})

describe('a command', () => {
  const run = (script: string, within?: number) =>
    fleet.run({ command: process.execPath, args: ['-e', script], within })

  test('gives its exit code', async () => {
    expect(await run('process.exit(7)')).toBe(7)
  })

  test('that takes too long is ended and counts as failed', async () => {
    expect(await run(FOREVER, 200)).toBe(1)
  })
})

describe('what an earlier launcher left', () => {
  test('is stopped, and its note removed', async () => {
    const orphan = spawn(process.execPath, ['-e', FOREVER], { detached: true, stdio: 'ignore' })
    writeIdentity(join(local, 'run/jobs.json'), orphan.pid!)
    expect(await stopLeftovers(local)).toEqual(['jobs'])
    expect(beginningOf(orphan.pid!)).toBeUndefined()
    expect(existsSync(join(local, 'run/jobs.json'))).toBe(false)
  })

  test('a process that merely got the same number is left alone', async () => {
    const stranger = spawn(process.execPath, ['-e', FOREVER], { stdio: 'ignore' })
    onTestFinished(() => void stranger.kill('SIGKILL'))
    writeFileSync(
      join(local, 'run/jobs.json'),
      JSON.stringify({ pid: stranger.pid, beginning: '1' }),
    )
    expect(await stopLeftovers(local)).toEqual([])
    await sleep(100)
    expect(stranger.exitCode ?? stranger.signalCode).toBeNull()
  })
})

describe('the lock', () => {
  const owner = { what: 'Woadmap', address: 'http://localhost:3000' }

  test('held by another living process is refused with its address', () => {
    const path = join(local, 'start.lock')
    writeIdentity(path, process.ppid, owner)
    expect(() => takeLock(path, owner)).toThrow(
      /^Woadmap is already running at http:\/\/localhost:3000 \(process \d+\)/,
    )
  })

  test.each([
    ['of a process that has ended', { pid: 2 ** 22 + 1, beginning: '5' }],
    ['of a number that was handed out again', { pid: process.ppid, beginning: '1' }],
    ['that was half written', '{"pid": 12'],
  ])('%s is taken over', (_, content) => {
    const path = join(local, 'start.lock')
    writeFileSync(path, typeof content === 'string' ? content : JSON.stringify(content))
    const release = takeLock(path, owner)
    expect(readLivingIdentity(path)).toMatchObject({ pid: process.pid })
    release()
    expect(existsSync(path)).toBe(false)
  })
})
