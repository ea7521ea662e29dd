import { getObject, headObject, listObjects } from '@/lib/storage/objects'

/** Objects are read and written this many at a time: at most 40 MB each, all in memory. */
const AT_ONCE = 4

/** Does the work for each item, a few at a time, and gives the answers in order. */
export async function forEach<Item, Answer>(
  items: readonly Item[],
  work: (item: Item) => Promise<Answer>,
): Promise<Answer[]> {
  const answers: Answer[] = []
  let next = 0
  const runner = async () => {
    for (let at = next++; at < items.length; at = next++) answers[at] = await work(items[at]!)
  }
  await Promise.all(Array.from({ length: AT_ONCE }, runner))
  return answers
}

/** The key of every object in the bucket. */
export async function listKeys(): Promise<string[]> {
  const keys: string[] = []
  for await (const { key } of listObjects('')) keys.push(key)
  return keys
}

/** Whether the bucket holds nothing at all. */
export async function isBucketEmpty(): Promise<boolean> {
  for await (const _ of listObjects('')) return false
  return true
}

/** The bytes and type of an object, or null when it has gone since it was listed. */
export async function readObject(
  key: string,
): Promise<{ bytes: Buffer; contentType: string } | null> {
  const head = await headObject(key)
  const bytes = head && (await getObject(key))
  return bytes && { bytes, contentType: head.contentType }
}
