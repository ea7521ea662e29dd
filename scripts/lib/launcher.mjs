import { accessSync, constants, mkdirSync } from 'node:fs'

import { takeLock } from './lock.mjs'
import { Fleet, stopLeftovers } from './processes.mjs'
import { Refusal, say, sayError } from './say.mjs'

/** However hard something clings, we are gone this many milliseconds after being asked to stop. */
const DEADLINE = 25_000

/**
 * Runs `work` with a fleet of processes in a local folder that nobody else uses meanwhile, and
 * stops all of them when it ends, fails, a process that matters is lost, or somebody says stop
 * (Ctrl-C, SIGTERM, a closed terminal). Ends this process.
 * @param {{local: string, lock: string, owner: {what: string, address?: string}, whenStopped?: number,
 *   onLoss?: (error: Error) => void}} options `whenStopped` is the exit code when somebody says stop;
 *   `onLoss` is told of a lost process in place of ending everything
 * @param {(fleet: Fleet, untilStopped: Promise<void>) => Promise<number>} work gives the exit code
 */
export async function launch({ local, lock, owner, whenStopped = 0, onLoss }, work) {
  requireWritable(local)
  const release = takeLock(lock, owner)
  let stop
  const stopped = new Promise((done, fail) => {
    stop = { quietly: done, because: fail }
  })
  const fleet = new Fleet({ local, onLoss: onLoss ?? stop.because })
  let signalled = false
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      signalled = true
      stop.quietly()
    })
  }
  // A closed terminal must not keep us from stopping what we started.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})

  let code = 0
  try {
    for (const name of await stopLeftovers(local)) say(`Stopped ${name}, left by an earlier run`)
    const running = work(fleet, stopped)
    running.catch(() => {})
    code = (await Promise.race([running, stopped])) ?? whenStopped
  } catch (error) {
    code = 1
    if (!signalled) sayError(error)
  }
  setTimeout(() => {
    fleet.killAll()
    process.exit(1)
  }, DEADLINE).unref()
  if (signalled) say('Stopping')
  await fleet.stopAll()
  release()
  if (signalled) say('Stopped')
  process.exit(code)
}

function requireWritable(folder) {
  try {
    mkdirSync(folder, { recursive: true })
    accessSync(folder, constants.R_OK | constants.W_OK | constants.X_OK)
  } catch (error) {
    throw new Refusal(
      `Woadmap may not write to ${folder} (${error.code}). It probably belongs to another user: ` +
        'start as that user, or set WOADMAP_LOCAL=<folder of your own>.',
    )
  }
}
