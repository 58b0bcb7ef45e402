import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addMark,
  editMark,
  type MarkHistory,
  redo,
  removeMark,
  replaceMarks,
  startHistory,
  undo,
} from '@/components/marks/model/history';
import { inOrder, type Mark, moveMark } from '@/components/marks/model/mark';
import { MARKS_MAX } from '@/components/marks/mark-limits-schema';
import { anyMark, anyMarks } from '../../support/draw-marks';

type Step = (history: MarkHistory) => MarkHistory;
const anyStep: fc.Arbitrary<Step> = anyMark.chain((mark) =>
  fc.constantFrom<Step>(
    (history) => addMark(history, mark),
    (history) => removeMark(history, mark.id),
    (history) => editMark(history, mark.id, (now) => ({ ...now, severity: 3 })),
    (history) => editMark(history, mark.id, (now) => moveMark(now, 0.1, -0.1), 'nudge'),
  ),
);
const after = (marks: Mark[], steps: Step[]) =>
  steps.reduce((history, make) => make(history), startHistory(marks));
const back = (history: MarkHistory): MarkHistory =>
  history.past.length === 0 ? history : back(undo(history));
const forth = (history: MarkHistory): MarkHistory =>
  history.future.length === 0 ? history : forth(redo(history));

describe('undo and redo', () => {
  it('lead back to the beginning and forth to the end, whatever was done', () => {
    fc.assert(
      fc.property(anyMarks, fc.array(anyStep, { maxLength: 30 }), (marks, steps) => {
        const end = after(marks, steps);
        const start = back(end);
        expect(start.marks).toEqual(inOrder(marks));
        expect(forth(start).marks).toEqual(end.marks);
      }),
    );
  });

  it('outlive being written down', () => {
    fc.assert(
      fc.property(anyMarks, fc.array(anyStep, { maxLength: 12 }), (marks, steps) => {
        const end = after(marks, steps);
        const read = JSON.parse(JSON.stringify(end)) as MarkHistory;
        expect(undo(read).marks).toEqual(undo(end).marks);
      }),
    );
  });

  it('neither lose nor bring back what another tab did in between', () => {
    fc.assert(
      fc.property(anyMark, anyMark, (mine, theirs) => {
        fc.pre(mine.id !== theirs.id);
        const merged = replaceMarks(addMark(startHistory([]), mine), [mine, theirs]);
        expect(undo(merged).marks).toEqual([theirs]);
        expect(redo(undo(merged)).marks).toEqual(inOrder([mine, theirs]));
      }),
    );
  });

  it('pass over a step whose mark was changed elsewhere since', () => {
    fc.assert(
      fc.property(anyMark, (mark) => {
        const drawn = addMark(startHistory([]), { ...mark, note: '' });
        const elsewhere = { ...mark, note: 'changed in the other tab' };
        expect(undo(replaceMarks(drawn, [elsewhere])).marks).toEqual([elsewhere]);
      }),
    );
  });
});

describe('steps', () => {
  const mark: Mark = { id: 'a', kind: 'tight', severity: 2, side: 'both', points: [], note: '' };

  it('that change nothing are none', () => {
    const start = startHistory([mark]);
    expect(editMark(start, 'a', (now) => ({ ...now })).past).toEqual([]);
    expect(removeMark(start, 'nobody').past).toEqual([]);
  });

  it('of one run are one step', () => {
    let history = startHistory([mark]);
    for (const note of ['h', 'he', 'hem'])
      history = editMark(history, 'a', (now) => ({ ...now, note }), 'note');
    expect(history.past).toHaveLength(1);
    expect(undo(history).marks[0]?.note).toBe('');
  });

  it('forget what was undone once something new is done', () => {
    const undone = undo(editMark(startHistory([mark]), 'a', (now) => ({ ...now, severity: 3 })));
    expect(editMark(undone, 'a', (now) => ({ ...now, note: 'x' })).future).toEqual([]);
  });

  it('fill a photo up to its most and no further', () => {
    const full = Array.from({ length: MARKS_MAX }, (_, i) => ({ ...mark, id: String(i).padStart(4, '0') }));
    const history = startHistory(full);
    expect(addMark(history, { ...mark, id: 'one more' })).toBe(history);
  });
});
