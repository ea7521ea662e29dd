/**
 * `npm test`: from a fresh clone to a line `N passed, N failed`.
 * `npm test -- unit e2e` runs those steps only; anything that is no step's name is handed to the
 * test runners to choose files by.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { join } from 'node:path'

import { ensureDebianPackages } from './lib/debian.mjs'
import { launch } from './lib/launcher.mjs'
import { ensurePackages, requireNode } from './lib/packages.mjs'
import { ROOT } from './lib/paths.mjs'
import { say, sayError } from './lib/say.mjs'
import { isGood, lastLine, sum } from './lib/tally.mjs'
import { STEPS } from './lib/test-steps.mjs'
import { makeTestWorld } from './lib/test-world.mjs'

const LOCAL = join(ROOT, '.local/test')
const FAILED = { passed: 0, failed: 1, skipped: 0 }

const names = process.argv.slice(2).filter((each) => STEPS.some(({ name }) => name === each))
const filters = process.argv.slice(2).filter((each) => !names.includes(each))
const chosen = names.length > 0 ? STEPS.filter(({ name }) => names.includes(name)) : STEPS

async function main() {
  requireNode(ROOT)
  const owner = { what: 'A test run in this folder' }
  const lock = join(LOCAL, 'test.lock')
  // Half a test run is no success. What is lost during it fails the tests that stand on it.
  await launch({ local: LOCAL, lock, owner, whenStopped: 130, onLoss: sayError }, test)
}

async function test(fleet) {
  const results = new Map()
  try {
    const context = await prepare(fleet)
    const run = async (step) => results.set(step.name, await runStep(step, context, results))
    const isBeside = ({ beside }) => chosen.some(({ name }) => name === beside)
    for (const step of chosen.filter((each) => !isBeside(each))) {
      const others = chosen.filter(({ beside }) => beside === step.name)
      await Promise.all([run(step), inTurn(others, run)])
    }
  } catch (error) {
    if (fleet.isStopping) throw error
    sayError(error)
    results.set('set-up', FAILED)
  }
  report(results)
  return isGood(sum([...results.values()])) ? 0 : 1
}

async function inTurn(steps, run) {
  for (const step of steps) await run(step)
}

async function prepare(fleet) {
  const env = process.env
  const debian = [...new Set(chosen.flatMap((step) => step.debian ?? []))]
  await Promise.all([ensurePackages(fleet, ROOT, env), ensureDebianPackages(fleet, debian, env)])
  const world = chosen.some((step) => step.world) && (await makeTestWorld(fleet, LOCAL, env))
  return { fleet, env, world, local: LOCAL, filters }
}

async function runStep(step, context, results) {
  say(`${step.name}`)
  if (results.get(step.after)?.failed) {
    say(`${step.name} needs ${step.after}, which failed`)
    return FAILED
  }
  const began = Date.now()
  try {
    const tally = await step.run(context)
    say(`${step.name}: ${lastLine(tally)} in ${Math.round((Date.now() - began) / 1000)} s`)
    return tally
  } catch (error) {
    if (context.fleet.isStopping) throw error
    sayError(error)
    return FAILED
  }
}

function report(results) {
  const total = sum([...results.values()])
  process.stdout.write('\n')
  for (const [name, tally] of results) {
    const skipped = tally.skipped ? `, ${tally.skipped} skipped` : ''
    process.stdout.write(`  ${name.padEnd(12)} ${lastLine(tally)}${skipped}\n`)
  }
  process.stdout.write(`${lastLine(total)}\n`)
}

main().catch((error) => {
  sayError(error)
  process.exit(1)
})
