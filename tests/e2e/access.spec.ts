import { expect, test } from '@playwright/test';
import postgres from 'postgres';
import { MATRIX } from '../access/matrix';
import { ROLES } from '../access/roles';
import { nameOf, type Row } from '../access/row';
import { smallJpeg } from '../access/small-jpeg';
import { makeWorld, unknownIds, type World } from '../access/world';
import { answerOf, askAction, askHandler, askPage, inOrder, storePhoto, withoutIds } from '../support/ask';

/** The matrix: every page, handler and action before every role, on people and things of its own. */
const sql = postgres(process.env.ADMIN_DATABASE_URL ?? '', { max: 2 });
test.afterAll(() => sql.end());

async function worldFor(row: Row): Promise<World> {
  const world = await makeWorld(sql);
  if (row.kind !== 'handler') return world;
  if (row.isInBin) await sql`update photos set deleted_at = now() where id = ${world.photoId}`;
  return row.hasFiles ? { ...world, photoId: await storePhoto(world, await smallJpeg()) } : world;
}

for (const row of MATRIX) {
  test(`${nameOf(row)} is open to whom it should be, and to nobody else`, async () => {
    const world = await worldFor(row);
    const unknown = unknownIds();
    const send = (ids: Omit<World, 'sessions'>, session: string | null) => {
      if (row.kind === 'page') return askPage(row, ids, session);
      if (row.kind === 'handler') return askHandler(row, ids, session);
      return askAction(row, world.sessions.owner, session);
    };
    for (const role of inOrder(ROLES)) {
      const session = world.sessions[role];
      const answered = await send(world, session);
      expect(`${role}: ${answerOf(answered)}`).toBe(`${role}: ${row.access[role]}`);
      if (row.access[role] === 'open') continue;
      const missing = await send(unknown, session);
      expect(missing.status, `${role}: a missing thing`).toBe(answered.status);
      expect(withoutIds(missing.body, unknown), `${role}: a missing thing`).toBe(
        withoutIds(answered.body, world),
      );
    }
  });
}
