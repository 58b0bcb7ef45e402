import { v7 } from 'uuid';
import type { Sql } from 'postgres';

const LONG =
  'Winterfest wide-legged herringbone trousers with a contoured band, second attempt after the great shrinkage';

/** A rail of forty garments with long names, one of them with twelve rounds: for the account with this address. */
export async function fillRail(sql: Sql, email: string): Promise<{ journalId: string; roundIds: string[] }> {
  const [user] = await sql`select id from users where email = ${email}`;
  const ownerId = String(user?.id);
  const [wearerId, patternId, draftId] = [v7(), v7(), v7()];
  const roundIds = Array.from({ length: 12 }, () => v7());
  const journals = Array.from({ length: 40 }, (_, i) => ({ id: v7(), name: `${LONG} ${i + 1}` }));
  await sql.begin(async (tx) => {
    await tx`insert into wearers (id, owner_id, name) values (${wearerId}, ${ownerId}, 'Maximiliane-Theodora von der Langenwiese')`;
    await tx`insert into patterns (id, owner_id, name, maker) values (${patternId}, ${ownerId}, ${LONG}, 'Unnamed cutter')`;
    await tx`insert into pattern_versions (id, pattern_id, ordinal) values (${draftId}, ${patternId}, 1)`;
    for (const { id, name } of journals) {
      const muslinId = v7();
      const count = id === journals[0]?.id ? 12 : 1;
      await tx`insert into journals (id, owner_id, wearer_id, pattern_version_id, name) values (${id}, ${ownerId}, ${wearerId}, ${draftId}, ${name})`;
      await tx`insert into muslins (id, journal_id, ordinal) values (${muslinId}, ${id}, 1)`;
      for (let number = 1; number <= count; number += 1) {
        const roundId = count === 12 ? roundIds[number - 1]! : v7();
        await tx`insert into rounds (id, journal_id, muslin_id, number, begun) values (${roundId}, ${id}, ${muslinId}, ${number}, ${number === 1 ? 'new-cloth' : 're-baste'})`;
      }
    }
  });
  return { journalId: journals[0]?.id ?? '', roundIds };
}
