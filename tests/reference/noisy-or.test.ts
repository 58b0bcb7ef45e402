import { describe, expect, it } from 'vitest';
import { eliminate } from '@/diagnosis/inference/eliminate';
import type { Network } from '@/diagnosis/inference/network';

/** A network of causes that are there or not, and findings that were seen or looked for. */
function network(
  priors: readonly number[],
  findings: readonly { leak: number; strengths: readonly number[]; seen: boolean }[],
): Network {
  const seen = findings.filter((finding) => finding.seen);
  const absent = findings.filter((finding) => !finding.seen);
  return {
    unary: priors.map((prior, cause) =>
      Float64Array.of(
        1 - prior,
        prior * absent.reduce((rest, { strengths }) => rest * (1 - strengths[cause]!), 1),
      ),
    ),
    pairs: [],
    findings: seen.map(({ leak }, bit) => ({ bits: [bit], leak: Float64Array.of(1 - leak, leak) })),
    slots: priors.map((_, cause) =>
      seen.map(({ strengths }, bit) => ({
        bits: [bit],
        miss: Float64Array.of(1, 1 - strengths[cause]!),
        hit: Float64Array.of(0, strengths[cause]!),
      })),
    ),
  };
}

const absentLeaks = (findings: readonly { leak: number; seen: boolean }[]) =>
  findings.filter(({ seen }) => !seen).reduce((product, { leak }) => product * (1 - leak), 1);

describe('noisy-OR', () => {
  // Course slides with the fever example of Russell & Norvig, Artificial Intelligence: A Modern Approach; 2020.
  it.each([
    [[0, 0, 1], 0.9],
    [[0, 1, 0], 0.8],
    [[0, 1, 1], 0.98],
    [[1, 0, 0], 0.4],
    [[1, 0, 1], 0.94],
    [[1, 1, 0], 0.88],
    [[1, 1, 1], 0.988],
  ])('gives a fever of cold, flu, malaria %j the published probability %d', (states, published) => {
    const strengths = [0.4, 0.8, 0.9];
    const { logWeight } = eliminate(network(states, [{ leak: 0, strengths, seen: true }]));
    expect(Math.exp(logWeight)).toBeCloseTo(published, 12);
  });

  // Discrete probability distributions, NoisyOr; Bayesia user guide.
  it.each([
    [[0, 0], 0.1],
    [[0, 1], 0.64],
    [[1, 0], 0.82],
    [[1, 1], 0.928],
  ])('with a leak of 0.1 gives %j the published probability %d', (states, published) => {
    const { logWeight } = eliminate(network(states, [{ leak: 0.1, strengths: [0.8, 0.6], seen: true }]));
    expect(Math.exp(logWeight)).toBeCloseTo(published, 12);
  });
});

// Constructed check network: two causes, three findings; computed with exact fractions by two algorithms.
describe('the two-cause, three-finding network', () => {
  const findings = [
    { leak: 0.05, strengths: [0.8, 0.3] },
    { leak: 0.02, strengths: [0.1, 0.7] },
    { leak: 0.01, strengths: [0.5, 0.5] },
  ];
  it.each<[string, (boolean | null)[], number, number, number]>([
    ['nothing', [null, null, null], 1, 1 / 10, 1 / 5],
    ['the first seen', [true, null, null], 4461 / 25000, 1369 / 2974, 647 / 1487],
    [
      'the first seen, the second not',
      [true, false, null],
      28687491 / 250000000,
      35001 / 65051,
      12651 / 65051,
    ],
    ['both seen', [true, true, null], 15922509 / 250000000, 1699853 / 5307503, 4610303 / 5307503],
    [
      'both seen, the third not',
      [true, true, false],
      2872688841 / 100000000000,
      2337053 / 9672353,
      8157953 / 9672353,
    ],
  ])('has the exact posteriors for %s', (_, states, evidence, first, second) => {
    const noted = findings.flatMap((finding, i) =>
      states[i] === null ? [] : [{ ...finding, seen: states[i]! }],
    );
    const { marginals, logWeight } = eliminate(network([0.1, 0.2], noted));
    expect(Math.exp(logWeight) * absentLeaks(noted)).toBeCloseTo(evidence, 12);
    expect(marginals[0]![1]).toBeCloseTo(first, 12);
    expect(marginals[1]![1]).toBeCloseTo(second, 12);
  });
});
