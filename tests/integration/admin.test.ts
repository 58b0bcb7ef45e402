import { beforeAll, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { listAudit, listTroubles, listUsers, setUserFlags } from '@/db/queries/admin';
import { findDesk } from '@/db/queries/desk';
import { mayServePhoto } from '@/db/queries/photos';
import type { Viewer } from '@/db/queries/viewer';
import { beginSession, viewerOfSecret } from '@/lib/auth/sessions';
import { databaseOfFile } from '../support/database';
import { makeRound, makeViewer } from '../support/people';

const database = databaseOfFile();
let admin: Viewer;
let second: Viewer;
let other: Viewer;
let made: Awaited<ReturnType<typeof makeRound>>;
const photoId = v7();

beforeAll(async () => {
  const people = await Promise.all(['Admin', 'Second', 'Other'].map((name) => makeViewer(database.owner, name))); // prettier-ignore
  [admin, second, other] = people as [Viewer, Viewer, Viewer];
  await database.owner`update users set is_admin = true where id in ${database.owner([admin.userId, second.userId])}`;
  [admin, second] = [
    { ...admin, isAdmin: true },
    { ...second, isAdmin: true },
  ];
  made = await makeRound(database.owner, other);
  await database.owner`insert into photos (id, round_id, upload_key, view, width_px, height_px, master_sha256, master_bytes)
    values (${photoId}, ${made.roundId}, ${v7()}, 'front', 800, 1200, 'none', 2048)`;
});

describe('the pages of an admin', () => {
  it('are there for who is one in the table now, whatever the session says', async () => {
    for (const who of [other, { ...other, isAdmin: true }])
      expect([await listUsers(who), await listTroubles(who), await listAudit(who, {})]).toEqual([null, null, null]); // prettier-ignore
    expect(await setUserFlags({ ...other, isAdmin: true }, admin.userId, { isSuspended: true })).toBe(false);
  });

  it('show accounts with what they take up, and open nothing of anyone’s', async () => {
    const row = (await listUsers(admin))?.find(({ id }) => id === other.userId);
    expect(row).toMatchObject({ email: other.email, photos: 1, bytes: 2048 });
    expect(Object.keys(row ?? {})).not.toContain('passwordHash');
    expect(await findDesk(admin, made.journalId)).toBeNull();
    expect(await mayServePhoto(admin, photoId, 1, 'readers')).toBe(false);
  });

  it('show letters that did not go through without what they say', async () => {
    await database.owner`insert into mails (id, kind, message_id, to_email, subject, text_body, html_body, failed_at)
      values (${v7()}, 'invitation', '<a@b>', 'secret@example.org', 's', 'a private word', 'a private word', now())`;
    const troubles = JSON.stringify(await listTroubles(admin));
    expect(troubles).toContain('<a@b>');
    expect(troubles).not.toMatch(/private|secret@/);
  });

  it('narrow the audit by who, what and which kind', async () => {
    await setUserFlags(admin, other.userId, { isAdmin: false });
    const found = await listAudit(admin, { actorId: admin.userId, verb: 'update', objectKind: 'user' });
    expect(found?.map(({ objectId, fields }) => [objectId, fields])).toEqual([[other.userId, ['isAdmin']]]);
    expect(await listAudit(admin, { actorId: second.userId })).toEqual([]);
    expect(await listAudit(admin, { before: found?.[0]?.id, verb: 'update' })).toEqual([]);
  });
});

describe('suspending', () => {
  it('ends every session at once and lets in nobody until it is lifted', async () => {
    const secret = await beginSession(other.userId, 'test', new Date());
    expect(await setUserFlags(admin, other.userId, { isSuspended: true })).toBe(true);
    expect(await viewerOfSecret(secret, new Date())).toBeNull();
    const again = await beginSession(other.userId, 'test', new Date());
    expect(await viewerOfSecret(again, new Date())).toBeNull();
    await setUserFlags(admin, other.userId, { isSuspended: false });
    const after = await beginSession(other.userId, 'test', new Date());
    expect(await viewerOfSecret(after, new Date())).not.toBeNull();
  });

  it('is done to nobody by themselves, and leaves one admin where two take the flag from each other at once', async () => {
    expect(await setUserFlags(admin, admin.userId, { isAdmin: false })).toBe(false);
    const both = await Promise.all([
      setUserFlags(admin, second.userId, { isAdmin: false }),
      setUserFlags(second, admin.userId, { isAdmin: false }),
    ]);
    expect(both.sort()).toEqual([false, true]);
    expect(await database.owner`select 1 from users where is_admin`).toHaveLength(1);
  });
});
