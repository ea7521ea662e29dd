import { createHash } from 'node:crypto'

import { must } from './fault'
import { BRAND, LINE, until, type World } from './world'

const PHOTOGRAPHS = `/api/brands/${BRAND}/photographs`

/** Where the product wants a file to be sent. */
export interface Expected {
  photographId: string
  post: { url: string; fields: Record<string, string> }
}

/** Announces a file to the product, as the page does. */
export function announce(world: World, bytes: Buffer, fileName = 'bad-day.jpg') {
  return world.designer.json<Expected & { kind: string; code?: string; message?: string }>(
    PHOTOGRAPHS,
    'POST',
    {
      lineSlug: LINE,
      fileName,
      contentType: 'image/jpeg',
      byteLength: bytes.length,
      sha256: createHash('sha256').update(bytes).digest('hex'),
    },
  )
}

/** Announces a file that must be expected. */
export async function expectUpload(world: World, bytes: Buffer): Promise<Expected> {
  const { status, answer } = await announce(world, bytes)
  must(
    answer.kind === 'upload',
    `announcing a file was answered ${status} ${JSON.stringify(answer)}`,
  )
  return answer
}

/** Sends a file to the store as the browser does: true when the store took it. */
export async function send({ post }: Expected, bytes: Buffer): Promise<boolean> {
  const form = new FormData()
  for (const [name, value] of Object.entries(post.fields)) form.append(name, value)
  form.append('file', new Blob([new Uint8Array(bytes)], { type: post.fields['Content-Type'] }))
  try {
    const signal = AbortSignal.timeout(10_000)
    return (await fetch(post.url, { method: 'POST', body: form, signal })).ok
  } catch {
    return false
  }
}

/** Says that a file has been sent. When it is taken in, it must be read in the end. */
export async function confirm(world: World, { photographId }: Expected, signal?: AbortSignal) {
  const said = await world.designer.json<{
    kind?: string
    photographId?: string
    code?: string
    message?: string
  }>(`${PHOTOGRAPHS}/${photographId}/confirm`, 'POST', undefined, signal)
  if (said.answer.kind === 'added') {
    world.acknowledge('photographs', photographId, { state: 'ready' })
  }
  return said
}

/** Announces, sends and confirms a file that must be taken in. */
export async function upload(world: World, bytes: Buffer): Promise<string> {
  const expected = await expectUpload(world, bytes)
  must(await send(expected, bytes), 'the store did not take a file')
  const { status, answer } = await confirm(world, expected)
  must(answer.kind === 'added', `a file was not taken in: ${status} ${JSON.stringify(answer)}`)
  return expected.photographId
}

/** Where a photograph stands; undefined when there is none. */
export async function stateOf(world: World, id: string): Promise<string | undefined> {
  const [row] = await world.query<{ state: string }>(
    'SELECT state FROM photographs WHERE id = $1',
    [id],
  )
  return row?.state
}

/** Waits until a photograph is read. @returns after how long, in milliseconds */
export function read(world: World, id: string, within = 30): Promise<number> {
  return until('the photograph is read', async () => (await stateOf(world, id)) === 'ready', within)
}

/** The state and the tries of the job that reads a photograph. */
export async function readingOf(world: World, id: string) {
  const [row] = await world.query<{ state: string; retry_count: number }>(
    `SELECT state, retry_count FROM pgboss.job WHERE name = 'read-photograph' AND data->>'photographId' = $1`,
    [id],
  )
  return row
}
