import { fork } from 'node:child_process';
import { join } from 'node:path';
import { ensureBucket } from '@/lib/photo-store';
import accounts from './accounts.json' with { type: 'json' };
import { DEMO_GARMENTS } from './demo';
import { makeDemoAccount } from './make-account';
import type { Viewer } from '../queries/viewer';

/** Hangs one garment in a process of its own: its pictures are drawn for most of a minute, and a machine has more than one core. */
function hangApart(viewer: Viewer, index: number): Promise<void> {
  const child = fork(join(import.meta.dirname, 'hang-one.ts'), [JSON.stringify(viewer), String(index)]);
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code) =>
      code === 0 ? resolve() : reject(new Error(`demo garment ${index + 1} was not hung`)),
    );
  });
}

/** Invented people and garments for a first look, made through the same functions that serve people. */
await ensureBucket();
for (const account of accounts) {
  const viewer = await makeDemoAccount(account);
  if (account === accounts[0]) await Promise.all(DEMO_GARMENTS.map((_, index) => hangApart(viewer, index)));
}
process.exit(0);
