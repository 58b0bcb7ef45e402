import { describe, expect, it } from 'vitest';
import type { CaseInput } from '@/diagnosis/case-schema';
import { prepare, solveRound, tailsOf } from '@/diagnosis/inference/beliefs';
import { needPrior, sidesPrior } from '@/diagnosis/inference/prior';
import { STRENGTHS } from '@/diagnosis/inference/strengths';
import { parsed } from '@/tests/support/read-case';
import { small } from '@/tests/support/small-knowledge';

/** P(knee wants more) on each leg; one number where the need is not split. */
function knees(input: Omit<CaseInput, 'garment'>): number[] {
  const fitting = parsed(small, input);
  const { layout, tables, start } = prepare(small, fitting, STRENGTHS);
  const { marginals } = solveRound(layout, tables, start, fitting);
  const place = layout.index.dimensions.get('knee')!;
  return layout.ofDimension[place]!.map((variable) => tailsOf(layout, place, marginals[variable]!).more);
}

/** P(depth is spare), a need without sides. */
function shortDepth(signs: CaseInput['signs']): number {
  const fitting = parsed(small, { signs });
  const { layout, tables, start } = prepare(small, fitting, STRENGTHS);
  const { marginals } = solveRound(layout, tables, start, fitting);
  return tailsOf(layout, 0, marginals[layout.ofDimension[0]![0]!]!).less;
}

const pull = (side: 'both' | 'left' | 'right', severity = 2) => ({ sign: 'knee-pull', severity, side });

describe('left and right', () => {
  it('are one need until something one-sided is known', () => {
    expect(knees({ signs: [pull('both')] })).toHaveLength(1);
    expect(knees({ signs: [pull('left')] })).toHaveLength(2);
  });

  it('lean on each other: a sign on the left raises the right too, but less', () => {
    const [left, right] = knees({ signs: [pull('left')] }) as [number, number];
    const [without] = knees({}) as [number];
    expect(left).toBeGreaterThan(right);
    expect(right).toBeGreaterThan(without);
  });

  it('part where the other leg was looked at and shows nothing', () => {
    const [, open] = knees({ signs: [pull('left')] }) as [number, number];
    const [left, right] = knees({
      signs: [pull('left')],
      absent: [{ sign: 'knee-pull', side: 'right' }],
    }) as [number, number];
    expect(right).toBeLessThan(open);
    expect(left).toBeGreaterThan(2.5 * right);
  });

  it('say the same when each is noted alike as when both are noted at once', () => {
    const apart = knees({ signs: [pull('left'), pull('right')] }) as [number, number];
    expect(apart[0]).toBeCloseTo(apart[1], 12);
  });

  it('let a side override what was noted for both', () => {
    const [left, right] = knees({ signs: [pull('both', 1), pull('left', 3)] }) as [number, number];
    expect(left).toBeGreaterThan(right);
  });

  it('do not count a need without sides twice', () => {
    const once = shortDepth([{ sign: 'leg-fold', severity: 2, side: 'both' }]);
    const apart = shortDepth([
      { sign: 'leg-fold', severity: 2, side: 'left' },
      { sign: 'leg-fold', severity: 2, side: 'right' },
    ]);
    // Half of what shows by itself shows on one side only, so that both sides noted apart may double the odds, and no more.
    expect(apart / (1 - apart) / (once / (1 - once))).toBeLessThan(3);
    expect(apart / once).toBeGreaterThan(0.5);
  });

  it('clear a need without sides where only one leg shows what it would show on both', () => {
    const open = shortDepth([{ sign: 'leg-fold', severity: 3, side: 'left' }]);
    const other = (severity: number) =>
      shortDepth([
        { sign: 'leg-fold', severity: 3, side: 'left' },
        { sign: 'leg-fold', severity, side: 'right' },
      ]);
    expect(other(0)).toBeLessThan(shortDepth([]));
    expect(other(1)).toBeLessThan(open);
  });

  it('have a joint prior whose margins are the prior of each', () => {
    const prior = needPrior(STRENGTHS.tail, 0, 0);
    const joint = sidesPrior(prior, prior);
    prior.forEach((weight, row) => {
      const margin = joint.subarray(row * 41, (row + 1) * 41).reduce((a, b) => a + b, 0);
      expect(Math.abs(margin - weight)).toBeLessThan(1e-12);
    });
  });
});
