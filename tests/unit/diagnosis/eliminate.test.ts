import { describe, expect, it } from 'vitest';
import { eliminate } from '@/diagnosis/inference/eliminate';
import type { Network } from '@/diagnosis/inference/network';
import { enumerate, randomNetwork } from '@/tests/support/enumerate';
import { absorptionErrorOf, exactnessOf, longSumErrorOf } from '@/tests/support/exactness';
import { Random } from '@/diagnosis/evaluation/random';

/** Greatest difference between the elimination and the enumeration, over marginals and the weight of the evidence. */
function difference(network: Network): number {
  const exact = enumerate(network);
  const { marginals, logWeight } = eliminate(network);
  const differences = exact.marginals.flatMap((row, v) =>
    row.map((p, state) => Math.abs(p - marginals[v]![state]!)),
  );
  return Math.max(Math.abs(logWeight - exact.logWeight) / 10, ...differences);
}

describe('elimination', { timeout: 60_000 }, () => {
  it('equals the definition of noisy-MAX with leaks, severities and absences, on 60 drawn garments', () => {
    const random = new Random(10);
    for (let model = 0; model < 60; model++) expect(exactnessOf(random)).toBeLessThan(1e-12);
  });

  it('equals enumeration for up to three needs on the full grid', () => {
    const random = new Random(11);
    for (let model = 0; model < 60; model++) {
      const sizes = Array.from({ length: 1 + random.below(model % 10 === 0 ? 3 : 2) }, () => 41);
      expect(difference(randomNetwork(random, sizes, 1 + random.below(3)))).toBeLessThan(1e-12);
    }
  });

  it('equals enumeration for up to six variables on a coarse grid, pairs and two-sided findings included', () => {
    const random = new Random(12);
    for (let model = 0; model < 440; model++) {
      const size = 1 + random.below(model % 40 === 0 ? 6 : 4);
      const sizes = Array.from({ length: size }, () => (random.chance(0.2) ? 2 : size > 4 ? 4 : 7));
      expect(difference(randomNetwork(random, sizes, random.below(4)))).toBeLessThan(1e-12);
    }
  });

  it('keeps marginals summing to 1 at 16 positive findings', () => {
    const random = new Random(13);
    const bits = Array.from({ length: 16 }, (_, bit) => bit);
    const unary = bits.map((bit) => Float64Array.from({ length: bit < 12 ? 41 : 2 }, () => random.next()));
    const slots = unary.map((weights, v) =>
      [0, 1, 2, 5].map((step) => {
        const hit = weights.map(() => random.between(0, 0.6));
        return { bits: [(v + step) % 16], hit, miss: hit.map((reached) => 1 - reached) };
      }),
    );
    const findings = bits.map((bit) => ({ bits: [bit], leak: Float64Array.of(0.98, 0.01) }));
    const { marginals, width } = eliminate({ unary, slots, pairs: [], findings });
    expect(width).toBeLessThanOrEqual(14);
    for (const marginal of marginals)
      expect(Math.abs(marginal.reduce((a, b) => a + b, 0) - 1)).toBeLessThan(1e-12);
  });

  it('comes within 0.03 of enumeration where three needs are known by their sum', () => {
    const random = new Random(14);
    for (let model = 0; model < 20; model++) expect(longSumErrorOf(random)).toBeLessThan(0.03);
  });

  it('stays near the exact beliefs where the weakest of too many findings are absorbed, and says that it did', () => {
    const random = new Random(15);
    const errors = Array.from({ length: 10 }, () => absorptionErrorOf(random));
    expect(errors.some(({ absorbed }) => absorbed)).toBe(true);
    for (const { error, absorbed } of errors) expect(error).toBeLessThan(absorbed ? 0.1 : 1e-12);
  });
});
