import { createHash, randomUUID } from 'node:crypto';
import { createServer } from 'node:http';
import { mkdirSync } from 'node:fs';
import { mkdir, open, readdir, rename, rm, stat } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { pipeline } from 'node:stream/promises';
import { faultOf } from './signature.mjs';

const BODY_BYTES_MAX = 64 * 1024 * 1024;
// Only keys that need no escaping: in an address, on the disk and in a listing they read the same.
const PLACE = /^\/([a-z0-9-]{3,63})(?:\/([A-Za-z0-9/._-]*))?$/;

const xml = (body) => `<?xml version="1.0" encoding="UTF-8"?>${body}`;

function answer(response, status, body = '', headers = {}) {
  response.writeHead(status, {
    'content-type': 'application/xml',
    'content-length': Buffer.byteLength(body),
    ...headers,
  });
  response.end(body);
}

const refuse = (response, status, code) =>
  answer(response, status, xml(`<Error><Code>${code}</Code></Error>`));

async function readBody(request) {
  const chunks = [];
  let bytes = 0;
  for await (const chunk of request) {
    bytes += chunk.length;
    // Read on without keeping it: cut off half-way, the sender would hear no answer.
    if (bytes <= BODY_BYTES_MAX) chunks.push(chunk);
  }
  return bytes > BODY_BYTES_MAX ? null : Buffer.concat(chunks);
}

async function sync(path) {
  const handle = await open(path, 'r');
  await handle.sync().finally(() => handle.close());
}

/** Whole or not at all, and on the disk before it is acknowledged. */
async function putObject(file, body) {
  await mkdir(dirname(file), { recursive: true });
  const aside = `${file}.${randomUUID()}.part`;
  const handle = await open(aside, 'w', 0o600);
  try {
    await handle.writeFile(body);
    await handle.sync();
  } finally {
    await handle.close();
  }
  await rename(aside, file);
  await sync(dirname(file));
  return createHash('md5').update(body).digest('hex');
}

async function listFiles(folder, prefix = '') {
  const entries = await readdir(join(folder, prefix), { withFileTypes: true }).catch(() => []);
  const lists = await Promise.all(
    entries.map((entry) => {
      const path = prefix ? `${prefix}/${entry.name}` : entry.name;
      if (entry.isDirectory()) return listFiles(folder, path);
      return entry.name.endsWith('.part') ? [] : [path];
    }),
  );
  return lists.flat().sort();
}

async function listObjects(response, folder, search) {
  const query = new URLSearchParams(search);
  const prefix = query.get('prefix') ?? '';
  const after = query.get('continuation-token') ?? query.get('start-after') ?? '';
  const most = Math.min(1000, Number(query.get('max-keys') ?? 1000));
  const keys = (await listFiles(folder)).filter((key) => key.startsWith(prefix) && key > after);
  const page = keys.slice(0, most);
  const rows = await Promise.all(
    page.map(async (key) => {
      const found = await stat(join(folder, key)).catch(() => null);
      if (!found) return ''; // deleted while we were listing
      const { size, mtime } = found;
      return `<Contents><Key>${key}</Key><Size>${size}</Size><LastModified>${mtime.toISOString()}</LastModified></Contents>`;
    }),
  );
  const isCut = keys.length > page.length;
  const next = isCut ? `<NextContinuationToken>${page.at(-1)}</NextContinuationToken>` : '';
  answer(
    response,
    200,
    xml(
      `<ListBucketResult><IsTruncated>${isCut}</IsTruncated><KeyCount>${page.length}</KeyCount>${next}${rows.join('')}</ListBucketResult>`,
    ),
  );
}

async function serveObject(request, response, file) {
  // Opened first: what is replaced or deleted meanwhile is still served whole.
  const handle = await open(file, 'r').catch(() => null);
  try {
    const found = await handle?.stat();
    if (!found?.isFile()) return refuse(response, 404, 'NoSuchKey');
    response.writeHead(200, {
      'content-type': 'application/octet-stream',
      'content-length': found.size,
      'last-modified': found.mtime.toUTCString(),
    });
    if (request.method === 'HEAD') return response.end();
    await pipeline(handle.createReadStream({ autoClose: false }), response);
  } finally {
    await handle?.close();
  }
}

/** Bucket and key of a path; null when it names no place of ours. A key's parts may not be empty or lead upwards. */
export function placeOf(pathname) {
  const found = PLACE.exec(pathname);
  if (!found) return null;
  const [, bucket, key] = found;
  const isSafe = !key || key.split('/').every((part) => /^[A-Za-z0-9_-]/.test(part));
  return isSafe ? { bucket, key } : null;
}

async function handleBucket({ method, search }, response, folder) {
  if (method === 'PUT') {
    await mkdir(folder, { recursive: true, mode: 0o700 });
    return answer(response, 200);
  }
  if (!(await stat(folder).catch(() => null))) return refuse(response, 404, 'NoSuchBucket');
  if (method === 'GET') return listObjects(response, folder, search);
  return method === 'HEAD' ? answer(response, 200) : refuse(response, 405, 'MethodNotAllowed');
}

async function handleObject(request, response, { file, bucketFolder, body }) {
  const { method } = request;
  if (method === 'GET' || method === 'HEAD') return serveObject(request, response, file);
  if (method === 'DELETE') {
    await rm(file, { force: true });
    return answer(response, 204);
  }
  if (method !== 'PUT') return refuse(response, 405, 'MethodNotAllowed');
  if (!(await stat(bucketFolder).catch(() => null))) return refuse(response, 404, 'NoSuchBucket');
  return answer(response, 200, '', { etag: `"${await putObject(file, body)}"` });
}

async function handle(request, response, { folder, keyId, secret }) {
  const body = await readBody(request);
  if (body === null) return refuse(response, 413, 'EntityTooLarge');
  const { method = 'GET', url = '/', headers } = request;
  const fault = faultOf({ method, url, headers, body, keyId, secret, nowMs: Date.now() });
  if (fault) return refuse(response, 403, fault);
  const { pathname, search } = new URL(url, 'http://store');
  const place = placeOf(pathname);
  if (!place) return refuse(response, 400, 'InvalidURI');
  const bucketFolder = join(folder, place.bucket);
  if (!place.key) return handleBucket({ method, search }, response, bucketFolder);
  return handleObject(request, response, { file: join(bucketFolder, place.key), bucketFolder, body });
}

/** A photo store for one machine that speaks the S3 API (path style, signed in the header): put, get, head, delete, list. */
export function startStore({ port, folder, keyId, secret }) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const server = createServer((request, response) => {
    handle(request, response, { folder, keyId, secret }).catch((error) => {
      process.stderr.write(`${error.stack}\n`);
      if (!response.headersSent) refuse(response, 500, 'InternalError');
      else response.destroy();
    });
  });
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve(server));
  });
}

if (process.env.STORE_PORT) {
  mkdirSync(join(process.env.STORE_DIR, process.env.STORE_BUCKET), { recursive: true, mode: 0o700 });
  await startStore({
    port: Number(process.env.STORE_PORT),
    folder: process.env.STORE_DIR,
    keyId: process.env.STORE_ACCESS_KEY_ID,
    secret: process.env.STORE_SECRET_ACCESS_KEY,
  });
}
