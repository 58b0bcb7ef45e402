import { createHash, randomUUID } from 'node:crypto';
import { createServer } from 'node:http';
import { createReadStream, mkdirSync } from 'node:fs';
import { mkdir, open, readdir, rename, rm, stat } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { faultOf } from './signature.mjs';

const BODY_BYTES_MAX = 64 * 1024 * 1024;
const KEY = /^\/([a-z0-9-]{3,63})(?:\/([A-Za-z0-9][A-Za-z0-9/._-]*)?)?$/;

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
    if (bytes > BODY_BYTES_MAX) return null;
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

/** Whole or not at all, and on the disk before it is acknowledged. */
async function putObject(file, body) {
  await mkdir(dirname(file), { recursive: true });
  const aside = `${file}.${randomUUID()}.part`;
  const handle = await open(aside, 'w', 0o600);
  await handle.writeFile(body);
  await handle.sync();
  await handle.close();
  await rename(aside, file);
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
      const { size, mtime } = await stat(join(folder, key));
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
  const found = await stat(file).catch(() => null);
  if (!found?.isFile()) return refuse(response, 404, 'NoSuchKey');
  response.writeHead(200, {
    'content-type': 'application/octet-stream',
    'content-length': found.size,
    'last-modified': found.mtime.toUTCString(),
  });
  if (request.method === 'HEAD') return response.end();
  createReadStream(file).pipe(response);
}

async function handle(request, response, { folder, keyId, secret }) {
  const body = await readBody(request);
  if (body === null) return refuse(response, 413, 'EntityTooLarge');
  const { method = 'GET', url = '/', headers } = request;
  const fault = faultOf({ method, url, headers, body, keyId, secret, nowMs: Date.now() });
  if (fault) return refuse(response, 403, fault);
  const { pathname, search } = new URL(url, 'http://store');
  const found = KEY.exec(decodeURIComponent(pathname));
  if (!found || pathname.includes('..')) return refuse(response, 400, 'InvalidURI');
  const [, bucket, key] = found;
  const place = join(folder, bucket);
  if (!key) {
    if (method === 'PUT') {
      await mkdir(place, { recursive: true });
      return answer(response, 200);
    }
    const exists = await stat(place).catch(() => null);
    if (!exists) return refuse(response, 404, 'NoSuchBucket');
    return method === 'GET' ? listObjects(response, place, search) : answer(response, 200);
  }
  const file = join(place, key);
  if (method === 'PUT') return answer(response, 200, '', { etag: `"${await putObject(file, body)}"` });
  if (method === 'DELETE') {
    await rm(file, { force: true });
    return answer(response, 204);
  }
  if (method === 'GET' || method === 'HEAD') return serveObject(request, response, file);
  return refuse(response, 405, 'MethodNotAllowed');
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
  await startStore({
    port: Number(process.env.STORE_PORT),
    folder: process.env.STORE_DIR,
    keyId: process.env.STORE_ACCESS_KEY_ID,
    secret: process.env.STORE_SECRET_ACCESS_KEY,
  });
}
