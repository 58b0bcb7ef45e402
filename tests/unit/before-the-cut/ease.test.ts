import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { clothVerdict } from '@/diagnosis/ease/cloth-verdict';
import {
  cutForShrinkageMm,
  gaugeStretchPercent,
  shrinkagePercent,
  stretchAskedPercent,
  stretchLimit,
  stretchTest,
  usableReduction,
} from '@/diagnosis/ease/stretch';
import { crotchDepthEaseMm, splitEase, wovenEase } from '@/diagnosis/ease/wearing-ease';

describe('published values of stretch', () => {
  // F01, home gauge: 4→5 in, 4→7, 10→14, 4→10.
  it.each([[4, 5, 25], [4, 7, 75], [10, 14, 40], [4, 10, 150]])('a gauge from %d to %d in is %d %', (from, to, percent) => {
    expect(gaugeStretchPercent(from * 25.4, to * 25.4)).toBeCloseTo(percent, 9);
  }); // prettier-ignore

  // F02, arithmetic from the definition: 1 − 1/(1 + s).
  it.each([[10, 9.090909], [15, 13.043478], [18, 15.254237], [20, 16.666667], [25, 20], [30, 23.076923], [40, 28.571429], [50, 33.333333], [75, 42.857143], [100, 50]])('%d % stretch is at most %d % smaller', (s, most) => {
    expect(stretchLimit(s) * 100).toBeCloseTo(most, 6);
  }); // prettier-ignore

  // F03: 10 % negative ease on 100 cm uses 11.11 %.
  it('ten per cent negative ease asks 11.11 % of the cloth', () => {
    expect(stretchAskedPercent(1000, 900)).toBeCloseTo(11.111111, 6);
  });

  // F05, D3107 calculation forms (2007): A 250, B 310, C 256 mm.
  it('stretch 24 %, growth 2.4 %, recovery 90 %', () => {
    const test = stretchTest(250, 310, 256);
    expect(test?.stretchPercent).toBeCloseTo(24, 9);
    expect(test?.growthPercent).toBeCloseTo(2.4, 9);
    expect(test?.recoveryPercent).toBeCloseTo(90, 9);
    expect(stretchTest(250, 250, 250)).toBeNull();
    expect(stretchTest(250, 240, 250)).toBeNull();
  });

  // Common practice with F02: half of a 25 % gauge is 1 − 1/1.125 = 11.1 %.
  it('half the gauge is used, a quarter at seat and knee where recovery is poor', () => {
    expect(usableReduction(25, 'hip')).toBeCloseTo(1 - 1 / 1.125, 12);
    expect(usableReduction(25, 'hip', 85)).toBeCloseTo(1 - 1 / 1.0625, 12);
    expect(usableReduction(25, 'thigh', 85)).toBeCloseTo(1 - 1 / 1.125, 12);
  });

  // F11: 30 in after 3 % and 10 % shrinkage.
  it.each([[3, 30.927835], [10, 33.333333]])('to finish at 30 in after %d % cut %d in', (percent, inches) => {
    expect(cutForShrinkageMm(30 * 25.4, percent) / 25.4).toBeCloseTo(inches, 6);
    expect(shrinkagePercent(inches, 30)).toBeCloseTo(percent, 5);
  }); // prettier-ignore

  it('impossible gauges and cloth that vanishes are bugs of the caller', () => {
    expect(() => gaugeStretchPercent(0, 10)).toThrow(RangeError);
    expect(() => gaugeStretchPercent(10, 9)).toThrow(RangeError);
    expect(() => cutForShrinkageMm(10, 100)).toThrow(RangeError);
  });

  it('law: what may be used is never the limit, grows with the gauge, and asks at most half of it', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 200, noNaN: true }), (s) => {
        expect(usableReduction(s, 'hip')).toBeLessThan(stretchLimit(s));
        expect(usableReduction(s + 1, 'hip')).toBeGreaterThan(usableReduction(s, 'hip'));
        expect(stretchAskedPercent(1000, 1000 * (1 - usableReduction(s, 'hip')))).toBeCloseTo(s / 2, 6);
      }),
    );
  });
});

describe('published ease of woven trousers', () => {
  // Measurements for Fitting Pants, Guide C-209 (c. 2003), F13: ½ in under 36 in hip, 1 in over 38, ¾ between.
  it.each([[35.9, 0.5], [36, 0.75], [38, 0.75], [38.1, 1]])('a hip of %d in has %d in in the crotch depth', (hip, ease) => {
    expect(crotchDepthEaseMm(hip * 25.4) / 25.4).toBeCloseTo(ease, 9);
  }); // prettier-ignore

  // F12 costume text and TM020 to TM024: waist ½–1 in, hip 2–4, thigh 1–2, knee at least 1.
  it.each([['waist', 0.5, 1], ['hip', 2, 4], ['thigh', 1, 2], ['knee', 1, null]] as const)('%s: %d to %s in', (measure, least, most) => {
    const range = wovenEase(measure, 1000);
    expect((range?.leastMm ?? 0) / 25.4).toBeCloseTo(least, 9);
    expect(range?.mostMm === null ? null : (range?.mostMm ?? 0) / 25.4).toBe(most);
  }); // prettier-ignore

  it('wearing ease comes first, the rest is design, and too little is named', () => {
    const range = wovenEase('hip', 1000)!;
    expect(splitEase(1000, 1100, range)).toEqual({ totalMm: 100, wearingMm: 50.8, designMm: 49.2, isBelowLeast: false }); // prettier-ignore
    expect(splitEase(1000, 1020, range)).toMatchObject({ totalMm: 20, wearingMm: 20, designMm: 0, isBelowLeast: true }); // prettier-ignore
    expect(splitEase(1000, 950, range)).toMatchObject({ totalMm: -50, wearingMm: 0, designMm: 0, isBelowLeast: true }); // prettier-ignore
  });
});

describe('the verdict on a cloth', () => {
  const cloth = (stretchPercent: number, recoveryPercent: number | null = null) => ({ stretchPercent, recoveryPercent, growthPercent: null }); // prettier-ignore
  const hip = (finishedMm: number) => [{ measure: 'hip' as const, name: 'Hip', bodyMm: 1000, finishedMm }];

  it('suits within five points, is too little below, more above', () => {
    expect(clothVerdict(25, cloth(25), []).kind).toBe('suits');
    expect(clothVerdict(25, cloth(20), []).kind).toBe('suits');
    expect(clothVerdict(25, cloth(19), []).kind).toBe('too-little');
    expect(clothVerdict(25, cloth(31), []).kind).toBe('more');
    expect(clothVerdict(0, cloth(0), []).kind).toBe('suits');
  });

  it('says plainly not to use it, with the figures', () => {
    expect(clothVerdict(25, cloth(10), []).message).toBe('Too little stretch: do not use it for this pattern in this size; it stretches 10 % and the draft asks for 25 %.'); // prettier-ignore
    const { kind, message } = clothVerdict(20, cloth(20), hip(880));
    expect(kind).toBe('too-little');
    expect(message).toContain('at the hip it would be stretched by 13.6 %, and 10 % is what may be used');
  });

  it('a poor recovery halves what the seat may use', () => {
    expect(clothVerdict(25, cloth(25, 95), hip(900)).kind).toBe('suits');
    const poor = clothVerdict(25, cloth(25, 80), hip(900));
    expect([poor.kind, poor.cautions.length]).toEqual(['too-little', 1]);
  });
});
