import { describe, expect, it } from 'vitest';
import { trousers } from '@/diagnosis/garments/trousers';
import { settlingOf } from '@/diagnosis/settling';
import { parsed } from '../../support/read-case';

const falls = (severity: number) => ({ sign: 'waist-falls-when-sitting', severity });
const found = { signs: [falls(3)], tests: [{ check: 'sit-and-mark-band', outcome: 'over-15-mm' }] };
const raised = { changes: [{ correction: 'raise-centre-back', amountMm: 19 }], next: 're-baste' as const };
const looked = {
  tests: [{ check: 'sit-and-mark-band', outcome: 'up-to-15-mm' }],
  absent: ['waist-falls-when-sitting'],
};

describe('the settling', () => {
  const rows = settlingOf(trousers, [
    parsed(trousers, found),
    parsed(trousers, { ...looked, history: [{ ...found, ...raised }] }),
  ]);
  const rise = rows.find(({ dimension }) => dimension === 'back-rise')!;

  it('shows a need that was likely move to the middle after its change', () => {
    expect(rise.rounds.map(({ word }) => word)).toEqual(['likely', 'fits']);
    const middleOf = ({ ridge }: (typeof rise.rounds)[number]) => {
      const whole = ridge.reduce((sum, height) => sum + height, 0);
      return ridge.reduce((sum, height, i) => sum + height * rise.atMm[i]!, 0) / whole;
    };
    expect(middleOf(rise.rounds[0]!)).toBeGreaterThan(rise.toleranceMm);
    expect(middleOf(rise.rounds[1]!)).toBeLessThan(middleOf(rise.rounds[0]!) / 2);
  });

  it('leaves out needs that were never possible, and rounds in which nothing was found', () => {
    expect(rows.map(({ dimension }) => dimension)).not.toContain('leg-length');
    expect(settlingOf(trousers, [parsed(trousers, {})])).toEqual([]);
  });

  it('draws every ridge up to the same height', () => {
    for (const { rounds } of rows) for (const { ridge } of rounds) expect(Math.max(...ridge)).toBe(1);
  });
});
