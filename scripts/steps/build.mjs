import { cpSync, existsSync, readFileSync, writeFileSync } from 'node:fs';
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

/** The production build, made again only when a source has changed; start and test share it. */
export async function ensureBuild() {
  const stampFile = join(ROOT, '.next', 'ruckle-stamp');
  const stamp = stampOf(ROOT, SOURCES);
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return;
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' };
  await timed('building', () =>
    run(process.execPath, ['node_modules/next/dist/bin/next', 'build'], { cwd: ROOT, env }),
  );
  const standalone = join(ROOT, '.next', 'standalone');
  cpSync(join(ROOT, '.next', 'static'), join(standalone, '.next', 'static'), { recursive: true });
  if (existsSync(join(ROOT, 'public')))
    cpSync(join(ROOT, 'public'), join(standalone, 'public'), { recursive: true });
  writeFileSync(stampFile, stamp);
}
