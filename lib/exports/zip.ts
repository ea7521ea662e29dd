import { zipSync, type Zippable } from 'fflate'

/** A file of a kit. */
export interface KitFile {
  path: string
  bytes: Uint8Array
}

/** Where a file's bytes lie within the zip. */
export interface ZippedFile {
  path: string
  /** Of its first byte; only of files that are stored as they are. */
  offset: number | null
  byteLength: number
}

// Without a zone or a build date: a zip's times are local, and the same files give the same zip.
const MTIME = new Date(2000, 0, 1)

/** What is compressed already is stored as it is, so that a picture can be read out of the zip. */
const isStored = (path: string) => /\.(png|pdf)$/.test(path)

/**
 * Files as a zip, sorted by path and under one fixed date: the same files give the same bytes.
 * @source PKWARE APPNOTE 6.3 § 4.3
 */
export function zipFiles(files: readonly KitFile[]): { zip: Buffer; files: ZippedFile[] } {
  const sorted = files.toSorted((a, b) => (a.path < b.path ? -1 : 1))
  const entries: Zippable = {}
  for (const { path, bytes } of sorted)
    entries[path] = [bytes, { level: isStored(path) ? 0 : 6, mtime: MTIME }]
  const made = zipSync(entries)
  const zip = Buffer.from(made.buffer, made.byteOffset, made.byteLength)
  let header = 0
  const zipped = sorted.map(({ path, bytes }) => {
    // A local header is 30 bytes, then the name and the extra field, then the data.
    const data = header + 30 + zip.readUInt16LE(header + 26) + zip.readUInt16LE(header + 28)
    header = data + zip.readUInt32LE(header + 18)
    return { path, offset: isStored(path) ? data : null, byteLength: bytes.length }
  })
  return { zip, files: zipped }
}
