import { beforeEach, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import { findDesk } from '@/db/queries/desk';
import { listFittings } from '@/db/queries/fittings';
import {
  acceptInvitation,
  declineInvitation,
  findInvitation,
  leaveJournal,
  listInvitations,
} from '@/db/queries/invitations';
import { findJournal } from '@/db/queries/journals';
import { issueLinkSecret } from '@/db/queries/mails';
import { invite, listGrants, resendInvitation, revokeGrant } from '@/db/queries/sharing';
import type { Viewer } from '@/db/queries/viewer';
import { databaseOfFile } from '../../support/database';
import { makeRound, makeViewer } from '../../support/people';
import { invitationTo, openTo } from '../../support/sharing';

const database = databaseOfFile();
let owner: Viewer;
let friend: Viewer;
let other: Viewer;
let round: Awaited<ReturnType<typeof makeRound>>;
beforeEach(async () => {
  owner = await makeViewer(database.owner, 'Ada');
  friend = await makeViewer(database.owner, 'Friend');
  other = await makeViewer(database.owner, 'Other');
  round = await makeRound(database.owner, owner);
});

const journal = () => ({ journalId: round.journalId });
const lettersTo = (email: string) =>
  database.owner<{ id: string; message_id: string; subject: string; text_body: string; grant_id: string }[]>`
    select id, message_id, subject, text_body, grant_id from mails where to_email = ${email} order by id`;

/** The secret that the letter of an invitation goes out with. */
async function linkOf(grantId: string): Promise<string> {
  const issued = await issueLinkSecret({ userId: null, kind: 'invitation', grantId, messageId: '', toEmail: '', subject: '', textBody: '', htmlBody: '' }); // prettier-ignore
  if (issued === 'void' || !issued.secret) throw new Error('the invitation is void');
  return issued.secret;
}
const sees = async (viewer: Viewer) => (await findDesk(viewer, round.journalId)) !== null;

describe('an invitation', () => {
  it('opens nothing until it is taken up, then what it names, and only that', async () => {
    const grantId = await invitationTo(owner, { roundId: round.roundId }, friend, 'read');
    expect(await sees(friend)).toBe(false);
    expect(await acceptInvitation(friend, { token: await linkOf(grantId) })).toEqual({
      journalId: round.journalId,
      roundNumber: 1,
    });
    expect(await sees(friend)).toBe(true);
    expect(await findJournal(friend, round.journalId)).toBeNull(); // one round is not the journal
    expect(await sees(other)).toBe(false);
  });

  it('says who invites to what and nothing else, and reading it takes nothing up', async () => {
    const token = await linkOf(await invitationTo(owner, journal(), friend));
    for (let opened = 0; opened < 3; opened++)
      expect(Object.keys((await findInvitation(token)) ?? {}).sort()).toEqual([
        'expiresAt',
        'id',
        'inviterName',
        'isOneRound',
        'level',
      ]);
    expect(await acceptInvitation(friend, { token })).not.toBeNull();
  });

  it('is not used up by the wrong account, and works once', async () => {
    const grantId = await invitationTo(owner, journal(), friend);
    const token = await linkOf(grantId);
    for (const key of [{ token }, { grantId }]) {
      expect(await acceptInvitation(other, key)).toBeNull();
      expect(await declineInvitation(other, key, true)).toBe(false);
      expect(await acceptInvitation(owner, key)).toBeNull();
    }
    expect(await acceptInvitation(friend, { token })).not.toBeNull();
    expect(await acceptInvitation(friend, { token })).toBeNull();
    expect(await findInvitation(token)).toBeNull();
  });

  it('stands in the database as a hash only', async () => {
    const token = await linkOf(await invitationTo(owner, journal(), friend));
    const dump = JSON.stringify([await database.owner`select * from grants`, await database.owner`select * from mails`]); // prettier-ignore
    expect(dump).not.toContain(token);
  });

  it('ends when it is taken back, runs out, or the thing goes into the bin', async () => {
    for (const end of [
      (id: string) => revokeGrant(owner, id),
      (id: string) => database.owner`update grants set expires_at = now() - interval '1 second' where id = ${id}`,
      () => database.owner`update journals set deleted_at = now() where id = ${round.journalId}`,
    ]) {
      const grantId = await invitationTo(owner, journal(), friend);
      const token = await linkOf(grantId);
      await end(grantId);
      expect(await findInvitation(token)).toBeNull();
      expect(await acceptInvitation(friend, { grantId })).toBeNull();
    }
  }); // prettier-ignore

  it('waits also for who signs in with its address', async () => {
    const grantId = await invitationTo(owner, journal(), friend);
    expect((await listInvitations(friend)).map(({ id }) => id)).toEqual([grantId]);
    expect(await listInvitations(other)).toEqual([]);
  });

  it('sent twice under one id is one invitation and one letter; sent again, another letter and an end of the old link', async () => {
    const input = { id: v7(), email: friend.email, level: 'read', expiresInDays: 3 } as const;
    await invite(owner, journal(), input);
    await invite(owner, journal(), input);
    expect(await lettersTo(friend.email)).toHaveLength(1);
    const before = await linkOf(input.id);
    expect(await resendInvitation(owner, input.id)).toBe(true);
    const ids = (await lettersTo(friend.email)).map(({ message_id }) => message_id);
    expect(new Set(ids).size).toBe(2);
    await linkOf(input.id);
    expect(await findInvitation(before)).toBeNull();
    expect(await resendInvitation(other, input.id)).toBe(false);
  });

  it('is not sent where its end came before its letter went out', async () => {
    const grantId = await invitationTo(owner, journal(), friend);
    await revokeGrant(owner, grantId);
    await expect(linkOf(grantId)).rejects.toThrow('void');
  });

  it('carries a name into its subject as one line, whatever was chosen for a name', async () => {
    const names = ['Eve\r\nBcc: all@example.org', 'Eve\nX: y', 'Eve\u2028Bcc: z', 'E\u0000v\u202ee', '\u200b', 'x'.repeat(200)]; // prettier-ignore
    for (const displayName of names) await invitationTo({ ...owner, displayName }, journal(), friend);
    for (const { subject } of await lettersTo(friend.email))
      expect(subject).toMatch(/^[^\p{Cc}\p{Cf}\p{Zl}\p{Zp}]{1,40} asks for your eye$/u);
  });
});

describe('inviting', () => {
  it('is for the owner: to others there is nothing to invite to, and nothing is written', async () => {
    await openTo(owner, journal(), friend);
    const before = await database.owner`select count(*) from grants`;
    for (const who of [friend, other])
      for (const target of [journal(), { roundId: round.roundId }, { journalId: v7() }])
        expect(
          await invite(who, target, { id: v7(), email: 'x@example.test', level: 'read', expiresInDays: 1 }),
        ).toBeNull();
    expect(await database.owner`select count(*) from grants`).toEqual(before);
  });

  it('of oneself leads nowhere', async () => {
    expect(await invite(owner, journal(), { id: v7(), email: owner.email, level: 'read', expiresInDays: 1 })).toBe('oneself'); // prettier-ignore
  });

  it('reaches nobody who does not want it: the letter is not written, the inviter is told nothing', async () => {
    const grantId = await invitationTo(owner, journal(), friend);
    expect(await declineInvitation(friend, { grantId }, true)).toBe(true);
    const before = await lettersTo(friend.email);
    const again = await invitationTo(owner, journal(), friend);
    expect(await lettersTo(friend.email)).toEqual(before);
    expect(await listInvitations(friend)).toEqual([]);
    const states = (await listGrants(owner, round.journalId)).map(({ id, state }) => [id, state]);
    expect(states).toEqual([[again, 'waiting'], [grantId, 'declined']]); // prettier-ignore
  });
});

describe('what was opened', () => {
  it('is gone with the next request once it is taken back; only its owner can take it back', async () => {
    const grantId = await openTo(owner, journal(), friend);
    expect(await revokeGrant(other, grantId)).toBe(false);
    expect(await revokeGrant(friend, grantId)).toBe(false);
    expect(await sees(friend)).toBe(true);
    expect(await revokeGrant(owner, grantId)).toBe(true);
    expect(await sees(friend)).toBe(false);
    expect(await listFittings(friend)).toEqual([]);
  });

  it('closes at its end', async () => {
    const grantId = await openTo(owner, journal(), friend);
    await database.owner`update grants set expires_at = now() - interval '1 second' where id = ${grantId}`;
    expect(await sees(friend)).toBe(false);
  });

  it('can be given back', async () => {
    await openTo(owner, journal(), friend);
    await openTo(owner, { roundId: round.roundId }, friend);
    expect(await leaveJournal(other, round.journalId)).toBe(false);
    expect(await leaveJournal(friend, round.journalId)).toBe(true);
    expect(await sees(friend)).toBe(false);
  });

  it('tells its owner who looked when, and nobody else', async () => {
    await openTo(owner, journal(), friend);
    const looked = async () => (await listGrants(owner, round.journalId))[0]?.lastLookedAt;
    await findDesk(owner, round.journalId);
    expect(await looked()).toBeNull();
    await findDesk(friend, round.journalId);
    expect(await looked()).toBeInstanceOf(Date);
    for (const who of [friend, other]) expect(await listGrants(who, round.journalId)).toEqual([]);
  });

  it('hangs with those who were asked, what waits for a word of theirs first', async () => {
    await openTo(owner, journal(), friend, 'fit');
    const second = await makeRound(database.owner, owner);
    await openTo(owner, { roundId: second.roundId }, friend, 'read');
    await database.owner`insert into round_signs (round_id, author_id, sign, side, severity) values (${second.roundId}, ${friend.userId}, 'any', 'both', 1)`;
    const fittings = await listFittings(friend);
    expect(fittings.map(({ roundId, waits, mayFit }) => [roundId, waits, mayFit])).toEqual([
      [round.roundId, true, true],
      [second.roundId, false, false],
    ]);
    expect(await listFittings(owner)).toEqual([]);
  });
});

describe('someone else’s body', () => {
  const agree = (to: object) => database.owner`update wearers set ${database.owner(to as Record<string, unknown>)} where id = ${round.wearerId}`; // prettier-ignore
  const tryToInvite = () => invite(owner, journal(), { id: v7(), email: friend.email, level: 'read', expiresInDays: 1 }); // prettier-ignore

  it('is shown to nobody before they agreed to just that', async () => {
    await agree({ is_self: false, consents_measure: true, consents_photograph: true });
    expect(await tryToInvite()).toBe('no-consent');
    await agree({ consents_share: true, consent_until: '2020-01-01' });
    expect(await tryToInvite()).toBe('no-consent');
    await agree({ consent_until: null });
    expect(await tryToInvite()).toBe('invited');
  });

  it('is out of sight with the next request once they take their yes back', async () => {
    await agree({ is_self: false, consents_share: true });
    await openTo(owner, journal(), friend);
    await openTo(owner, { roundId: round.roundId }, friend);
    expect(await sees(friend)).toBe(true);
    await agree({ consents_share: false });
    expect([await sees(friend), await sees(owner)]).toEqual([false, true]);
  });
});
