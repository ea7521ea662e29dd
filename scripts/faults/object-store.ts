import { execFileSync } from 'node:child_process'
import { mkdirSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { settled } from './aftermath'
import { must, type Fault } from './fault'
import {
  announce,
  confirm,
  expectUpload,
  read,
  readingOf,
  send,
  stateOf,
  upload,
} from './photographs'
import { seconds, until, type World } from './world'

/** How many rows there are of a photograph. */
const rowsOf = (world: World, id: string) => world.count('photographs WHERE id = $1', [id])

/** Removes a photograph's file from the store behind the product's back. */
async function removeOriginal(world: World, id: string): Promise<void> {
  const { deleteObjects } = await import('@/lib/storage/objects')
  const [row] = await world.query<{ object_key: string }>(
    'SELECT object_key FROM photographs WHERE id = $1',
    [id],
  )
  await deleteObjects([row!.object_key])
}

/** A full disk in place of where the store keeps one kind of object; false when not allowed. */
function fillUp(world: World, kind: string): boolean {
  const { local, env } = world.ground
  const folder = join(local, 'uploads', env.S3_BUCKET!, kind)
  mkdirSync(folder, { recursive: true })
  try {
    execFileSync('mount', ['-t', 'tmpfs', '-o', 'size=4k', 'tmpfs', folder], { stdio: 'pipe' })
  } catch {
    return false
  }
  writeFileSync(join(folder, 'full'), Buffer.alloc(4096))
  let mounted = true
  world.undo(() => {
    if (mounted) execFileSync('umount', ['-l', folder], { stdio: 'pipe' })
    mounted = false
  })
  return true
}

/** What happens to the object store and to the way there. */
export const STORE_FAULTS: readonly Fault[] = [
  {
    name: 'store-refused',
    what: 'the object store refuses, then is silent, when a file is announced',
    expected: 'both times told in words within 4 s, and no row kept; then it is taken in',
    async run(world) {
      const { webStore } = world.gates
      const bytes = await world.newPicture()
      const rows = await world.count('photographs')
      world.undo(() => webStore.admit())
      await webStore.refuse()
      const refused = await announce(world, bytes)
      await webStore.admit()
      world.undo(() => webStore.thaw())
      webStore.freeze()
      const silent = await announce(world, bytes)
      for (const { status, answer } of [refused, silent]) {
        must(
          status === 503 && /try again/i.test(answer.message ?? ''),
          `announcing was answered ${status} ${JSON.stringify(answer)}`,
        )
      }
      must((await world.count('photographs')) === rows, 'a row was kept')
      webStore.thaw()
      await read(world, await upload(world, bytes))
      return `told after ${seconds(refused.ms)} and ${seconds(silent.ms)}; taken in and read afterwards`
    },
  },
  {
    name: 'store-dies-mid-upload',
    what: 'the object store dies in the middle of an upload',
    expected:
      'a confirmation is refused in words, the file is expected still; sending it again makes one photograph',
    async run(world) {
      const { browserStore } = world.gates
      const bytes = await world.newPicture()
      const expected = await expectUpload(world, bytes)
      let passed = 0
      world.undo(() => browserStore.tamper(undefined))
      browserStore.tamper((way, chunk, cut) => {
        passed += way === 'out' ? chunk.length : 0
        if (passed < bytes.length / 2) return chunk
        cut()
        return null
      })
      must(!(await send(expected, bytes)), 'the upload was not cut')
      browserStore.tamper(undefined)
      const { status, answer } = await confirm(world, expected)
      must(
        status === 422 && /arrived|sent/i.test(answer.message ?? ''),
        `the confirmation was answered ${status} ${JSON.stringify(answer)}`,
      )
      const id = await upload(world, bytes)
      must(
        id === expected.photographId || (await rowsOf(world, expected.photographId)) === 0,
        'two rows',
      )
      const took = await read(world, id)
      return `told in words; sent again, one photograph, read after ${seconds(took)}`
    },
  },
  {
    name: 'object-vanished',
    what: 'an object vanishes: before its confirmation, and between that and its reading',
    expected:
      'before: told to send it again, which works; between: the photograph says that its file is gone',
    async run(world) {
      const bytes = await world.newPicture()
      const expected = await expectUpload(world, bytes)
      must(await send(expected, bytes), 'the store did not take the file')
      await removeOriginal(world, expected.photographId)
      const { status, answer } = await confirm(world, expected)
      must(
        status === 422 && /send it again/i.test(answer.message ?? ''),
        `the confirmation was answered ${status} ${JSON.stringify(answer)}`,
      )
      await read(world, await upload(world, bytes))

      await world.ground.fleet.stop('jobs')
      const id = await upload(world, await world.newPicture())
      // It was acknowledged, and then lost by the store: what must stay is that it is told.
      world.acknowledge('photographs', id, { state: 'failed' })
      await removeOriginal(world, id)
      await world.startJobs()
      await until(
        'the photograph has failed',
        async () => (await stateOf(world, id)) === 'failed',
        30,
      )
      const [row] = await world.query<{ failure: string }>(
        'SELECT failure FROM photographs WHERE id = $1',
        [id],
      )
      must(/file is gone/i.test(row!.failure), `it says: ${row!.failure}`)
      return `“${answer.message}”, and sent again read; later: “${row!.failure}”`
    },
  },
  {
    name: 'bytes-not-as-declared',
    what: 'the bytes that arrive are not those that were declared',
    expected: 'refused in words, and neither row nor object kept',
    async run(world) {
      const bytes = await world.newPicture()
      const expected = await expectUpload(world, bytes)
      const other = Buffer.from(bytes)
      other.writeUInt8(other.at(-40)! ^ 1, other.length - 40)
      must(await send(expected, other), 'the store did not take the file')
      const { headObject } = await import('@/lib/storage/objects')
      const [row] = await world.query<{ object_key: string }>(
        'SELECT object_key FROM photographs WHERE id = $1',
        [expected.photographId],
      )
      const { status, answer } = await confirm(world, expected)
      must(
        status === 422 && (answer.message ?? '') !== '',
        `the confirmation was answered ${status} ${JSON.stringify(answer)}`,
      )
      must((await rowsOf(world, expected.photographId)) === 0, 'its row was kept')
      must((await headObject(row!.object_key)) === null, 'its object was kept')
      return `“${answer.message}”; nothing kept`
    },
  },
  {
    name: 'confirmation-lost',
    what: 'the answer to a confirmation is lost; another file is never confirmed',
    expected:
      'confirming again gives the same answer and one job; the unconfirmed file is swept, row and object',
    async run(world) {
      const bytes = await world.newPicture()
      const expected = await expectUpload(world, bytes)
      must(await send(expected, bytes), 'the store did not take the file')
      const letGo = await world.hold('LOCK TABLE photographs IN SHARE MODE')
      const gone = new AbortController()
      const first = confirm(world, expected, gone.signal).then(
        () => 'answered',
        () => 'cut',
      )
      await world.waitForLocked(1)
      gone.abort()
      must((await first) === 'cut', 'the answer came before it was cut')
      await letGo()
      await until(
        'it is taken in',
        async () => (await stateOf(world, expected.photographId)) !== 'pending',
      )
      const { answer } = await confirm(world, expected)
      must(
        answer.kind === 'added' && answer.photographId === expected.photographId,
        `confirming again was answered ${JSON.stringify(answer)}`,
      )
      const jobs = await world.count(
        `pgboss.job WHERE name = 'read-photograph' AND data->>'photographId' = $1`,
        [expected.photographId],
      )
      must(jobs === 1, `there are ${jobs} jobs to read it`)
      await read(world, expected.photographId)

      const never = await expectUpload(world, await world.newPicture())
      const { sweepUploads } = await import('@/lib/photographs/sweep')
      await sweepUploads()
      must((await rowsOf(world, never.photographId)) === 1, 'a fresh upload was swept')
      const { uploads } = await sweepUploads({ pending: 0 })
      must(uploads === 1, `${uploads} uploads were swept`)
      return 'taken in unheard; again the same answer, one job, read; the unconfirmed one was swept only when old'
    },
  },
  {
    name: 'disk-full',
    what: 'the disk of the object store is full',
    expected:
      'an upload fails, is told in words and kept nowhere by halves; copies wait; both go through once there is room',
    within: 120,
    async run(world) {
      const bytes = await world.newPicture()
      const real = fillUp(world, 'originals')
      if (!real) await world.gates.browserStore.refuse()
      world.undo(() => world.gates.browserStore.admit())
      const expected = await expectUpload(world, bytes)
      const taken = await send(expected, bytes)
      await until('the store is there', () => storeAnswers(world))
      const { status, answer } = await confirm(world, expected)
      must(status === 422 || status === 503, `confirming was answered ${status}, taken: ${taken}`)
      await world.mend()
      await until('the store is there', () => storeAnswers(world))
      const id = await upload(world, bytes)
      await read(world, id)
      if (!real)
        return 'root may not mount here: the store refused in its place; told, then taken in'

      // The copies for the screen are written by the job.
      await settled(world)
      await world.ground.fleet.stop('jobs')
      const second = await upload(world, await world.newPicture())
      fillUp(world, 'derivatives')
      await world.startJobs()
      await until(
        'the copies were tried',
        async () => (await readingOf(world, second))?.state === 'retry',
        30,
      )
      await world.mend()
      await read(world, second, 60)
      return `a full tmpfs as its disk: the upload ${taken ? 'lost after the store took it' : 'refused'}, then “${answer.message}”; read once there was room`
    },
  },
]

async function storeAnswers(world: World): Promise<boolean> {
  return fetch(world.ground.env.S3_ENDPOINT!).then(
    () => true,
    () => false,
  )
}
