import { cpSync, existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from './folders.mjs';
import { run } from './run.mjs';
import { timed } from './say.mjs';
import { stampOf } from './stamp.mjs';

const SOURCES = [
  'app',
  'components',
  'content',
  'db',
  'diagnosis',
  'lib',
  'public',
  'instrumentation.ts',
  'next.config.ts',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tsconfig.json',
];

export const STANDALONE = join(ROOT, '.next', 'standalone');

/** The production build, made again only when a source has changed; start and test share it. */
export async function ensureBuild() {
  const stampFile = join(ROOT, '.next', 'ruckle-stamp');
  const stamp = stampOf(ROOT, SOURCES);
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return;
  // First of all: a build that is cut short must not pass for the one before it.
  for (const path of [stampFile, STANDALONE]) rmSync(path, { recursive: true, force: true });
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' };
  await timed('building', () =>
    run(process.execPath, ['node_modules/next/dist/bin/next', 'build'], { cwd: ROOT, env }),
  );
  cpSync(join(ROOT, '.next', 'static'), join(STANDALONE, '.next', 'static'), { recursive: true });
  if (existsSync(join(ROOT, 'public')))
    cpSync(join(ROOT, 'public'), join(STANDALONE, 'public'), { recursive: true });
  writeFileSync(stampFile, stamp);
}
