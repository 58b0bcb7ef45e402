import type { Case } from '@/diagnosis/case-schema';
import type { Knowledge, Link } from '@/diagnosis/garments/schema';
import type { Strengths } from '@/diagnosis/inference/strengths';

const sigma = (x: number) => 1 / (1 + Math.exp(-x));

/** c_dk(z) as it is defined, with its subtraction: P(severity stays ≤ k) for one link. */
function stays(strengths: Strengths, link: Link, state: number, isCause: boolean, k: number): number {
  if (k >= 3) return 1;
  const z = isCause ? (state === 0 ? 0 : 1.6) : (state - 20) / 4;
  const x = isCause || link.direction === 'more' ? z : -z;
  const [t, w] = [strengths.thresholds[k]!, strengths.width];
  const risen = (sigma((x - t) / w) - sigma(-t / w)) / (1 - sigma(-t / w));
  return 1 - strengths.grade[link.grade] * Math.max(0, risen);
}

/**
 * Beliefs of a small unsided case straight from the definition: every joint state, P(severity = k) = P(≤ k) − P(≤ k − 1).
 * `prior` holds a histogram per dimension, then per cause.
 */
export function byTheBook(
  knowledge: Knowledge,
  fitting: Case,
  prior: readonly Float64Array[],
  strengths: Strengths,
) {
  const ids = [...knowledge.dimensions, ...knowledge.causes].map(({ id }) => id);
  const observed = [
    ...fitting.signs.map(({ sign, severity }) => ({ sign, severity })),
    ...fitting.absent.map(({ sign }) => ({ sign, severity: 0 })),
  ].map(({ sign, severity }) => ({ severity, ...knowledge.signs.find(({ id }) => id === sign)! }));
  const marginals = prior.map((weights) => Array.from(weights, () => 0));
  const states = ids.map(() => 0);
  let total = 0;

  const upTo = (links: readonly Link[], leak: readonly number[], k: number) => {
    if (k < 0) return 0;
    const below = 1 - (k >= 3 ? 0 : leak[k]!);
    return links.reduce((product, link) => {
      const at = ids.indexOf(link.to);
      return product * stays(strengths, link, states[at]!, at >= knowledge.dimensions.length, k);
    }, below);
  };
  const walk = (variable: number, weight: number) => {
    if (variable < ids.length) {
      prior[variable]!.forEach((share, state) => {
        states[variable] = state;
        walk(variable + 1, weight * share);
      });
      return;
    }
    const measured = fitting.measured.reduce((product, { terms, needMm, sdMm }) => {
      const sumMm = terms.reduce((sum, { dimension, weight: by }) => {
        const at = ids.indexOf(dimension);
        return sum + by * ((states[at]! - 20) / 4) * knowledge.dimensions[at]!.scaleMm;
      }, 0);
      return product * Math.exp(-0.5 * ((sumMm - needMm) / sdMm) ** 2);
    }, weight);
    const likelihood = observed.reduce((product, { links, leak, severity }) => {
      const above = strengths.leak[leak];
      return product * (upTo(links, above, severity) - upTo(links, above, severity - 1));
    }, measured);
    total += likelihood;
    states.forEach((state, v) => (marginals[v]![state]! += likelihood));
  };
  walk(0, 1);
  return marginals.map((row) => row.map((weight) => weight / total));
}
