import 'server-only';
import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { db } from '../client';
import { wearers } from '../schema/wearers';
import { recordAudit } from './audit';
import { moveToBin } from './bin';
import { writeGuarded } from './guarded';
import type { Written } from './outcome';
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

export function updateWearer(
  viewer: Viewer,
  id: string,
  seenVersion: number,
  edit: WearerInput,
): Promise<Written<WearerDto>> {
  return writeGuarded({
    viewer,
    objectKind: 'wearer',
    id,
    edit,
    write: async (tx) => {
      const mine = and(eq(wearers.id, id), ownedBy(viewer), eq(wearers.version, seenVersion));
      const set = { ...edit, version: sql`${wearers.version} + 1` };
      return (await tx.update(wearers).set(set).where(mine).returning({ id: wearers.id })).length > 0;
    },
    find: () => findWearer(viewer, id),
  });
}

/** Into the bin, with every journal of theirs out of sight. True when there was something to remove. */
export const removeWearer = (viewer: Viewer, id: string) => moveToBin(viewer, 'wearer', id, ownedBy(viewer));
