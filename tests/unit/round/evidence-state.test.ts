import { describe, expect, it } from 'vitest';
import {
  acknowledge,
  applyEdits,
  contestedEntries,
  dirtyEntries,
  type Edit,
  type EvidenceState,
  formOf,
  withDrafts,
} from '@/components/round/evidence-state';

const NOTHING: EvidenceState = { entries: {}, edits: 0 };
const seen = (value: number | null): Edit => ({ kind: 'sign', id: 'slack-under-seat', side: 'both', value });
const KEY = { kind: 'sign' as const, id: 'slack-under-seat', side: 'both' as const };

describe('what a person found in a round', () => {
  it('waits until the server has it, and is sent with the version that was seen', () => {
    const said = applyEdits(NOTHING, [seen(2)]);
    expect(formOf(dirtyEntries(said)).signs).toEqual([
      { sign: 'slack-under-seat', side: 'both', severity: 2, seen: 0 },
    ]);
    const kept = acknowledge(said, said.edits, { saved: [{ ...KEY, version: 1 }], conflicts: [] });
    expect(dirtyEntries(kept)).toEqual([]);
    expect(formOf(dirtyEntries(applyEdits(kept, [seen(3)]))).signs[0]?.seen).toBe(1);
  });

  it('edited while it was on its way still waits', () => {
    const sent = applyEdits(NOTHING, [seen(1)]);
    const edited = applyEdits(sent, [seen(3)]);
    const answered = acknowledge(edited, sent.edits, { saved: [{ ...KEY, version: 1 }], conflicts: [] });
    expect(dirtyEntries(answered)).toMatchObject([{ value: 3, version: 1 }]);
  });

  it('contested, keeps the own word with the newer version until the person chooses', () => {
    const said = applyEdits(NOTHING, [seen(1)]);
    const theirs = { version: 7, says: 'pulling' };
    const answered = acknowledge(said, said.edits, { saved: [], conflicts: [{ ...KEY, theirs }] });
    expect(contestedEntries(answered)).toMatchObject([{ value: 1, version: 7 }]);
    expect(contestedEntries(applyEdits(answered, [seen(2)]))).toEqual([]);
  });

  it('taken back is sent as nothing, not forgotten', () => {
    const kept = acknowledge(applyEdits(NOTHING, [seen(2)]), 1, {
      saved: [{ ...KEY, version: 4 }],
      conflicts: [],
    });
    expect(formOf(dirtyEntries(applyEdits(kept, [seen(null)]))).signs).toEqual([
      { sign: 'slack-under-seat', side: 'both', severity: null, seen: 4 },
    ]);
  });

  it('left from an earlier visit is laid over the page, but not over what was said since', () => {
    const drafts = dirtyEntries(applyEdits(NOTHING, [seen(1), { ...seen(2), side: 'left' }]));
    const now = withDrafts(applyEdits(NOTHING, [seen(3)]), drafts);
    expect(dirtyEntries(now).map(({ side, value }) => [side, value])).toEqual([
      ['both', 3],
      ['left', 2],
    ]);
  });

  it('keeps the amount of a check as it was typed, with its basis', () => {
    const amount = { typed: '1/2', unit: 'in' as const };
    const value = { outcome: 'a-fold', amount, amountMm: 12.7, basis: 'pinch' as const, places: 2 };
    const said = applyEdits(NOTHING, [{ kind: 'check', id: 'pinch-waist-behind', side: 'both', value }]);
    expect(formOf(dirtyEntries(said)).checks).toEqual([
      {
        check: 'pinch-waist-behind',
        side: 'both',
        outcome: 'a-fold',
        amount,
        basis: 'pinch',
        places: 2,
        seen: 0,
      },
    ]);
  });
});
