import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inOrder, type Mark } from '@/components/marks/model/mark';
import {
  batchOf,
  batchSize,
  mergeServer,
  partToSend,
  settleConflict,
  type SavedMark,
  type Standing,
  startStanding,
  whenAnswered,
  whenSent,
} from '@/components/marks/model/sync';
import { judgeMarks } from '@/db/queries/judge-marks';
import { anyMarks } from '../../support/draw-marks';

/** The server's part, as its own judge decides, with rows in memory. */
function serverOf(held: Map<string, SavedMark>, batch: ReturnType<typeof batchOf>) {
  const judged = judgeMarks(
    [...held.values()].map((mark) => ({ ...mark, isMine: true }) as never),
    batch as never,
  );
  for (const id of judged.toDelete) held.delete(id);
  const written = judged.toWrite.map((mark) => ({
    ...(mark as unknown as Mark),
    version: (held.get(mark.id)?.version ?? 0) + 1,
  }));
  for (const mark of written) held.set(mark.id, mark);
  return {
    saved: [...written, ...(judged.standing as unknown as SavedMark[])],
    deleted: judged.deleted,
    conflicts: judged.conflicts as unknown as { id: string; theirs: SavedMark | null }[],
  };
}
const bare = (held: Map<string, SavedMark>) =>
  inOrder([...held.values()].map(({ version: _, ...mark }) => mark));

/** Sends everything; where `loses`, the answer of the first batch is lost on its way. */
function exchange(marks: Mark[], standing: Standing, held: Map<string, SavedMark>, loses: boolean): Standing {
  const batch = partToSend(batchOf(marks, standing), new Set());
  if (batchSize(batch) === 0) return standing;
  const sent = whenSent(standing, batch);
  const answer = serverOf(held, batch);
  if (loses) return exchange(marks, sent, held, false);
  const { standing: now, conflicts } = whenAnswered(sent, standing, answer);
  expect(conflicts).toEqual([]);
  return exchange(marks, now, held, false);
}

describe('marks on their way to the server', () => {
  it('arrive as they are, edit after edit, and then nothing waits', () => {
    fc.assert(
      fc.property(fc.array(anyMarks, { minLength: 1, maxLength: 5 }), (states) => {
        const held = new Map<string, SavedMark>();
        let standing = startStanding();
        for (const marks of states) standing = exchange(inOrder(marks), standing, held, false);
        expect(bare(held)).toEqual(inOrder(states.at(-1)!));
        expect(batchSize(batchOf(inOrder(states.at(-1)!), standing))).toBe(0);
      }),
    );
  });

  it('arrive once when an answer is lost, and their own echo is no conflict', () => {
    fc.assert(
      fc.property(anyMarks, anyMarks, (first, second) => {
        const held = new Map<string, SavedMark>();
        const standing = exchange(inOrder(first), startStanding(), held, true);
        exchange(inOrder(second), standing, held, true);
        expect(bare(held)).toEqual(inOrder(second));
      }),
    );
  });

  it('show both versions when somebody else changed the same mark meanwhile', () => {
    const mark: Mark = { id: 'a', kind: 'tight', severity: 1, side: 'both', points: [], note: '' };
    const held = new Map<string, SavedMark>();
    const standing = exchange([mark], startStanding(), held, false);
    held.set('a', { ...mark, note: 'from the other phone', version: 2 });
    const mine = { ...mark, note: 'mine' };
    const batch = batchOf([mine], standing);
    const answered = whenAnswered(whenSent(standing, batch), standing, serverOf(held, batch));
    expect(answered.conflicts).toMatchObject([{ id: 'a', theirs: { note: 'from the other phone' } }]);
    expect(held.get('a')?.note).toBe('from the other phone');

    const kept = settleConflict([mine], answered.standing, answered.conflicts[0]!, true);
    exchange(kept.marks, kept.standing, held, false);
    expect(held.get('a')?.note).toBe('mine');
    const theirs = settleConflict([mine], answered.standing, answered.conflicts[0]!, false);
    expect(theirs.marks[0]?.note).toBe('from the other phone');
  });

  it('keep what was done here and take everything else from the server', () => {
    fc.assert(
      fc.property(anyMarks, anyMarks, (here, there) => {
        const server = there.map((mark) => ({ ...mark, version: 1 }));
        const { marks } = mergeServer(inOrder(here), startStanding(), server);
        const names = new Set(here.map(({ id }) => id));
        expect(marks).toEqual(inOrder([...here, ...there.filter(({ id }) => !names.has(id))]));
      }),
    );
  });

  it('go out fifty at a time, without those that wait for a choice', () => {
    const many = Array.from({ length: 120 }, (_, i): Mark => ({ id: String(i), kind: 'pin', severity: 1, side: 'both', points: [], note: '' })); // prettier-ignore
    const part = partToSend(batchOf(many, startStanding()), new Set(['0']));
    expect(batchSize(part)).toBe(50);
    expect(part.upserts.map(({ mark }) => mark.id)).not.toContain('0');
  });
});
