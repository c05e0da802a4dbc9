import {
  CreateBucketCommand,
  DeleteObjectsCommand,
  GetObjectCommand,
  HeadBucketCommand,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3'
import type { Readable } from 'node:stream'
import type { Config } from '../config.ts'

/** Where files lie: photographs, published exports, imported sheets. */
export interface ObjectStore {
  put(key: string, type: string, bytes: Uint8Array): Promise<void>
  /** null where there is none. */
  get(key: string): Promise<{ readonly type: string; readonly body: Readable } | null>
  remove(keys: readonly string[]): Promise<void>
  makeReady(): Promise<void>
  close(): void
}

/** A store over any server that speaks S3. */
export function createObjectStore(config: Config): ObjectStore {
  const {
    S3_ENDPOINT: endpoint,
    S3_ACCESS_KEY: accessKeyId,
    S3_SECRET_KEY: secretAccessKey,
    S3_BUCKET: Bucket,
  } = config
  const client = new S3Client({
    region: config.S3_REGION,
    ...(endpoint === undefined ? {} : { endpoint, forcePathStyle: true }),
    ...(accessKeyId === undefined || secretAccessKey === undefined
      ? {}
      : { credentials: { accessKeyId, secretAccessKey } }),
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  })
  return {
    async put(Key, ContentType, Body) {
      await client.send(new PutObjectCommand({ Bucket, Key, ContentType, Body }))
    },
    async get(Key) {
      try {
        const object = await client.send(new GetObjectCommand({ Bucket, Key }))
        return { type: object.ContentType ?? 'application/octet-stream', body: object.Body as Readable }
      } catch (error) {
        if (error instanceof Error && (error.name === 'NoSuchKey' || error.name === 'NotFound')) return null
        throw error
      }
    },
    async remove(keys) {
      for (let from = 0; from < keys.length; from += 500) {
        const Objects = keys.slice(from, from + 500).map((Key) => ({ Key }))
        await client.send(new DeleteObjectsCommand({ Bucket, Delete: { Objects, Quiet: true } }))
      }
    },
    async makeReady() {
      try {
        await client.send(new HeadBucketCommand({ Bucket }))
      } catch (error) {
        if (!(error instanceof Error) || !['NotFound', 'NoSuchBucket'].includes(error.name)) throw error
        await client.send(new CreateBucketCommand({ Bucket }))
      }
    },
    close() {
      client.destroy()
    },
  }
}
