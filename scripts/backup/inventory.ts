import { connect, countTables } from './database'
import { hashOf } from './manifest'
import { forEach, listKeys, readObject } from './objects'

/** Prints what this environment's database and bucket hold, as JSON: rows by table, hashes by key. */
const client = await connect()
const tables = await countTables(client)
await client.end()
const objects = await forEach((await listKeys()).sort(), async (key) => {
  const object = await readObject(key)
  return [key, object && hashOf(object.bytes)] as const
})
console.log(JSON.stringify({ tables, objects: Object.fromEntries(objects) }))
