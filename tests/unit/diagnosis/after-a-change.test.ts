import { describe, expect, it } from 'vitest';
import { trousers } from '@/diagnosis/garments/trousers';
import { readCase } from '../../support/read-case';

/** A sign, the change that the reading would make for it at its first amount, and the need that it meets. */
const SETTLED = { absent: ['not-at-level', 'curve-allowance-untrimmed'] };
const CHANGES = [
  ['waist-falls-when-sitting', 'raise-centre-back', 12],
  ['fold-at-centre-front', 'lower-centre-front', 10],
  ['tight-lines-across-back-hip', 'let-out-hip-side', 5],
  ['tight-lines-front-thigh', 'let-out-thigh-side', 5],
  ['taut-lines-rising-from-front-fork', 'extend-front-point', 5],
  ['waist-gapes-behind', 'deepen-back-dart', 6],
  ['fold-under-back-band', 'pin-out-back-fold', 10],
  ['hem-folds-on-shoe', 'shorten-leg', 12],
] as const;

const correctionOf = (id: string) => trousers.corrections.find((one) => one.id === id)!;

/** Whether a correction takes back what another was made for. */
function undoes(id: string, made: string): boolean {
  const served = correctionOf(made).vector.filter(({ coupling }) => !coupling);
  return correctionOf(id).vector.some(
    ({ dimension, perMm, coupling }) =>
      !coupling && served.some((one) => one.dimension === dimension && one.perMm * perMm < 0),
  );
}

function after(sign: string, correction: string, amountMm: number, severity: number, now: object) {
  const history = [
    { signs: [{ sign, severity }], changes: [{ correction, amountMm }], next: 're-baste' as const },
  ];
  return readCase(trousers, { causes: SETTLED, history, ...now });
}

describe('after a change', () => {
  it.each(CHANGES)('that cleared %s, %s is not taken back on mere doubt', (sign, correction, amountMm) => {
    for (const severity of [1, 2, 3]) {
      const { ranked, plan } = after(sign, correction, amountMm, severity, { absent: [sign] });
      expect(ranked.filter(({ kind, id }) => kind === 'correction' && undoes(id, correction))).toEqual([]);
      expect(plan.filter((one) => undoes(one.correction, correction))).toEqual([]);
    }
  });

  it.each(CHANGES)(
    'that eased a pulling %s, more of the same is still among the answers',
    (sign, correction, amountMm) => {
      const { needs } = after(sign, correction, amountMm, 3, { signs: [{ sign, severity: 1 }] });
      const linked = trousers.signs.find(({ id }) => id === sign)!.links.map(({ to }) => to);
      const { dimension, perMm } = correctionOf(correction).vector.find((one) =>
        linked.includes(one.dimension),
      )!;
      const own = needs.find(
        (one) => one.dimension === dimension && one.direction === (perMm > 0 ? 'more' : 'less'),
      );
      expect(own?.probability ?? 0).toBeGreaterThan(0.15);
    },
  );

  it('with a sign of the other direction, it is taken back', () => {
    const { ranked } = after('waist-falls-when-sitting', 'raise-centre-back', 19, 2, {
      absent: ['waist-falls-when-sitting'],
      signs: [{ sign: 'fold-under-back-band', severity: 2 }],
      tests: [{ check: 'pin-fold-under-band', outcome: 'easy', amountMm: 6, basis: 'pinch', places: 1 }],
    });
    expect(undoes(ranked[0]!.id, 'raise-centre-back')).toBe(true);
  });

  it('that shortened the depth, the hem it lifted is let down again', () => {
    const { ranked } = after('fork-hangs-low', 'shorten-depth', 15, 2, { absent: ['fork-hangs-low'] });
    expect(ranked.map(({ id }) => id)).toContain('lengthen-leg');
  });

  it('whose sign went, another cause of that sign is believed less than when the sign stays', () => {
    const slope = (now: object) =>
      after('waist-falls-when-sitting', 'raise-centre-back', 12, 2, now).needs.find(
        ({ dimension, direction }) => dimension === 'back-slope' && direction === 'more',
      )?.probability ?? 0;
    const stays = { signs: [{ sign: 'waist-falls-when-sitting', severity: 2 }] };
    expect(slope({ absent: ['waist-falls-when-sitting'] })).toBeLessThan(slope(stays));
  });
});
