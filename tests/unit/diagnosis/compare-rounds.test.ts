import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compareRounds, type SignState } from '@/diagnosis/compare-rounds';

const round = (signs: [string, number][], views: ('front' | 'back')[] = ['front', 'back']) => ({
  signs: signs.map(([sign, severity]): SignState => ({ sign, side: 'both', severity })),
  views,
});
const became = (before: [string, number][], after: [string, number][], views?: ('front' | 'back')[]) =>
  compareRounds(round(before), round(after, views), () => ['back']).map(
    ({ sign, became }) => `${sign} ${became}`,
  );

describe('what became of a sign', () => {
  it.each([
    [3, 0, 'gone'],
    [3, 1, 'eased'],
    [2, 2, 'same'],
    [1, 3, 'worse'],
    [0, 2, 'new'],
  ])('from %d to %d is %s', (was, is, word) => {
    expect(became([['a', was]], [['a', is]])).toEqual([`a ${word}`]);
  });

  it('does not call a sign gone that nobody looked for again', () => {
    expect(became([['a', 2]], [])).toEqual(['a not looked at']);
    expect(became([['a', 2]], [], ['front'])).toEqual(['a not photographed']);
  });

  it('says nothing of what was looked for and never there', () => {
    expect(became([['a', 0]], [['a', 0]])).toEqual([]);
  });

  it('swaps gone and new, eased and worse, when the rounds are swapped', () => {
    const severity = fc.integer({ min: 0, max: 3 });
    const opposite: Record<string, string> = {
      gone: 'new',
      new: 'gone',
      eased: 'worse',
      worse: 'eased',
      same: 'same',
    };
    fc.assert(
      fc.property(severity, severity, (was, is) => {
        const there = became([['a', was]], [['a', is]]).map((text) => `a ${opposite[text.slice(2)]}`);
        expect(became([['a', is]], [['a', was]])).toEqual(there);
      }),
    );
  });
});
