import type { Check } from '../garments/schema';
import { OUTCOME_LEAK } from '../inference/checks';
import type { Layout } from '../inference/layout';
import { sourcesOf } from '../inference/sources';
import type { Tables } from '../inference/sources';
import { decisionOf, entropyBits, mutualInformationBits } from './entropy';

/**
 * Expected information of a check about what it names, bits: mutual information between its outcome and each decision,
 * summed and held below the entropy of the outcome, the beliefs being taken as independent.
 * Outcome i comes when no earlier one did and its noisy-OR fires; what is left is the last.
 */
export function gainOnMarginals(
  layout: Layout,
  tables: Tables,
  marginals: readonly Float64Array[],
  check: Check,
): number {
  const staysAway = staysAwayOf(layout, tables, check);
  const variables = [...new Set(staysAway.flatMap((byVariable) => [...byVariable.keys()]))];
  const expected = new Map(variables.map((v) => [v, staysAway.map((by) => mean(marginals[v]!, by.get(v)))]));
  const leaks = staysAway.map((_, i) => (1 - OUTCOME_LEAK) ** (i + 1));
  const outcomeOf = (factors: (i: number) => number) => {
    let before = 1;
    const chances = leaks.map((leak, i) => {
      const after = leak * factors(i);
      const chance = Math.max(0, before - after);
      before = after;
      return chance;
    });
    return [...chances, before];
  };
  const overall = outcomeOf((i) => variables.reduce((product, v) => product * expected.get(v)![i]!, 1));
  const bits = entropyBits(overall);
  const informed = variables.reduce((sum, variable) => {
    const belief = marginals[variable]!;
    const joint = overall.map(() => new Float64Array(belief.length));
    for (let state = 0; state < belief.length; state++) {
      const given = outcomeOf((i) =>
        variables.reduce(
          (product, v) =>
            product * (v === variable ? (staysAway[i]!.get(v)?.[state] ?? 1) : expected.get(v)![i]!),
          1,
        ),
      );
      given.forEach((chance, outcome) => (joint[outcome]![state] = chance * belief[state]!));
    }
    return sum + mutualBits(layout, variable, joint);
  }, 0);
  return Math.min(bits, informed);
}

/** For each outcome but the last: by variable, the weight that neither it nor an earlier outcome comes. */
function staysAwayOf(layout: Layout, tables: Tables, check: Check): Map<number, Float64Array>[] {
  const rows: Map<number, Float64Array>[] = [];
  for (const { links } of check.outcomes.slice(0, -1)) {
    const row = new Map(rows.at(-1) ?? []);
    for (const { variable, cumulative } of sourcesOf(layout, tables, links, 'both', 1)) {
      const before = row.get(variable);
      row.set(variable, before ? before.map((weight, i) => weight * cumulative[0]![i]!) : cumulative[0]!);
    }
    rows.push(row);
  }
  return rows;
}

function mean(belief: Float64Array, weights: Float64Array | undefined): number {
  return weights ? belief.reduce((sum, p, i) => sum + p * weights[i]!, 0) : 1;
}

/** Information of the outcome about one decision; `joint` holds the weight of each outcome with each state. */
function mutualBits(layout: Layout, variable: number, joint: readonly Float64Array[]): number {
  const rows = joint.map((row) => {
    const chance = row.reduce((a, b) => a + b, 0);
    if (chance <= 0) return decisionOf(layout, variable, row).map(() => 0);
    const given = row.map((weight) => weight / chance);
    return decisionOf(layout, variable, given).map((share) => share * chance);
  });
  return Math.max(0, mutualInformationBits(rows));
}
