import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { amountWithBasis } from '@/components/tape/basis-words';
import { snapMm, stopsIn, tapeTicks } from '@/components/tape/stops';
import { amountText } from '@/diagnosis/units/print-amount';

describe('a stop mark lies on a mark of the reader’s own tape', () => {
  // The pairs of the fitter's table: common practice, no source.
  it.each([
    [2, '1/16 in'],
    [3, '1/8 in'],
    [5, '3/16 in'],
    [6, '1/4 in'],
    [8, '5/16 in'],
    [10, '3/8 in'],
    [12, '1/2 in'],
    [16, '5/8 in'],
    [19, '3/4 in'],
    [25, '1 in'],
    [38, '1 1/2 in'],
  ])('%d mm is %s', (mm, inches) => {
    expect(amountText(snapMm(mm, 'in'), 'in')).toBe(inches);
  });

  it('keeps step, first, stop of the round and stop in total in order', () => {
    const four = fc.tuple(...Array.from({ length: 4 }, () => fc.double({ min: 1, max: 60, noNaN: true })));
    fc.assert(
      fc.property(four, fc.constantFrom('cm' as const, 'in' as const), (amounts, unit) => {
        const [stepMm, firstMm, capRoundMm, capTotalMm] = [...amounts].sort((a, b) => a - b) as [
          number,
          number,
          number,
          number,
        ];
        const stops = stopsIn(unit, { stepMm, firstMm, capRoundMm, capTotalMm });
        expect(stops.firstMm).toBeLessThanOrEqual(stops.capRoundMm);
        expect(stops.capRoundMm).toBeLessThanOrEqual(stops.capTotalMm);
        expect(stops.stepMm).toBeGreaterThan(0);
      }),
    );
  });
});

describe('a tape has its real marks', () => {
  it('numbers inches and centimetres, and marks sixteenths and millimetres', () => {
    const inches = tapeTicks('in', 25.4);
    expect(inches).toHaveLength(17);
    expect(inches.at(-1)).toEqual({ mm: 25.4, rank: 3, label: '1' });
    expect(inches[8]?.rank).toBe(2);
    const metric = tapeTicks('cm', 20);
    expect(metric.filter((tick) => tick.label !== null).map((tick) => tick.label)).toEqual(['0', '1', '2']);
  });
});

describe('no amount stands without what it is of', () => {
  const hip = { basis: 'edge' as const, conversions: { edge: 1, round: 0.25, pinch: 0.5 } };
  it('says edges and their sum in the unit it was set in', () => {
    expect(amountWithBasis(12.7, hip, 'in')).toBe('1/2 in on each of 4 edges = 2 in round');
    expect(amountWithBasis(12, hip, 'cm')).toBe('12 mm on each of 4 edges = 48 mm round');
  });
  it('adds up: the sum is that of the printed amount', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 25 }), (mm) => {
        expect(amountWithBasis(mm, hip, 'cm')).toContain(`= ${amountText(mm * 4, 'cm')} round`);
      }),
    );
  });
});
