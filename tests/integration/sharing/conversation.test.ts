import { beforeEach, describe, expect, it } from 'vitest';
import { v7 } from 'uuid';
import {
  addComment,
  editComment,
  listComments,
  removeComment,
  type CommentInput,
} from '@/db/queries/comments';
import { findConversation } from '@/db/queries/conversation';
import { findDesk } from '@/db/queries/desk';
import { findOwnMarks, saveMarks, type MarkInput } from '@/db/queries/marks';
import { answerProposal, listProposals, propose } from '@/db/queries/proposals';
import { revokeGrant } from '@/db/queries/sharing';
import type { Viewer } from '@/db/queries/viewer';
import { toMillimetres } from '@/diagnosis/units/millimetres';
import { databaseOfFile } from '../../support/database';
import { makeRound, makeViewer } from '../../support/people';
import { openTo } from '../../support/sharing';

const database = databaseOfFile();
let [owner, fitter, reader, other]: Viewer[] = [];
let roundId: string;
let journalId: string;
let grantId: string;
const photoId = { value: '' };

beforeEach(async () => {
  [owner, fitter, reader, other] = await Promise.all(['Ada', 'Fay', 'Ray', 'Oz'].map((name) => makeViewer(database.owner, name))); // prettier-ignore
  ({ roundId, journalId } = await makeRound(database.owner, owner!));
  photoId.value = await addPhotoTo(roundId);
  grantId = await openTo(owner!, { roundId }, fitter!, 'fit');
  await openTo(owner!, { roundId }, reader!, 'read');
});

async function addPhotoTo(round: string): Promise<string> {
  const id = v7();
  await database.owner`insert into photos (id, round_id, upload_key, view, width_px, height_px, master_sha256, master_bytes)
    values (${id}, ${round}, ${v7()}, 'front', 800, 1200, 'none', 1)`;
  return id;
}
const said = (body: string, more: Partial<CommentInput> = {}): CommentInput => ({ id: v7(), body, place: null, sign: null, asksCheck: null, ...more }); // prettier-ignore
const mark = (): MarkInput => ({ id: v7(), kind: 'tight', severity: 2, side: 'left', points: [{ x: 0.2, y: 0.2 }, { x: 0.4, y: 0.5 }], note: '' }); // prettier-ignore
const draw = (who: Viewer, ...marks: MarkInput[]) =>
  saveMarks(who, photoId.value, { revision: 1, upserts: marks.map((one) => ({ mark: one, seen: 0 })), deletes: [] }); // prettier-ignore

describe('two people on one photo', () => {
  it('each draw in a layer of their own, and each sees the other’s', async () => {
    const [hers, his] = [mark(), mark()];
    await draw(owner!, hers);
    await draw(fitter!, his);
    const seenBy = async (who: Viewer) => (await findConversation(who, roundId))?.marks.map(({ id, authorName }) => [id, authorName]); // prettier-ignore
    expect(await seenBy(owner!)).toEqual([[his.id, 'Fay']]);
    expect(await seenBy(fitter!)).toEqual([[hers.id, 'Ada']]);
    expect(await seenBy(reader!)).toEqual([[hers.id, 'Ada'], [his.id, 'Fay']]); // prettier-ignore
    expect((await findOwnMarks(owner!, photoId.value))?.marks.map(({ id }) => id)).toEqual([hers.id]);
  });

  it('cannot rewrite or delete a mark of the other', async () => {
    const hers = mark();
    await draw(owner!, hers);
    await saveMarks(fitter!, photoId.value, { revision: 1, upserts: [{ mark: { ...hers, note: 'mine now' }, seen: 1 }], deletes: [{ id: hers.id, seen: 1 }] }); // prettier-ignore
    const held = await findOwnMarks(owner!, photoId.value);
    expect(held?.marks).toEqual([{ ...hers, version: 1 }]);
  });

  it('is one while it is shared: with the next request after it is taken back nothing is there, for reading or writing', async () => {
    await draw(owner!, mark());
    const mine = said('One thing.');
    await addComment(fitter!, roundId, mine);
    await revokeGrant(owner!, grantId);
    expect(await findConversation(fitter!, roundId)).toBeNull();
    expect(await listComments(fitter!, roundId)).toEqual([]);
    expect(await addComment(fitter!, roundId, said('Late.'))).toBeNull();
    expect((await editComment(fitter!, mine.id, 1, 'Late.')).kind).toBe('missing');
    expect(await removeComment(fitter!, mine.id)).toBe(false);
    expect(await propose(fitter!, roundId, plan())).toBe(false);
    expect(await draw(fitter!, mark())).toEqual({ kind: 'missing' });
  });
});

describe('a comment', () => {
  it('is read by everyone the round is open to, and written by those who may fit', async () => {
    await addComment(owner!, roundId, said('Does the left leg twist?'));
    const place = { photoId: photoId.value, x: 0.5, y: 0.25 };
    await addComment(fitter!, roundId, said('Here.', { place, asksCheck: 'slide-a-finger' }));
    expect(await addComment(reader!, roundId, said('No.'))).toBeNull();
    expect(await addComment(other!, roundId, said('No.'))).toBeNull();
    const read = (await listComments(reader!, roundId)).map(({ body, authorName, x, asksCheck }) => [body, authorName, x, asksCheck]); // prettier-ignore
    expect(read).toEqual([['Does the left leg twist?', 'Ada', null, null], ['Here.', 'Fay', 0.5, 'slide-a-finger']]); // prettier-ignore
    expect(await listComments(other!, roundId)).toEqual([]);
  });

  it('is not pinned to a photo of another round', async () => {
    const foreign = await addPhotoTo((await makeRound(database.owner, other!)).roundId);
    for (const id of [foreign, v7()])
      expect(await addComment(fitter!, roundId, said('There.', { place: { photoId: id, x: 0, y: 0 } }))).toBeNull(); // prettier-ignore
  });

  it('sent again is one; under an id of someone else’s it is none', async () => {
    const one = said('Once.');
    await addComment(owner!, roundId, one);
    expect((await addComment(owner!, roundId, one))?.body).toBe('Once.');
    expect(await addComment(fitter!, roundId, { ...one, body: 'Mine.' })).toBeNull();
    expect((await listComments(owner!, roundId)).map(({ body }) => body)).toEqual(['Once.']);
  });

  it('rewritten twice from one version keeps the first and gives both back; nobody else rewrites it', async () => {
    const one = said('A');
    await addComment(fitter!, roundId, one);
    expect((await editComment(fitter!, one.id, 1, 'B')).kind).toBe('done');
    expect(await editComment(fitter!, one.id, 1, 'C')).toMatchObject({ kind: 'conflict', mine: { body: 'C' }, theirs: { body: 'B', version: 2 } }); // prettier-ignore
    expect((await editComment(owner!, one.id, 2, 'D')).kind).toBe('missing');
    expect(await removeComment(owner!, one.id)).toBe(false);
    expect(await removeComment(fitter!, one.id)).toBe(true);
  });
});

const proposed = (correction: string) => ({ id: v7(), correction, side: 'both', basis: 'round', plannedMm: toMillimetres(12), plannedTyped: '12mm', reason: '' }) as const; // prettier-ignore
const plan = () => ({ id: v7(), reason: 'Length before width.', changes: [proposed('first'), proposed('second')] }); // prettier-ignore
const ledger = async () =>
  (await findDesk(owner!, journalId))?.rounds[0]?.changes.map(({ correction, plannedMm, proposedBy }) => [correction, plannedMm, proposedBy]); // prettier-ignore

describe('a proposed plan', () => {
  it('changes nothing until its owner answers; taken in part, that part is in the ledger under its author’s name', async () => {
    const sent = plan();
    expect(await propose(fitter!, roundId, sent)).toBe(true);
    expect(await ledger()).toEqual([]);
    expect(await answerProposal(owner!, sent.id, [sent.changes[1]!.id])).toBe(1);
    expect(await ledger()).toEqual([['second', 12, 'Fay']]);
    const [shown] = await listProposals(fitter!, roundId);
    expect(shown?.changes.map(({ correction, answer }) => [correction, answer])).toEqual([['first', 'left'], ['second', 'taken']]); // prettier-ignore
  });

  it('is answered once, by the owner alone, and only with its own changes', async () => {
    const sent = plan();
    await propose(fitter!, roundId, sent);
    for (const who of [fitter!, reader!, other!]) expect(await answerProposal(who, sent.id, [])).toBeNull();
    const foreign = plan();
    expect(await answerProposal(owner!, sent.id, foreign.changes.map(({ id }) => id))).toBe(0); // prettier-ignore
    expect(await answerProposal(owner!, sent.id, sent.changes.map(({ id }) => id))).toBeNull(); // prettier-ignore
    expect(await ledger()).toEqual([]);
  });

  it('sent again is one, and is for those who may fit', async () => {
    const sent = plan();
    expect([await propose(fitter!, roundId, sent), await propose(fitter!, roundId, sent)]).toEqual([true, true]); // prettier-ignore
    expect(await listProposals(owner!, roundId)).toHaveLength(1);
    for (const who of [reader!, other!]) expect(await propose(who, roundId, plan())).toBe(false);
    expect(await listProposals(other!, roundId)).toEqual([]);
  });

  it('leaves alone what was made already', async () => {
    const sent = plan();
    await propose(fitter!, roundId, sent);
    await database.owner`insert into changes (id, round_id, author_id, correction, side, planned_mm, made_at)
      values (${v7()}, ${roundId}, ${owner!.userId}, 'first', 'both', 6, now())`;
    expect(await answerProposal(owner!, sent.id, sent.changes.map(({ id }) => id))).toBe(1); // prettier-ignore
    expect(await ledger()).toEqual([['first', 6, null], ['second', 12, 'Fay']]); // prettier-ignore
  });
});
