import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from './folders.mjs';
import { run } from './run.mjs';
import { timed } from './say.mjs';
import { stampOf } from './stamp.mjs';

/** Node modules exactly as the lock says; nothing to do when they already are. */
export async function ensureModules() {
  const stampFile = join(ROOT, 'node_modules', '.ruckle-stamp');
  const stamp = stampOf(ROOT, ['package-lock.json', '.npmrc']);
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return;
  // What builds is a development dependency: wanted even where NODE_ENV says production.
  const args = ['ci', '--include=dev', '--no-progress'];
  await timed('installing node modules', () => run('npm', args, { cwd: ROOT }));
  writeFileSync(stampFile, stamp);
}
