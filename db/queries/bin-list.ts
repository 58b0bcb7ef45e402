import 'server-only';
import { sql } from 'drizzle-orm';
import { db } from '../client';
import { recordAudit } from './audit';
import type { Viewer } from './viewer';

export const BIN_DAYS = 30;
export const BIN_KINDS = ['wearer', 'pattern', 'journal', 'round', 'photo'] as const;
export type BinKind = (typeof BIN_KINDS)[number];

export interface BinnedDto extends Record<string, unknown> {
  kind: BinKind;
  id: string;
  /** A name, or the view of a photo. */
  name: string;
  /** Where it belongs: the journal of a round, journal and round of a photo; empty else. */
  place: string;
  deletedAt: string;
}

/** Everything of the viewer's own that lies in the bin, last put away first. */
export async function listBin(viewer: Viewer): Promise<BinnedDto[]> {
  const mine = sql`${viewer.userId}::uuid`;
  const rows = await db().execute<BinnedDto>(sql`
    select binned.kind, binned.id, binned.name, binned.place, binned.at as "deletedAt" from (
      select 'wearer' as kind, id, name, '' as place, deleted_at as at from wearers where owner_id = ${mine} and deleted_at is not null
      union all select 'pattern', id, name, '', deleted_at from patterns where owner_id = ${mine} and deleted_at is not null
      union all select 'journal', id, name, '', deleted_at from journals where owner_id = ${mine} and deleted_at is not null
      union all select 'round', r.id, 'Round ' || r.number, j.name, r.deleted_at
        from rounds r join journals j on j.id = r.journal_id where j.owner_id = ${mine} and r.deleted_at is not null
      union all select 'photo', p.id, p.view, j.name || ', round ' || r.number, p.deleted_at
        from photos p join rounds r on r.id = p.round_id join journals j on j.id = r.journal_id
        where j.owner_id = ${mine} and p.deleted_at is not null
    ) binned order by binned.at desc limit 200`);
  return [...rows];
}

const TABLES = { wearer: 'wearers', pattern: 'patterns', journal: 'journals', round: 'rounds', photo: 'photos' } as const; // prettier-ignore

const ownedRows = (kind: BinKind, viewer: Viewer) => {
  const mine = sql`${viewer.userId}::uuid`;
  if (kind === 'round') return sql`t.journal_id in (select id from journals where owner_id = ${mine})`;
  if (kind === 'photo')
    return sql`t.round_id in (select r.id from rounds r join journals j on j.id = r.journal_id where j.owner_id = ${mine})`;
  return sql`t.owner_id = ${mine}`;
};

/** Brings one thing of the viewer's own back as it was. False when there is no such thing in the bin. */
export async function restoreFromBin(viewer: Viewer, kind: BinKind, id: string): Promise<boolean> {
  return db().transaction(async (tx) => {
    const back = await tx.execute(sql`
      update ${sql.identifier(TABLES[kind])} t set deleted_at = null, version = t.version + 1
      where t.id = ${id} and t.deleted_at is not null and ${ownedRows(kind, viewer)} returning t.id`);
    if (back.length === 0) return false;
    await recordAudit(tx, { actorId: viewer.userId, verb: 'restore', objectKind: kind, objectId: id });
    return true;
  });
}
