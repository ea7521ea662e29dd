import { inflateSync } from 'node:zlib'

/**
 * A WOFF file as the font it packs, unpacked once here by zlib instead of at every opening in
 * JavaScript. @throws RangeError when it is no WOFF file
 * @source W3C, WOFF File Format 1.0 § 3–5; OpenType 1.9, Table Directory
 */
export function unpackWoff(woff: Buffer): Buffer {
  if (woff.toString('latin1', 0, 4) !== 'wOFF') throw new RangeError('This is no WOFF file.')
  const count = woff.readUInt16BE(12)
  const tables = Array.from({ length: count }, (_, index) => {
    const at = 44 + index * 20
    const [offset, packed, length] = [4, 8, 12].map((field) => woff.readUInt32BE(at + field))
    const bytes = woff.subarray(offset!, offset! + packed!)
    return {
      tag: woff.subarray(at, at + 4),
      checksum: woff.subarray(at + 16, at + 20),
      bytes: packed! < length! ? inflateSync(bytes) : bytes,
    }
  })
  const power = Math.floor(Math.log2(count))
  const head = Buffer.alloc(12 + 16 * count)
  woff.copy(head, 0, 4, 8)
  head.writeUInt16BE(count, 4)
  head.writeUInt16BE(16 * 2 ** power, 6)
  head.writeUInt16BE(power, 8)
  head.writeUInt16BE(16 * (count - 2 ** power), 10)
  let offset = head.length
  const parts = tables.map(({ tag, checksum, bytes }, index) => {
    const at = 12 + 16 * index
    tag.copy(head, at)
    checksum.copy(head, at + 4)
    head.writeUInt32BE(offset, at + 8)
    head.writeUInt32BE(bytes.length, at + 12)
    // Tables begin at multiples of four.
    const padded = Buffer.concat([bytes, Buffer.alloc(-bytes.length & 3)])
    offset += padded.length
    return padded
  })
  return Buffer.concat([head, ...parts])
}
