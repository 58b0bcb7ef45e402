import 'server-only';
import { sql } from 'drizzle-orm';
import PgBoss from 'pg-boss';
import type { Executor } from '@/db/client';

/** As text that the database casts itself: a missing value is null, an object JSON, a moment its ISO form. */
function bound(value: unknown): unknown {
  if (value === undefined || value === null) return null;
  if (value instanceof Date) return value.toISOString();
  return typeof value === 'object' ? JSON.stringify(value) : value;
}

/** pg-boss writes `$1, $2 …`; the transaction takes them as bound values. */
const inTransaction = (tx: Executor) => ({
  executeSql: async (text: string, values: unknown[] = []) => {
    const pieces = text.split(/\$(\d+)/);
    const chunks = pieces.map((piece, i) =>
      i % 2 === 0 ? sql.raw(piece) : sql`${bound(values[Number(piece) - 1])}`,
    );
    return { rows: [...(await tx.execute(sql.join(chunks)))] };
  },
});

let boss: PgBoss | undefined;

/** Never started: it only words the statement, which runs where the change runs. */
const wording = () =>
  (boss ??= new PgBoss({
    db: {
      executeSql: () => Promise.reject(new Error('a job is only ever enqueued inside a transaction')),
    },
  }));

/** A job that exists exactly when the change beside it does. */
export async function enqueue(tx: Executor, queue: string, data: Record<string, string>): Promise<void> {
  await wording().send(queue, data, { db: inTransaction(tx) });
}
