import {
  DeleteObjectsCommand,
  GetObjectCommand,
  HeadObjectCommand,
  ListObjectsV2Command,
  NotFound,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3'
import { createPresignedPost, type PresignedPost } from '@aws-sdk/s3-presigned-post'
import { getSignedUrl } from '@aws-sdk/s3-request-presigner'

import { env } from '@/lib/env'
import { UnavailableError } from '@/lib/errors'

const clients = new Map<string, S3Client>()

function client(endpoint: string): S3Client {
  const known = clients.get(endpoint)
  if (known) return known
  const { S3_REGION, S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY } = env()
  const made = new S3Client({
    endpoint,
    region: S3_REGION,
    credentials: { accessKeyId: S3_ACCESS_KEY_ID, secretAccessKey: S3_SECRET_ACCESS_KEY },
    forcePathStyle: true,
    // Plain bodies: the local store keeps the checksum trailers of streamed ones as content.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    maxAttempts: 2,
    requestHandler: {
      connectionTimeout: 2_000,
      requestTimeout: 20_000,
      throwOnRequestTimeout: true,
    },
  })
  clients.set(endpoint, made)
  return made
}

/** How long the store may take to say anything at all to somebody who waits, in milliseconds. */
const SIGN_OF_LIFE = 3_000
const soon = () => ({ abortSignal: AbortSignal.timeout(SIGN_OF_LIFE) })

async function ask<T>(work: (store: S3Client, bucket: string) => Promise<T>): Promise<T> {
  try {
    return await work(client(env().S3_ENDPOINT), env().S3_BUCKET)
  } catch (error) {
    if (error instanceof NotFound || error instanceof NoSuchKey) throw error
    throw new UnavailableError('The picture store did not answer. Try again in a moment.', {
      cause: error,
    })
  }
}

function isMissing(error: unknown): boolean {
  return error instanceof NotFound || error instanceof NoSuchKey
}

/** How long a presigned upload may be begun, in seconds. */
export const UPLOAD_SECONDS = 5 * 60

/**
 * A form that lets a browser put exactly one object: key, type and length are fixed.
 * Nothing is sent to the store, so this answers even when the store is away; `requireObjectStore`
 * asks it.
 */
export function presignUpload(object: {
  key: string
  contentType: string
  byteLength: number
}): Promise<PresignedPost> {
  const { S3_PUBLIC_ENDPOINT, S3_ENDPOINT, S3_BUCKET } = env()
  return createPresignedPost(client(S3_PUBLIC_ENDPOINT ?? S3_ENDPOINT), {
    Bucket: S3_BUCKET,
    Key: object.key,
    Expires: UPLOAD_SECONDS,
    Fields: { 'Content-Type': object.contentType },
    Conditions: [
      ['content-length-range', object.byteLength, object.byteLength],
      ['eq', '$Content-Type', object.contentType],
    ],
  })
}

/** Length and type of a stored object, or null when there is none. @throws UnavailableError */
export async function headObject(
  key: string,
): Promise<{ byteLength: number; contentType: string } | null> {
  try {
    const head = await ask((store, Bucket) =>
      store.send(new HeadObjectCommand({ Bucket, Key: key }), soon()),
    )
    return { byteLength: head.ContentLength ?? 0, contentType: head.ContentType ?? '' }
  } catch (error) {
    if (isMissing(error)) return null
    throw error
  }
}

/** The bytes of a stored object, or null when there is none. @throws UnavailableError */
export async function getObject(key: string): Promise<Buffer | null> {
  try {
    return await ask(async (store, Bucket) => {
      const { Body } = await store.send(new GetObjectCommand({ Bucket, Key: key }))
      return Buffer.from(await Body!.transformToByteArray())
    })
  } catch (error) {
    if (isMissing(error)) return null
    throw error
  }
}

/**
 * A part of a stored object, or null when there is none.
 * @param part from its first byte on @throws UnavailableError
 */
export async function getObjectPart(
  key: string,
  { offset, byteLength }: { offset: number; byteLength: number },
): Promise<Buffer | null> {
  const Range = `bytes=${offset}-${offset + byteLength - 1}`
  try {
    return await ask(async (store, Bucket) => {
      const { Body } = await store.send(new GetObjectCommand({ Bucket, Key: key, Range }))
      return Buffer.from(await Body!.transformToByteArray())
    })
  } catch (error) {
    if (isMissing(error)) return null
    throw error
  }
}

/**
 * An address from which whoever has it can fetch one object, as a file of a name, for some seconds.
 * Nothing is sent to the store, so this answers even when the store is away.
 */
export function presignDownload(object: {
  key: string
  fileName: string
  seconds: number
}): Promise<string> {
  const { S3_PUBLIC_ENDPOINT, S3_ENDPOINT, S3_BUCKET } = env()
  const command = new GetObjectCommand({
    Bucket: S3_BUCKET,
    Key: object.key,
    ResponseContentDisposition: `attachment; filename="${object.fileName}"`,
    ResponseContentType: 'application/zip',
    ResponseCacheControl: 'private, no-store',
  })
  return getSignedUrl(client(S3_PUBLIC_ENDPOINT ?? S3_ENDPOINT), command, {
    expiresIn: object.seconds,
  })
}

/** Stores an object, replacing one of the same key. @throws UnavailableError */
export async function putObject(key: string, body: Buffer, contentType: string): Promise<void> {
  await ask((store, Bucket) =>
    store.send(
      new PutObjectCommand({
        Bucket,
        Key: key,
        Body: body,
        ContentType: contentType,
        ContentLength: body.length,
      }),
    ),
  )
}

/** A stored object as the listing tells it. */
export interface StoredObject {
  key: string
  modifiedAt: Date
}

/** Every object under a prefix, page by page. @throws UnavailableError */
export async function* listObjects(prefix: string): AsyncGenerator<StoredObject> {
  let from: string | undefined
  do {
    const page = await ask((store, Bucket) =>
      store.send(new ListObjectsV2Command({ Bucket, Prefix: prefix, ContinuationToken: from })),
    )
    for (const { Key, LastModified } of page.Contents ?? []) {
      if (Key) yield { key: Key, modifiedAt: LastModified ?? new Date() }
    }
    from = page.IsTruncated ? page.NextContinuationToken : undefined
  } while (from)
}

/** Removes objects, at most 1,000; removing one that is gone is no error. @throws UnavailableError */
export async function deleteObjects(keys: readonly string[]): Promise<void> {
  if (keys.length === 0) return
  await ask((store, Bucket) =>
    store.send(
      new DeleteObjectsCommand({ Bucket, Delete: { Objects: keys.map((Key) => ({ Key })) } }),
    ),
  )
}

/** Asks the store for a sign of life. @throws UnavailableError */
export async function requireObjectStore(): Promise<void> {
  await ask((store, Bucket) => store.send(new ListObjectsV2Command({ Bucket, MaxKeys: 1 }), soon()))
}
