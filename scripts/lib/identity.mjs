import { mkdirSync, readFileSync, readlinkSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'

/**
 * When a process began, in the kernel's ticks. With the process id it names one process for good:
 * ids are handed out again, a (id, beginning) pair is not.
 * @returns {string | undefined} undefined when there is no such process, or no /proc to ask
 */
export function beginningOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'latin1')
    // The second field is the program's name in brackets and may hold anything, spaces included.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ')
    // A zombie (Z) has ended; only its parent has not noticed.
    return fields[0] === 'Z' ? undefined : fields[19]
  } catch {
    return undefined
  }
}

/** Where a process stands, or undefined when it is gone or not ours to ask about. */
export function folderOf(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`)
  } catch {
    return undefined
  }
}

/** Writes which process this file stands for, in one step. */
export function writeIdentity(path, pid, more = {}) {
  mkdirSync(dirname(path), { recursive: true })
  const draft = `${path}.${process.pid}`
  writeFileSync(draft, JSON.stringify({ pid, beginning: beginningOf(pid), ...more }))
  renameSync(draft, path)
}

/** What writeIdentity wrote, when that very process still lives; undefined otherwise. */
export function readLivingIdentity(path) {
  let identity
  try {
    identity = JSON.parse(readFileSync(path, 'utf8'))
  } catch {
    return undefined
  }
  if (!Number.isInteger(identity.pid) || identity.pid <= 0) return undefined
  if (identity.beginning !== undefined) {
    return beginningOf(identity.pid) === identity.beginning ? identity : undefined
  }
  return isAlive(identity.pid) ? identity : undefined
}

/** Forgets a process file. */
export function dropIdentity(path) {
  rmSync(path, { force: true })
}

function isAlive(pid) {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return error.code === 'EPERM'
  }
}
