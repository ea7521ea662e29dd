import { dropIdentity, readLivingIdentity, writeIdentity } from './identity.mjs'
import { Refusal } from './say.mjs'

/**
 * Makes sure that one launcher at a time uses a local folder. A lock whose owner is gone is simply
 * taken over.
 * @param {string} path the lock file
 * @param {{what: string, address?: string}} owner what a second one is told is running
 * @returns {() => void} lets go of the lock
 * @throws {Refusal} when another launcher holds it
 */
export function takeLock(path, owner) {
  const holder = readLivingIdentity(path)
  if (holder && holder.pid !== process.pid) {
    const where = holder.address ? ` at ${holder.address}` : ''
    throw new Refusal(
      `${holder.what} is already running${where} (process ${holder.pid}). ` +
        'Use that one, or stop it with Ctrl-C in its own terminal and start again.',
    )
  }
  writeIdentity(path, process.pid, owner)
  return () => {
    if (readLivingIdentity(path)?.pid === process.pid) dropIdentity(path)
  }
}
