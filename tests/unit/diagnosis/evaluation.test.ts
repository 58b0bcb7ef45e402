import { describe, expect, it } from 'vitest';
import { calibrate } from '@/diagnosis/evaluation/calibration';
import { closedLoop, perturbed } from '@/diagnosis/evaluation/closed-loop';
import { trousers } from '@/diagnosis/garments/trousers';
import { STRENGTHS } from '@/diagnosis/inference/strengths';

/** A seeded tenth of the full evaluation (`npm run evaluate`). */

describe('calibration by simulation (it tests the code, not the knowledge)', { timeout: 120_000 }, () => {
  it.each([1, 2, 3])('ranks are uniform and probabilities come true, seed %d', (seed) => {
    const result = calibrate(trousers, STRENGTHS, seed, 1_000);
    expect(result.predictions).toBeGreaterThanOrEqual(10_000);
    expect(result.leastP).toBeGreaterThan(0.0004);
    expect(result.calibrationError).toBeLessThanOrEqual(0.03);
    expect(result.naiveBayesLossNats - result.lossNats).toBeGreaterThanOrEqual(0.3);
  });
});

describe('the closed loop over hidden persons', () => {
  it('needs at most 0.67 of the rounds that the first thing in the book needs, and corrects over no more', () => {
    const { reading, book, ratio } = closedLoop(trousers, 7, 50);
    expect(ratio).toBeLessThanOrEqual(0.67);
    expect(reading.overCorrected).toBeLessThanOrEqual(book.overCorrected);
  }, 120_000);

  it('still does where the real strengths are off by 30 %', () => {
    const { reading, book, ratio } = closedLoop(trousers, 8, 50, perturbed(STRENGTHS, 0.3, 8));
    expect(ratio).toBeLessThanOrEqual(0.67);
    expect(reading.overCorrected).toBeLessThanOrEqual(book.overCorrected);
  }, 120_000);
});
