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

interface Kept {
  ruckleDatabase?: Database | undefined;
  ruckleConnections?: postgres.Sql | undefined;
}
const kept: typeof globalThis & Kept = globalThis;

/** One pool a process; kept on the global so that a reload in development does not open another. */
export function db(): Database {
  if (kept.ruckleDatabase) return kept.ruckleDatabase;
  kept.ruckleConnections = postgres(env().DATABASE_URL, { max: 10, idle_timeout: 60, onnotice: () => {} });
  kept.ruckleDatabase = drizzle(kept.ruckleConnections, { schema, casing: 'snake_case' });
  return kept.ruckleDatabase;
}

/** Lets go of the pool, for a process that is about to end. The next use opens another. */
export async function closeDatabase(): Promise<void> {
  const connections = kept.ruckleConnections;
  kept.ruckleDatabase = undefined;
  kept.ruckleConnections = undefined;
  await connections?.end();
}
