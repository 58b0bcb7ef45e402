import { createHash } from 'node:crypto';
import { mkdirSync, realpathSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = realpathSync(join(dirname(fileURLToPath(import.meta.url)), '..', '..'));
const isRoot = process.getuid?.() === 0;

/**
 * Where one kind of run keeps its things. As root the database cannot live in the clone: its user may not be able to enter it.
 * @param kind `main` for `npm start`, `test` for `npm test`
 */
export function foldersOf(kind) {
  const data = kind === 'main' ? join(ROOT, 'data') : join(ROOT, 'data', 'test');
  const name = createHash('sha256').update(ROOT).digest('hex').slice(0, 8);
  const suffix = kind === 'main' ? '' : `-${kind}`;
  const folders = {
    data,
    logs: join(data, 'logs'),
    mail: join(data, 'mail'),
    objects: join(data, 'objects'),
    runFile: join(data, 'run.json'),
    cluster: isRoot ? `/var/lib/postgresql/ruckle-${name}${suffix}` : join(data, 'postgres'),
    runsAsPostgres: isRoot,
    make() {
      for (const folder of [data, folders.logs, folders.mail, folders.objects])
        mkdirSync(folder, { recursive: true, mode: 0o700 });
    },
  };
  folders.make();
  return folders;
}
