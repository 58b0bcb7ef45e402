import {
  CreateBucketCommand,
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  HeadObjectCommand,
  ListObjectsV2Command,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { createHash, randomBytes } from 'node:crypto';
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { once } from 'node:events';
import { createServer, request as httpRequest, type IncomingMessage, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startStore } from '@/scripts/services/store.mjs';

const Bucket = 'ruckle';
const CREDENTIALS = { accessKeyId: 'keyid', secretAccessKey: 'a secret of the test' };

let folder: string;
let store: Server;
let client: S3Client;
const portOf = (server: Server) => (server.address() as AddressInfo).port;

const clientFor = (port: number, secretAccessKey = CREDENTIALS.secretAccessKey) =>
  new S3Client({
    endpoint: `http://127.0.0.1:${port}`,
    region: 'local',
    credentials: { ...CREDENTIALS, secretAccessKey },
    forcePathStyle: true,
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    maxAttempts: 1,
  });

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ruckle store '));
  const { accessKeyId: keyId, secretAccessKey: secret } = CREDENTIALS;
  store = (await startStore({ port: 0, folder, keyId, secret })) as Server;
  client = clientFor(portOf(store));
  await client.send(new CreateBucketCommand({ Bucket }));
});
afterAll(async () => {
  client.destroy();
  store.close();
  await rm(folder, { recursive: true });
});

const put = (Key: string, Body: Buffer | string) => client.send(new PutObjectCommand({ Bucket, Key, Body }));
const get = async (Key: string) => {
  const { Body } = await client.send(new GetObjectCommand({ Bucket, Key }));
  return Buffer.from(await Body!.transformToByteArray());
};
const failure = (work: Promise<unknown>) =>
  work.then(
    () => null,
    (thrown: { name: string; $metadata?: { httpStatusCode?: number } }) => thrown,
  );

/** A go-between that may change what the client has signed before the store sees it. */
async function between(
  change: (sent: { url: string; body: Buffer; headers: IncomingMessage['headers'] }) => void,
) {
  const server = createServer((incoming, response) => {
    void (async () => {
      const chunks: Buffer[] = [];
      for await (const chunk of incoming) chunks.push(chunk as Buffer);
      const sent = { url: incoming.url!, body: Buffer.concat(chunks), headers: { ...incoming.headers } };
      change(sent);
      const onward = httpRequest(
        { port: portOf(store), method: incoming.method, path: sent.url, headers: sent.headers },
        (answer) => {
          response.writeHead(answer.statusCode!, answer.headers);
          answer.pipe(response);
        },
      );
      onward.end(sent.body);
    })();
  }).listen(0, '127.0.0.1');
  await once(server, 'listening');
  return server;
}

describe('what is put', () => {
  it.each([0, 1, 1024 * 1024 + 7, 25 * 1024 * 1024])('comes back byte for byte (%i bytes)', async (bytes) => {
    const body = randomBytes(bytes);
    const { ETag } = await put(`whole/${bytes}`, body);
    expect(ETag).toBe(`"${createHash('md5').update(body).digest('hex')}"`);
    expect((await get(`whole/${bytes}`)).equals(body)).toBe(true);
    const head = await client.send(new HeadObjectCommand({ Bucket, Key: `whole/${bytes}` }));
    expect(head.ContentLength).toBe(bytes);
  });

  it('comes back whole when it was sent as a stream, whose bytes the client does not sign', async () => {
    const body = randomBytes(300_000);
    const Body = Readable.from([body.subarray(0, 1000), body.subarray(1000)]);
    await client.send(new PutObjectCommand({ Bucket, Key: 'streamed', Body, ContentLength: body.length }));
    expect((await get('streamed')).equals(body)).toBe(true);
  });

  it('replaces what was there, and leaves nothing half-written beside it', async () => {
    await Promise.all(Array.from({ length: 8 }, (_, i) => put('again', `writing ${i}`)));
    await put('again', 'the last');
    expect((await get('again')).toString()).toBe('the last');
    const files = await readdir(join(folder, Bucket), { recursive: true });
    expect(files.filter((name) => name.includes('.part'))).toEqual([]);
  });

  it('is refused over 64 MiB, with an answer', async () => {
    const fault = await failure(put('large', Buffer.alloc(64 * 1024 * 1024 + 1)));
    expect(fault?.$metadata?.httpStatusCode).toBe(413);
  });

  it('is refused in a bucket that does not exist', async () => {
    const fault = await failure(
      client.send(new PutObjectCommand({ Bucket: 'nobodys', Key: 'a', Body: 'a' })),
    );
    expect(fault?.name).toBe('NoSuchBucket');
    expect((await failure(client.send(new HeadBucketCommand({ Bucket: 'nobodys' }))))?.name).toBe('NotFound');
  });
});

it('forgets what is deleted, and takes a second deletion for done', async () => {
  await put('gone', 'x');
  for (let time = 0; time < 2; time += 1) await client.send(new DeleteObjectCommand({ Bucket, Key: 'gone' }));
  expect((await failure(get('gone')))?.name).toBe('NoSuchKey');
});

it('lists by prefix, in order, in pages that join without a gap or a repeat', async () => {
  const keys = Array.from({ length: 23 }, (_, i) => `list/${String(i).padStart(2, '0')}/a.webp`);
  for (const key of [...keys].reverse()) await put(key, 'x');
  await put('listless', 'x');
  const found: string[] = [];
  let ContinuationToken: string | undefined;
  do {
    const page = await client.send(
      new ListObjectsV2Command({ Bucket, Prefix: 'list/', MaxKeys: 10, ContinuationToken }),
    );
    found.push(...(page.Contents ?? []).map(({ Key }) => Key!));
    ContinuationToken = page.NextContinuationToken;
  } while (ContinuationToken);
  expect(found).toEqual(keys);
  const after = await client.send(
    new ListObjectsV2Command({ Bucket, Prefix: 'list/', StartAfter: keys[20] }),
  );
  expect(after.Contents!.map(({ Key }) => Key)).toEqual(keys.slice(21));
});

describe('a request that is not signed by us as it arrives', () => {
  it('is refused when anonymous, whatever it asks', async () => {
    await put('secret', 'nobody else’s');
    const address = `http://127.0.0.1:${portOf(store)}`;
    for (const [method, path] of [
      ['GET', '/ruckle/secret'],
      ['HEAD', '/ruckle/secret'],
      ['PUT', '/ruckle/secret'],
      ['DELETE', '/ruckle/secret'],
      ['GET', '/ruckle?list-type=2'],
      ['GET', '/ruckle/missing'],
    ] as const) {
      const answer = await fetch(address + path, { method });
      expect([answer.status, (await answer.text()).includes('nobody')]).toEqual([403, false]);
    }
    expect((await get('secret')).toString()).toBe('nobody else’s');
  });

  it('is refused with a wrong secret', async () => {
    const stranger = clientFor(portOf(store), 'guessed');
    const fault = await failure(stranger.send(new GetObjectCommand({ Bucket, Key: 'secret' })));
    expect(fault?.name).toBe('SignatureDoesNotMatch');
    stranger.destroy();
  });

  it.each([
    ['bytes', 'XAmzContentSHA256Mismatch', (sent: { body: Buffer }) => void (sent.body[0]! ^= 1)],
    ['address', 'SignatureDoesNotMatch', (sent: { url: string }) => void (sent.url = '/ruckle/elsewhere')],
    [
      'claim about its bytes',
      'SignatureDoesNotMatch',
      (sent: { headers: IncomingMessage['headers'] }) =>
        void (sent.headers['x-amz-content-sha256'] = 'UNSIGNED-PAYLOAD'),
    ],
  ])('is refused when its %s changed on the way, and changes nothing', async (_what, name, change) => {
    await put('kept', 'as it was');
    const server = await between(change);
    const tampered = clientFor(portOf(server));
    const fault = await failure(
      tampered.send(new PutObjectCommand({ Bucket, Key: 'kept', Body: 'as it is' })),
    );
    tampered.destroy();
    server.close();
    expect(fault?.name).toBe(name);
    expect((await get('kept')).toString()).toBe('as it was');
    expect((await failure(get('elsewhere')))?.name).toBe('NoSuchKey');
  });

  it('passes a go-between that changes nothing', async () => {
    const server = await between(() => {});
    const honest = clientFor(portOf(server));
    await honest.send(new PutObjectCommand({ Bucket, Key: 'honest', Body: 'x' }));
    honest.destroy();
    server.close();
    expect((await get('honest')).toString()).toBe('x');
  });
});
