import 'server-only';
import {
  CreateBucketCommand,
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  ListObjectsV2Command,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { env } from './env';

let client: S3Client | undefined;

function store(): S3Client {
  const { S3_ENDPOINT, S3_REGION, S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY } = env();
  client ??= new S3Client({
    endpoint: S3_ENDPOINT,
    region: S3_REGION,
    credentials: { accessKeyId: S3_ACCESS_KEY_ID, secretAccessKey: S3_SECRET_ACCESS_KEY },
    forcePathStyle: true,
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    maxAttempts: 3,
  });
  return client;
}

const place = (key: string) => ({ Bucket: env().S3_BUCKET, Key: key });

/** Only the server ever speaks to the store: no address of it is given to anyone. */
export async function putObject(key: string, body: Buffer, contentType: string): Promise<void> {
  await store().send(new PutObjectCommand({ ...place(key), Body: body, ContentType: contentType }));
}

/** Null when there is no such file. */
export async function getObject(
  key: string,
): Promise<{ body: ReadableStream; bytes: number | undefined } | null> {
  try {
    const { Body, ContentLength } = await store().send(new GetObjectCommand(place(key)));
    return Body ? { body: Body.transformToWebStream(), bytes: ContentLength } : null;
  } catch (thrown) {
    if (thrown instanceof NoSuchKey) return null;
    throw thrown;
  }
}

export async function deleteObject(key: string): Promise<void> {
  await store().send(new DeleteObjectCommand(place(key)));
}

/** A page of files below a prefix, in order, after `startAfter`. */
export async function listObjects(
  prefix: string,
  startAfter?: string,
): Promise<{ key: string; modifiedAt: Date }[]> {
  const { Contents = [] } = await store().send(
    new ListObjectsV2Command({ Bucket: env().S3_BUCKET, Prefix: prefix, StartAfter: startAfter }),
  );
  return Contents.flatMap(({ Key, LastModified }) =>
    Key && LastModified ? [{ key: Key, modifiedAt: LastModified }] : [],
  );
}

/** Makes the bucket where it is missing; for a new installation and for tests. */
export async function ensureBucket(): Promise<void> {
  try {
    await store().send(new HeadBucketCommand({ Bucket: env().S3_BUCKET }));
  } catch {
    await store().send(new CreateBucketCommand({ Bucket: env().S3_BUCKET }));
  }
}

export async function isStoreUp(): Promise<boolean> {
  try {
    await ensureBucket();
    return true;
  } catch {
    return false;
  }
}
