import { randomUUID } from 'node:crypto';
import type { Sql } from 'postgres';
import type { Viewer } from '@/db/queries/viewer';

/** Someone with an account, as a request would bring them. */
export async function makeViewer(owner: Sql, displayName: string): Promise<Viewer> {
  const userId = randomUUID();
  const email = `${userId}@example.test`;
  await owner`insert into users (id, email, display_name, password_hash, email_verified_at)
    values (${userId}, ${email}, ${displayName}, 'none', now())`;
  return {
    userId,
    email,
    displayName,
    isAdmin: false,
    isPatternMaker: false,
    isFitter: false,
    unit: 'cm',
    words: 'uk',
    hidesMeasurements: false,
  };
}

interface MadeRound {
  roundId: string;
  journalId: string;
  wearerId: string;
  patternId: string;
}

/** A first round with everything above it, straight into the tables. */
export async function makeRound(owner: Sql, { userId }: Viewer): Promise<MadeRound> {
  const [wearerId, patternId, versionId, journalId, muslinId, roundId] = Array.from({ length: 6 }, () =>
    randomUUID(),
  ) as [string, string, string, string, string, string];
  await owner`insert into wearers (id, owner_id, name) values (${wearerId}, ${userId}, 'W.')`;
  await owner`insert into patterns (id, owner_id, name) values (${patternId}, ${userId}, 'Wide leg')`;
  await owner`insert into pattern_versions (id, pattern_id, ordinal) values (${versionId}, ${patternId}, 1)`;
  await owner`insert into journals (id, owner_id, wearer_id, pattern_version_id, name)
    values (${journalId}, ${userId}, ${wearerId}, ${versionId}, 'Linen pair')`;
  await owner`insert into muslins (id, journal_id, ordinal) values (${muslinId}, ${journalId}, 1)`;
  await owner`insert into rounds (id, journal_id, muslin_id, number) values (${roundId}, ${journalId}, ${muslinId}, 1)`;
  return { roundId, journalId, wearerId, patternId };
}
