import 'server-only';
import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { db } from '../client';
import { wearers } from '../schema/wearers';
import { recordAudit } from './audit';
import { moveToBin } from './bin';
import { done, missing, type Written } from './outcome';
import type { Viewer } from './viewer';

const COLUMNS = {
  id: wearers.id,
  name: wearers.name,
  isSelf: wearers.isSelf,
  isUnder18: wearers.isUnder18,
  fittedFor: wearers.fittedFor,
  wornBeneath: wearers.wornBeneath,
  shape: wearers.shape,
  consentsMeasure: wearers.consentsMeasure,
  consentsPhotograph: wearers.consentsPhotograph,
  consentsShare: wearers.consentsShare,
  consentOn: wearers.consentOn,
  version: wearers.version,
};

const ownedBy = (viewer: Viewer) => and(eq(wearers.ownerId, viewer.userId), isNull(wearers.deletedAt));

export type WearerDto = Awaited<ReturnType<typeof listWearers>>[number];
export type WearerInput = Omit<WearerDto, 'id' | 'version'>;

export function listWearers(viewer: Viewer) {
  return db()
    .select(COLUMNS)
    .from(wearers)
    .where(ownedBy(viewer))
    .orderBy(desc(wearers.isSelf), wearers.id)
    .limit(200);
}

export async function findWearer(viewer: Viewer, id: string): Promise<WearerDto | null> {
  const [row] = await db()
    .select(COLUMNS)
    .from(wearers)
    .where(and(eq(wearers.id, id), ownedBy(viewer)));
  return row ?? null;
}

/** Sending the same id again gives back the row it made the first time. Null when the id is somebody else's. */
export async function createWearer(
  viewer: Viewer,
  id: string,
  input: WearerInput,
): Promise<WearerDto | null> {
  return db().transaction(async (tx) => {
    const [row] = await tx
      .insert(wearers)
      .values({ ...input, id, ownerId: viewer.userId })
      .onConflictDoNothing()
      .returning(COLUMNS);
    if (!row) return findWearer(viewer, id);
    await recordAudit(tx, { actorId: viewer.userId, verb: 'create', objectKind: 'wearer', objectId: id });
    return row;
  });
}

export async function updateWearer(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  input: WearerInput,
): Promise<Written<WearerDto>> {
  return db().transaction(async (tx) => {
    const [row] = await tx
      .update(wearers)
      .set({ ...input, version: sql`${wearers.version} + 1` })
      .where(and(eq(wearers.id, id), ownedBy(viewer), eq(wearers.version, seenVersion)))
      .returning(COLUMNS);
    if (row) {
      const fields = Object.keys(input);
      await recordAudit(tx, {
        actorId: viewer.userId,
        verb: 'update',
        objectKind: 'wearer',
        objectId: id,
        fields,
      });
      return done(row);
    }
    const theirs = await findWearer(viewer, id);
    return theirs ? { kind: 'conflict', mine: input, theirs } : missing();
  });
}

/** Into the bin, with every journal of theirs out of sight. True when there was something to remove. */
export const removeWearer = (viewer: Viewer, id: string) => moveToBin(viewer, 'wearer', id, ownedBy(viewer));
