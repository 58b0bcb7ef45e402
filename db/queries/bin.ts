import 'server-only';
import { and, eq, sql, type SQL } from 'drizzle-orm';
import { db } from '../client';
import { journals } from '../schema/journals';
import { patterns } from '../schema/patterns';
import { rounds } from '../schema/rounds';
import { wearers } from '../schema/wearers';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';

const BINNED = { wearer: wearers, pattern: patterns, journal: journals, round: rounds } as const;

/**
 * Puts one thing into the bin, where it and everything of its own is out of sight and is erased after 30 days.
 * @param allowed the permission, as a condition on that table
 * @returns whether there was something to put away
 */
export async function moveToBin(
  viewer: Viewer,
  objectKind: keyof typeof BINNED,
  id: string,
  allowed: SQL | undefined,
): Promise<boolean> {
  const table = BINNED[objectKind];
  return db().transaction(async (tx) => {
    const gone = await tx
      .update(table)
      .set({ deletedAt: sql`now()`, version: sql`${table.version} + 1` })
      .where(and(eq(table.id, id), allowed))
      .returning({ id: table.id });
    if (gone.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'delete', objectKind, objectId: id });
    return true;
  });
}
