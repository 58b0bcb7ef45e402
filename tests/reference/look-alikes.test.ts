import { describe, expect, it } from 'vitest';
import { isOpenAtFirst, walkGroup } from '@/diagnosis/evaluation/look-alikes';
import { trousers } from '@/diagnosis/garments/trousers';
import { lookAlikes } from './cases/look-alikes';

describe('the look-alikes', { timeout: 30_000 }, () => {
  it('are the fourteen groups of the fitter’s reference', () => {
    expect(lookAlikes.map(({ row }) => row).sort((a, b) => a - b)).toEqual(
      Array.from({ length: 14 }, (_, i) => i + 1),
    );
  });

  it.each(lookAlikes.map((group) => [`${group.row} ${group.name}`, group] as const))(
    '%s: the signs alone leave doubt or ask a separating check first',
    (_, group) => {
      expect(isOpenAtFirst(trousers, group)).toBe(true);
    },
  );

  it.each(lookAlikes.map((group) => [`${group.row} ${group.name}`, group] as const))(
    '%s: each outcome, walked in order, puts what it shows first',
    (_, group) => {
      expect(walkGroup(trousers, group).filter(({ right }) => !right)).toEqual([]);
    },
  );
});
