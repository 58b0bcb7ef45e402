import 'server-only';
import { eq, sql } from 'drizzle-orm';
import { db } from '../client';
import { users } from '../schema/users';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';

export interface Preferences {
  displayName: string;
  unit: 'cm' | 'in';
  words: 'uk' | 'us' | 'tailor';
  hidesMeasurements: boolean;
  isFitter: boolean;
  isPatternMaker: boolean;
}

/** Sets how Ruckle speaks to the viewer. Nothing here lets anyone see more. */
export async function savePreferences(viewer: Viewer, preferences: Preferences): Promise<void> {
  await db().transaction(async (tx) => {
    await tx
      .update(users)
      .set({ ...preferences, version: sql`${users.version} + 1` })
      .where(eq(users.id, viewer.userId));
    const fields = Object.keys(preferences);
    await recordAudit(tx, {
      actorId: viewer.userId,
      verb: 'update',
      objectKind: 'user',
      objectId: viewer.userId,
      fields,
    });
  });
}
