import { randomUUID } from 'node:crypto'
import { setTimeout as sleep } from 'node:timers/promises'

import { findFaketime } from '../lib/debian.mjs'

import { must, type Fault } from './fault'
import { expectUpload, read, readingOf, stateOf, upload } from './photographs'
import { seconds, until, type World } from './world'

/** Uploads a photograph whose reading has begun and waits for the store, which is silent. */
async function uploadStuckInReading(world: World): Promise<string> {
  const { jobsStore } = world.gates
  jobsStore.freeze()
  world.undo(() => jobsStore.thaw())
  const id = await upload(world, await world.newPicture())
  await until('its reading has begun', async () => (await stateOf(world, id)) === 'reading')
  return id
}

/** The job process. @throws Missed when there is none */
function jobsPid(world: World): number {
  const pid = world.ground.fleet.pidOf('jobs')
  must(pid, 'the job process does not run')
  return pid
}

/** Waits until the process is gone. @returns after how long, in milliseconds */
const ended = (pid: number, within: number) =>
  until(
    'the job process has ended',
    () => {
      try {
        return !process.kill(pid, 0)
      } catch {
        return true
      }
    },
    within,
  )

/** What happens to the job process. */
export const JOB_FAULTS: readonly Fault[] = [
  {
    name: 'worker-killed',
    what: 'the job process is killed (kill -9) in the middle of reading a photograph',
    expected:
      'it is started again and goes on with other photographs at once; the one it died over is read within 2 minutes',
    within: 180,
    async run(world) {
      const id = await uploadStuckInReading(world)
      const began = performance.now()
      process.kill(jobsPid(world), 'SIGKILL')
      world.gates.jobsStore.thaw()
      const next = await upload(world, await world.newPicture())
      const other = await read(world, next, 30)
      await read(world, id, 120 - (performance.now() - began) / 1000)
      return `the next photograph was read after ${seconds(other)}, the one it died over after ${seconds(performance.now() - began)}`
    },
  },
  {
    name: 'poison-job',
    what: 'a job that can never be done stands first in the queue',
    expected:
      'other photographs are read meanwhile, the job process lives, and the job is given up after its tries',
    within: 120,
    async run(world) {
      const pid = jobsPid(world)
      const poison = randomUUID()
      const { QUEUES } = await import('@/lib/jobs/queue')
      const { retryLimit } = QUEUES['read-photograph']
      await world.query(
        `INSERT INTO pgboss.job (id, name, data, priority, retry_limit, retry_delay, retry_backoff)
         VALUES ($1, 'read-photograph', '{"photographId": "no id at all"}', 100, $2, 1, false)`,
        [poison, retryLimit],
      )
      world.undo(() => world.query('DELETE FROM pgboss.job WHERE id = $1', [poison]))
      const took = await read(world, await upload(world, await world.newPicture()))
      const job = async () =>
        (
          await world.query<{ state: string; retry_count: number }>(
            'SELECT state, retry_count FROM pgboss.job WHERE id = $1',
            [poison],
          )
        )[0]
      await until('it is given up', async () => (await job())?.state === 'failed', 60)
      const tries = (await job())!.retry_count + 1
      must(tries === retryLimit + 1, `it was tried ${tries} times`)
      must(world.ground.fleet.pidOf('jobs') === pid, 'the job process did not live')
      return `a photograph behind it was read after ${seconds(took)}; given up after ${tries} tries, same process`
    },
  },
  {
    name: 'worker-told-to-stop',
    what: 'the job process is told to stop (SIGTERM) while it reads a photograph',
    expected:
      'it finishes what can be finished and ends; what cannot it gives back, and the next process does it at once',
    within: 150,
    async run(world) {
      const finishes = await uploadStuckInReading(world)
      const first = jobsPid(world)
      process.kill(first, 'SIGTERM')
      await sleep(1_500)
      world.gates.jobsStore.thaw()
      const ending = await ended(first, 25)
      const state = await stateOf(world, finishes)
      must(state === 'ready', `it ended and left the photograph ${state}`)
      const done = await readingOf(world, finishes)
      must(done?.state === 'completed', `it ended and left the job ${done?.state}`)

      await until('jobs are taken again', () => world.ground.fleet.pidOf('jobs') !== undefined)
      await sleep(2_000)
      const stuck = await uploadStuckInReading(world)
      const second = jobsPid(world)
      process.kill(second, 'SIGTERM')
      const given = await ended(second, 25)
      const back = await readingOf(world, stuck)
      must(
        back && ['retry', 'created', 'active'].includes(back.state),
        `it ended and left the job ${back?.state}`,
      )
      world.gates.jobsStore.thaw()
      const took = await read(world, stuck, 40)
      return `finished and ended after ${seconds(ending)}; with a silent store ended after ${seconds(given)} and gave the job back, read ${seconds(took)} after the store was there`
    },
  },
  {
    name: 'worker-clock-behind',
    what: 'the clock of the job process is 15 minutes behind (libfaketime)',
    expected:
      'photographs are read at once, and nothing is swept that is fresh by the clock of the others',
    within: 90,
    async run(world) {
      const { fleet } = world.ground
      await fleet.stop('jobs')
      world.undo(async () => {
        await fleet.stop('jobs')
        await world.startJobs()
      })
      await world.startJobs({
        LD_PRELOAD: findFaketime()!,
        FAKETIME: '-15m',
        // Only what the clock on the wall says: timers keep their time.
        FAKETIME_DONT_FAKE_MONOTONIC: '1',
        LOG_LEVEL: 'info',
      })
      const id = await upload(world, await world.newPicture())
      const took = await read(world, id, 45)
      const [row] = await world.query<{ behind: number }>(
        'SELECT extract(epoch FROM now() - updated_at)::int AS behind FROM photographs WHERE id = $1',
        [id],
      )
      must(row!.behind > 800, `its clock was only ${row!.behind} s behind`)
      await expectUpload(world, await world.newPicture())
      const sweep = await sweepIn(world)
      must((await stateOf(world, id)) === 'ready', 'the photograph was swept')
      return `read after ${seconds(took)} by a process ${row!.behind} s behind; its sweep, asked for at once, ${sweep}`
    },
  },
]

/** Has the job process sweep and waits for it. */
async function sweepIn(world: World): Promise<string> {
  const pending = await world.count(`photographs WHERE state = 'pending'`)
  const id = randomUUID()
  await world.query(`INSERT INTO pgboss.job (id, name, data) VALUES ($1, 'sweep-uploads', '{}')`, [
    id,
  ])
  await until(
    'it has swept',
    async () => (await world.count(`pgboss.job WHERE id = $1 AND state = 'completed'`, [id])) === 1,
    20,
  )
  const left = await world.count(`photographs WHERE state = 'pending'`)
  must(left === pending, `${pending - left} fresh uploads were swept`)
  return `left ${left} fresh uploads alone`
}
