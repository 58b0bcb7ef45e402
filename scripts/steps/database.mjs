import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from './folders.mjs';
import { run } from './run.mjs';
import { timed } from './say.mjs';
import { stampOf } from './stamp.mjs';

const MIGRATION_SOURCES = ['db/migrations', 'db/migrate.ts', 'db/grants.ts', 'lib/jobs/queues.ts'];

// The condition lets files that are marked for the server only be loaded outside Next.
export const TS_FLAGS = ['--conditions=react-server', '--import', 'tsx'];

/**
 * Brings the database to the newest schema; nothing to do when these very migrations were the last to run.
 * @param env with DATABASE_OWNER_URL
 */
export async function migrate(runState, env) {
  const stamp = stampOf(ROOT, MIGRATION_SOURCES);
  if (runState.stamps.migrated === stamp) return;
  await timed('migrating the database', () =>
    run(process.execPath, [...TS_FLAGS, 'db/migrate.ts'], { cwd: ROOT, env }),
  );
  runState.stamps.migrated = stamp;
}

/** Invented people and garments, into a database that has just been made. The store must be running. */
export async function seed(env) {
  if (!existsSync(join(ROOT, 'db/seed/run.ts'))) return;
  await timed('hanging the demo garments', () =>
    run(process.execPath, [...TS_FLAGS, 'db/seed/run.ts'], { cwd: ROOT, env }),
  );
}
