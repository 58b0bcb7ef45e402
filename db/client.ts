import 'server-only';
import { drizzle, type PostgresJsDatabase } from 'drizzle-orm/postgres-js';
import postgres from 'postgres';
import { env } from '@/lib/env';
import * as schema from './schema';

export type Database = PostgresJsDatabase<typeof schema>;
/** What a query function works on: the pool, or the transaction it was called in. */
export type Executor = Pick<
  Database,
  'select' | 'selectDistinct' | 'insert' | 'update' | 'delete' | 'execute'
>;

const kept = globalThis as typeof globalThis & { ruckleDatabase?: Database };

/** One pool a process; kept on the global so that a reload in development does not open another. */
export function db(): Database {
  kept.ruckleDatabase ??= drizzle(
    postgres(env().DATABASE_URL, { max: 10, idle_timeout: 60, onnotice: () => {} }),
    { schema, casing: 'snake_case' },
  );
  return kept.ruckleDatabase;
}
