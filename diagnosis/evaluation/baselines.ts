import type { SignSeen } from '../case-schema';
import type { Layout } from '../inference/layout';
import { sourcesOf } from '../inference/sources';
import { decisionOf } from '../planning/entropy';
import type { World } from './person';

/** Simple rivals that the reading has to beat, given the same evidence. */

/** Log loss of all decisions of one fitting, nats: how much the beliefs gave to what was true. */
export function readingLoss(
  layout: Layout,
  marginals: readonly Float64Array[],
  states: readonly number[],
): number {
  return marginals.reduce((sum, belief, variable) => {
    const point = new Float64Array(belief.length);
    point[states[variable]!] = 1;
    const truth = decisionOf(layout, variable, point).findIndex((share) => share > 0.5);
    return sum - Math.log(Math.max(1e-12, decisionOf(layout, variable, belief)[truth]!));
  }, 0);
}

/** The same loss for naive Bayes: each decision by itself, the signs taken as independent given it. */
export function naiveBayesLoss(world: World, signs: readonly SignSeen[], states: readonly number[]): number {
  return readingLoss(world.layout, naiveBayes(world, signs), states);
}

/** Beliefs of naive Bayes: the others stay at their prior while each variable is judged by each of its signs. */
export function naiveBayes({ layout, tables, prior }: World, signs: readonly SignSeen[]): Float64Array[] {
  const beliefs = prior.map((weights) => weights.slice());
  for (const { sign, severity, side } of signs) {
    const { links, leak } = layout.index.knowledge.signs[layout.index.signs.get(sign)!]!;
    const above = [1, ...tables.strengths.leak[leak], 0];
    const sources = sourcesOf(layout, tables, links, side, 1);
    const means = sources.map(({ variable, cumulative }) =>
      cumulative.map((row) => row.reduce((sum, c, state) => sum + c * prior[variable]![state]!, 0)),
    );
    sources.forEach(({ variable, cumulative }, own) => {
      const upTo = (k: number, state: number) =>
        k < 0
          ? 0
          : means.reduce(
              (product, row, other) => product * (other === own ? cumulative[k]![state]! : row[k]!),
              1 - above[k + 1]!,
            );
      const belief = beliefs[variable]!;
      for (let state = 0; state < belief.length; state++)
        belief[state]! *= upTo(severity, state) - upTo(severity - 1, state);
    });
  }
  return beliefs.map((belief) => {
    const total = belief.reduce((a, b) => a + b, 0);
    return belief.map((weight) => weight / total);
  });
}
