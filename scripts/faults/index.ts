import { cpus, loadavg } from 'node:os'
import { setTimeout as sleep } from 'node:timers/promises'

import { Refusal } from '../lib/say.mjs'

import { findDamage, settled } from './aftermath'
import { DATABASE_FAULTS } from './database'
import { EDITOR_FAULTS } from './editors'
import { Missed, type Fault } from './fault'
import { JOB_FAULTS } from './jobs'
import { MAIL_FAULTS } from './mail'
import { STORE_FAULTS } from './object-store'
import { WEB_FAULTS } from './web'
import { PATIENCE, seconds, World, type Ground } from './world'

/** Every fault, in the order in which they are run. */
export const FAULTS: readonly Fault[] = [
  ...DATABASE_FAULTS,
  ...STORE_FAULTS,
  ...JOB_FAULTS,
  ...MAIL_FAULTS,
  ...WEB_FAULTS,
  ...EDITOR_FAULTS,
]

/** The faults of these names; all when none is named. @throws Refusal naming them when one is unknown */
export function chooseFaults(names: readonly string[]): readonly Fault[] {
  const unknown = names.filter((name) => !FAULTS.some((fault) => fault.name === name))
  if (unknown.length > 0) {
    const list = FAULTS.map(({ name, what }) => `  ${name.padEnd(24)} ${what}`).join('\n')
    throw new Refusal(`There is no fault ${unknown.join(', ')}. These there are:\n\n${list}`)
  }
  return names.length > 0 ? FAULTS.filter(({ name }) => names.includes(name)) : FAULTS
}

/** Runs the faults one after another and prints each. @returns the exit code: 1 when one missed */
export async function runFaults(faults: readonly Fault[], ground: Ground): Promise<number> {
  const world = await World.open(ground)
  // The demo's photographs are read and copied before anything breaks.
  await settled(world, 120)
  let missed = 0
  for (const fault of faults) {
    const began = performance.now()
    const { seen, wrong } = await runFault(world, fault)
    const took = seconds(performance.now() - began)
    console.log(
      [
        `\n${wrong.length === 0 ? 'met   ' : 'MISSED'}  ${fault.name}: ${fault.what} (${took})`,
        `        expected: ${fault.expected}`,
        `        seen:     ${[seen, ...wrong].filter(Boolean).join('\n                  ')}`,
      ].join('\n'),
    )
    if (wrong.length > 0) missed++
  }
  console.log(
    missed === 0
      ? `\nEach of ${faults.length} faults went as expected: no acknowledged write lost, no half state, an answer within ${seconds(PATIENCE)}, ready again within 10 s, nothing left over after the sweep.`
      : `\n${missed} of ${faults.length} missed.`,
  )
  return missed === 0 ? 0 : 1
}

async function runFault(world: World, fault: Fault): Promise<{ seen: string; wrong: string[] }> {
  const wrong: string[] = []
  const look = async <T>(work: () => Promise<T>): Promise<T | undefined> => {
    try {
      return await work()
    } catch (error) {
      wrong.push(error instanceof Missed ? error.message : String((error as Error).stack ?? error))
      return undefined
    }
  }
  world.takeWaits()
  const seen = await look(() => inTime(fault))
  await look(() => world.mend())
  const recovered = await look(() => world.healthy())
  const slow = world.takeWaits().filter(({ ms }) => ms > PATIENCE)
  if (slow.length > 0) {
    const { what, ms } = slow.reduce((a, b) => (b.ms > a.ms ? b : a))
    const load = loadavg()[0]!.toFixed(1)
    wrong.push(
      `${slow.length} answers took more than ${seconds(PATIENCE)}, the slowest (${what}) ${seconds(ms)}; the load of this machine is ${load} on ${cpus().length} processors`,
    )
  }
  if (recovered !== undefined) {
    wrong.push(...((await look(() => findDamage(world))) ?? []))
  }
  return { seen: seen ?? '', wrong }

  async function inTime({ run, within = 60 }: Fault): Promise<string> {
    const late = sleep(within * 1000, undefined, { ref: false }).then(() => {
      throw new Missed(`not over after ${within} s`)
    })
    const running = run(world)
    running.catch(() => {})
    return Promise.race([running, late])
  }
}
