import { drizzle } from 'drizzle-orm/postgres-js';
import { migrate } from 'drizzle-orm/postgres-js/migrator';
import { fileURLToPath } from 'node:url';
import PgBoss from 'pg-boss';
import postgres from 'postgres';
import { QUEUES } from '@/lib/jobs/queues';
import { ROLE_GRANTS } from './grants';

const LOCK = 7_235_551; // any constant: two migrations at once wait for each other
/** pg-boss makes this one itself when it starts to keep times; the worker's role may not make tables. */
const SCHEDULER_QUEUE = '__pgboss__send-it';

/** Brings the database named by `ownerUrl` to the newest schema: tables, the job queue's own schema, what each role may do. Safe to repeat. */
export async function migrateDatabase(ownerUrl: string): Promise<void> {
  const client = postgres(ownerUrl, { max: 1, onnotice: () => {} });
  try {
    await client`select pg_advisory_lock(${LOCK})`;
    await migrate(drizzle(client), {
      migrationsFolder: fileURLToPath(new URL('./migrations', import.meta.url)),
    });
    const boss = new PgBoss({ connectionString: ownerUrl, max: 1, supervise: false, schedule: false });
    await boss.start();
    for (const queue of QUEUES) {
      await boss.createQueue(queue.name, queue);
      await boss.updateQueue(queue.name, queue); // making one that is there already changes nothing
    }
    await boss.createQueue(SCHEDULER_QUEUE);
    await boss.stop({ graceful: false, wait: true });
    await client.unsafe(ROLE_GRANTS);
  } finally {
    await client.end();
  }
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const url = process.env.DATABASE_OWNER_URL;
  if (!url)
    throw new Error('DATABASE_OWNER_URL is not set: the migration runs as the owner of the database.');
  await migrateDatabase(url);
}
