import { createHash, randomBytes } from 'node:crypto';
import type { Sql, TransactionSql } from 'postgres';
import { v7 } from 'uuid';
import { type Role, ROLES } from './roles';

export interface World {
  wearerId: string;
  patternId: string;
  draftId: string;
  journalId: string;
  roundId: string;
  changeId: string;
  photoId: string;
  measuredId: string;
  /** What the reader holds. */
  grantId: string;
  /** To the address of `other`, not answered yet, with the secret of its link. */
  invitationId: string;
  invitationToken: string;
  /** The account of the tester. */
  testerId: string;
  /** The owner's. */
  commentId: string;
  /** The fitter's, not answered. */
  proposalId: string;
  /** The secret of each role's session; none for who is signed out. */
  sessions: Record<Role, string | null>;
}

type Ids = Omit<World, 'sessions'>;
export const unknownIds = (): Ids => ({
  wearerId: v7(),
  patternId: v7(),
  draftId: v7(),
  journalId: v7(),
  roundId: v7(),
  changeId: v7(),
  photoId: v7(),
  measuredId: v7(),
  grantId: v7(),
  invitationId: v7(),
  invitationToken: randomBytes(32).toString('base64url'),
  testerId: v7(),
  commentId: v7(),
  proposalId: v7(),
});

const DAY_MS = 86_400_000;

async function addPerson(
  tx: TransactionSql,
  role: Role,
  userId: string,
): Promise<{ userId: string; secret: string }> {
  const secret = randomBytes(32).toString('base64url');
  await tx`insert into users (id, email, email_verified_at, display_name, password_hash, is_admin, is_pattern_maker, is_fitter)
    values (${userId}, ${`${userId}@example.org`}, now(), ${role}, 'none', ${role === 'admin'}, ${role === 'pattern maker'}, ${role === 'fitter'})`;
  const inAWeek = new Date(Date.now() + 7 * DAY_MS);
  await tx`insert into sessions (id, user_id, expires_at, ends_at)
    values (${createHash('sha256').update(secret).digest('hex')}, ${userId}, ${inAWeek}, ${inAWeek})`;
  return { userId, secret };
}

async function addThings(tx: TransactionSql, ownerId: string, ids: Ids): Promise<void> {
  const muslinId = v7();
  await tx`insert into wearers (id, owner_id, name) values (${ids.wearerId}, ${ownerId}, 'Ann')`;
  await tx`insert into patterns (id, owner_id, name) values (${ids.patternId}, ${ownerId}, 'Wide legs')`;
  await tx`insert into pattern_versions (id, pattern_id, ordinal) values (${ids.draftId}, ${ids.patternId}, 1)`;
  await tx`insert into journals (id, owner_id, wearer_id, pattern_version_id, name)
    values (${ids.journalId}, ${ownerId}, ${ids.wearerId}, ${ids.draftId}, 'Wool trousers')`;
  await tx`insert into muslins (id, journal_id, ordinal) values (${muslinId}, ${ids.journalId}, 1)`;
  await tx`insert into rounds (id, journal_id, muslin_id, number) values (${ids.roundId}, ${ids.journalId}, ${muslinId}, 1)`;
  await tx`insert into rounds (id, journal_id, muslin_id, number, begun) values (${v7()}, ${ids.journalId}, ${muslinId}, 2, 're-baste')`;
  await tx`insert into changes (id, round_id, author_id, correction, side)
    values (${ids.changeId}, ${ids.roundId}, ${ownerId}, 'any', 'both')`;
  await tx`insert into round_measured (id, round_id, label, terms, need_mm, sd_mm)
    values (${ids.measuredId}, ${ids.roundId}, 'Hip', '[{"dimension":"hip-front","weight":1,"side":"both"}]', 12, 8)`;
  await tx`insert into photos (id, round_id, upload_key, view, width_px, height_px, master_sha256, master_bytes)
    values (${ids.photoId}, ${ids.roundId}, ${v7()}, 'front', 800, 1200, 'none', 1)`;
}

/** What each role holds on the journal: level, until when, whether taken back. */
const GRANTS: Partial<Record<Role, { level: string; expiresInDays: number | null; isRevoked: boolean }>> = {
  reader: { level: 'read', expiresInDays: null, isRevoked: false },
  fitter: { level: 'fit', expiresInDays: 7, isRevoked: false },
  revoked: { level: 'fit', expiresInDays: null, isRevoked: true },
  expired: { level: 'fit', expiresInDays: -1, isRevoked: false },
  'pattern maker': { level: 'share-to-test', expiresInDays: null, isRevoked: false },
};

/** An owner with one of everything, and one person in each role towards it; people and things are new each time. */
export function makeWorld(sql: Sql): Promise<World> {
  return sql.begin(async (tx) => {
    const ids = unknownIds();
    const people = new Map<Role, { userId: string; secret: string }>();
    for (const role of ROLES)
      if (role !== 'anonymous')
        people.set(role, await addPerson(tx, role, role === 'tester' ? ids.testerId : v7()));
    const ownerId = people.get('owner')?.userId ?? '';
    await addThings(tx, ownerId, ids);
    for (const [role, { userId }] of people) {
      const grant = GRANTS[role];
      if (!grant) continue;
      const { level, expiresInDays, isRevoked } = grant;
      const expiresAt = expiresInDays === null ? null : new Date(Date.now() + expiresInDays * DAY_MS);
      await tx`insert into grants (id, subject_user_id, journal_id, level, granted_by, expires_at, revoked_at)
        values (${role === 'reader' ? ids.grantId : v7()}, ${userId}, ${ids.journalId}, ${level}, ${ownerId}, ${expiresAt}, ${isRevoked ? new Date() : null})`;
    }
    const otherEmail = `${people.get('other')?.userId}@example.org`;
    await tx`insert into grants (id, invited_email, token_hash, journal_id, level, granted_by)
      values (${ids.invitationId}, ${otherEmail}, ${createHash('sha256').update(ids.invitationToken).digest('hex')}, ${ids.journalId}, 'read', ${ownerId})`;
    await tx`insert into comments (id, round_id, author_id, body) values (${ids.commentId}, ${ids.roundId}, ${ownerId}, 'The left leg?')`;
    await tx`insert into proposals (id, round_id, author_id, reason)
      values (${ids.proposalId}, ${ids.roundId}, ${people.get('fitter')?.userId ?? ''}, 'Let it out first.')`;
    await tx`insert into proposed_changes (id, proposal_id, correction, side) values (${v7()}, ${ids.proposalId}, 'proposed', 'both')`;
    const sessions = Object.fromEntries(ROLES.map((role) => [role, people.get(role)?.secret ?? null]));
    return { ...ids, sessions: sessions as World['sessions'] };
  });
}
