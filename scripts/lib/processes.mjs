import { spawn } from 'node:child_process'
import { createWriteStream, mkdirSync, openSync, readFileSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'

import { beginningOf, dropIdentity, readLivingIdentity, writeIdentity } from './identity.mjs'
import { Refusal, say } from './say.mjs'

/** A process that lives this long, in milliseconds, has recovered: its next death counts as first. */
const RECOVERED_AFTER = 30_000
const DEATHS_IN_A_ROW = 6

/**
 * The processes a launcher has started: kept running, and stopped in the reverse of the order in
 * which they were started.
 *
 * Each child leads its own process group, so that a Ctrl-C in the terminal reaches the launcher
 * alone and the order of stopping is ours; each is noted in a file under `run/`, so that the next
 * start can find what a killed launcher left behind.
 */
export class Fleet {
  /** @type {Map<string, {spec: object, child: import('node:child_process').ChildProcess}>} */
  #services = new Map()
  #tasks = new Set()
  #stopping = false

  /**
   * @param {{local: string, onLoss: (error: Refusal) => void}} options `local` holds run/ and logs/;
   *   `onLoss` is told when a process that matters has ended for good
   */
  constructor({ local, onLoss }) {
    this.runFolder = join(local, 'run')
    this.logFolder = join(local, 'logs')
    this.onLoss = onLoss
    mkdirSync(this.runFolder, { recursive: true })
    mkdirSync(this.logFolder, { recursive: true })
  }

  /**
   * Starts a process that is to stay.
   * @param {{name: string, command: string, args: string[], env?: NodeJS.ProcessEnv, cwd?: string, uid?: number,
   *   gid?: number, show?: boolean, restart?: boolean, stopSignal?: NodeJS.Signals, stopWithin?: number}} spec
   *   `show` also prints its output; `restart` starts it again, ever more slowly, when it dies
   */
  async start(spec) {
    await this.#launch({ stopSignal: 'SIGTERM', stopWithin: 5000, ...spec }, 0)
  }

  /** Whether everything is being stopped: what fails from now on fails for that reason. */
  get isStopping() {
    return this.#stopping
  }

  /** Whether the named process runs at this moment. */
  isRunning(name) {
    const service = this.#services.get(name)
    return service !== undefined && !hasEnded(service.child)
  }

  /** The id of the named process; undefined while it does not run. */
  pidOf(name) {
    return this.isRunning(name) ? this.#services.get(name).child.pid : undefined
  }

  /**
   * Stops one process for good, by its own signal or another; it may then be started anew under
   * its name.
   * @returns {Promise<NodeJS.Signals | number | null>} what ended it: a signal or its exit code
   */
  async stop(name, signal) {
    const service = this.#services.get(name)
    if (!service) return null
    this.#services.delete(name)
    const { child, spec } = service
    await stopChild(child, signal ?? spec.stopSignal, spec.stopWithin)
    dropIdentity(this.#identityFile(name))
    return child.signalCode ?? child.exitCode
  }

  /**
   * Runs a command to its end.
   * @param {{command: string, args: string[], env?: NodeJS.ProcessEnv, cwd?: string, within?: number}} spec
   * @returns {Promise<number>} its exit code; 1 when a signal or `within` milliseconds ended it
   */
  async run({ command, args, env, cwd, within }) {
    this.#refuseWhileStopping()
    const child = spawn(command, args, {
      env,
      cwd,
      stdio: ['ignore', 'inherit', 'inherit'],
      detached: true,
    })
    this.#tasks.add(child)
    const timer = within && setTimeout(() => signalGroup(child, 'SIGKILL'), within)
    try {
      const code = await new Promise((done, fail) => {
        child.once('error', (error) =>
          fail(new Refusal(`${command} could not be run: ${error.message}`)),
        )
        child.once('exit', (exitCode) => done(exitCode ?? 1))
      })
      this.#refuseWhileStopping()
      return code
    } finally {
      clearTimeout(timer)
      this.#tasks.delete(child)
    }
  }

  /** The end of what a process wrote, for an error's sake. */
  tail(name, lines = 15) {
    try {
      return readFileSync(join(this.logFolder, `${name}.log`), 'utf8')
        .trim()
        .split('\n')
        .slice(-lines)
        .join('\n')
    } catch {
      return ''
    }
  }

  /** Stops everything, last started first; nothing outlives its own `stopWithin`. */
  async stopAll() {
    this.#stopping = true
    for (const task of this.#tasks) signalGroup(task, 'SIGTERM')
    for (const [name, { spec, child }] of [...this.#services].reverse()) {
      await stopChild(child, spec.stopSignal, spec.stopWithin)
      dropIdentity(this.#identityFile(name))
    }
    await Promise.all([...this.#tasks].map((task) => stopChild(task, 'SIGTERM', 3000)))
  }

  /** Kills everything at once: the way out when stopping takes too long. */
  killAll() {
    this.#stopping = true
    for (const { child } of this.#services.values()) signalGroup(child, 'SIGKILL')
    for (const task of this.#tasks) signalGroup(task, 'SIGKILL')
  }

  async #launch(spec, deaths) {
    this.#refuseWhileStopping()
    const { name, command, args, env, cwd, uid, gid } = spec
    const log = openLog(join(this.logFolder, `${name}.log`), deaths > 0)
    const child = spawn(command, args, {
      env,
      cwd,
      uid,
      gid,
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe'],
    })
    for (const stream of [child.stdout, child.stderr]) {
      stream.on('data', (chunk) => log.write(chunk))
      if (spec.show) printLines(stream, name)
    }
    // Before anything is waited for, so that stopping finds it.
    this.#services.set(name, { spec, child })
    child.once('close', () => log.end())
    await new Promise((done, fail) => {
      child.once('spawn', done)
      child.once('error', (error) =>
        fail(new Refusal(`${name} could not be started: ${error.message}`)),
      )
    })
    const began = Date.now()
    writeIdentity(this.#identityFile(name), child.pid)
    child.once('exit', (code, signal) => {
      if (this.#isDismissed(name, child)) return
      const inARow = Date.now() - began > RECOVERED_AFTER ? 1 : deaths + 1
      void this.#afterDeath(spec, child, inARow, signal ?? `code ${code}`)
    })
  }

  async #afterDeath(spec, child, deaths, how) {
    const log = join(this.logFolder, `${spec.name}.log`)
    if (!spec.restart || deaths >= DEATHS_IN_A_ROW) {
      this.onLoss(
        new Refusal(`${spec.name} ended unexpectedly (${how}). Its last words are in ${log}.`),
      )
      return
    }
    const pause = Math.min(250 * 2 ** deaths, 10_000)
    say(`${spec.name} ended (${how}); starting it again in ${pause / 1000} s`)
    await sleep(pause, undefined, { ref: false })
    if (this.#isDismissed(spec.name, child)) return
    await this.#launch(spec, deaths).catch(this.onLoss)
  }

  #isDismissed(name, child) {
    return this.#stopping || this.#services.get(name)?.child !== child
  }

  #identityFile(name) {
    return join(this.runFolder, `${name}.json`)
  }

  #refuseWhileStopping() {
    if (this.#stopping) throw new Refusal('Stopped.')
  }
}

/**
 * Stops what a launcher that was killed left running in this local folder. Call it only while
 * holding the folder's lock.
 * @returns {Promise<string[]>} the names of what was stopped
 */
export async function stopLeftovers(local) {
  const folder = join(local, 'run')
  mkdirSync(folder, { recursive: true })
  const stopped = []
  for (const file of readdirSync(folder).filter((name) => name.endsWith('.json'))) {
    const path = join(folder, file)
    const identity = readLivingIdentity(path)
    if (identity) {
      await stopStranger(identity.pid)
      stopped.push(file.replace(/\.json$/, ''))
    }
    dropIdentity(path)
  }
  return stopped
}

/** Ends a process that is not our child: SIGINT (PostgreSQL's fast shutdown) first, then by force. */
export async function stopStranger(pid, within = 8000) {
  const beginning = beginningOf(pid)
  trySignal(pid, 'SIGINT')
  const deadline = Date.now() + within
  while (beginningOf(pid) === beginning && beginning !== undefined) {
    if (Date.now() > deadline) trySignal(-pid, 'SIGKILL')
    await sleep(50)
    if (Date.now() > deadline + 2000) {
      throw new Refusal(
        `Process ${pid}, left by an earlier run, does not end. Stop it with kill -9 ${pid}.`,
      )
    }
  }
}

async function stopChild(child, signal, within) {
  if (hasEnded(child)) return
  const ended = new Promise((done) => child.once('exit', done))
  // To the leader only: it knows how to end its own children in order. By force, to all of them.
  trySignal(child.pid, signal)
  const timer = setTimeout(() => signalGroup(child, 'SIGKILL'), within)
  await ended
  clearTimeout(timer)
}

function hasEnded(child) {
  return child.exitCode !== null || child.signalCode !== null || child.pid === undefined
}

function signalGroup(child, signal) {
  if (child.pid !== undefined) trySignal(-child.pid, signal)
}

function trySignal(pid, signal) {
  try {
    return process.kill(pid, signal)
  } catch {
    return false
  }
}

function openLog(path, append) {
  const log = createWriteStream(path, { fd: openSync(path, append ? 'a' : 'w') })
  // A full disk loses words, not the product.
  log.on('error', () => {})
  return log
}

function printLines(stream, name) {
  let rest = ''
  stream.setEncoding('utf8')
  stream.on('data', (chunk) => {
    const lines = (rest + chunk).split('\n')
    rest = lines.pop()
    for (const line of lines) process.stdout.write(`${name.padEnd(4)} | ${line}\n`)
  })
}
