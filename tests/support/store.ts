import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll } from 'vitest';
import { startStore } from '@/scripts/services/store.mjs';

const BUCKET = 'ruckle';

interface TestStore {
  /** Every file that the store holds, by key, in order. */
  keys: () => string[];
  folder: string;
  server: Server;
}

/** Call it after `databaseOfFile`: a photo store of the file's own, empty, with its bucket, gone afterwards. */
export function storeOfFile(): TestStore {
  const made = {} as TestStore;
  beforeAll(async () => {
    const folder = mkdtempSync(join(tmpdir(), 'ruckle-store-'));
    const secret = 'test-secret';
    const server = await startStore({ port: 0, folder, keyId: 'test', secret });
    const { port } = server.address() as AddressInfo;
    process.env.S3_ENDPOINT = `http://127.0.0.1:${port}`;
    process.env.S3_ACCESS_KEY_ID = 'test';
    process.env.S3_SECRET_ACCESS_KEY = secret;
    const keys = () =>
      readdirSync(join(folder, BUCKET), { recursive: true, withFileTypes: true })
        .filter((entry) => entry.isFile())
        .map((entry) => join(entry.parentPath, entry.name).slice(join(folder, BUCKET).length + 1))
        .sort();
    Object.assign(made, { folder, server, keys });
    const { ensureBucket } = await import('@/lib/photo-store');
    await ensureBucket();
  });
  afterAll(async () => {
    made.server?.closeAllConnections();
    await new Promise((resolve) => made.server?.close(resolve));
    rmSync(made.folder, { recursive: true, force: true });
  });
  return made;
}
