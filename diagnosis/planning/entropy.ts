import { tailsOf } from '../inference/beliefs';
import type { Layout } from '../inference/layout';

/** Shannon entropy of a distribution, bits; 0 · log 0 is 0. */
export function entropyBits(distribution: Iterable<number>): number {
  let bits = 0;
  for (const p of distribution) if (p > 0) bits -= p * Math.log2(p);
  return bits;
}

/** Mutual information of the rows and columns of a joint distribution (or of counts), bits. */
export function mutualInformationBits(joint: readonly (readonly number[])[]): number {
  const total = joint.flat().reduce((a, b) => a + b, 0);
  const columns = (joint[0] ?? []).map(
    (_, column) => joint.reduce((sum, row) => sum + row[column]!, 0) / total,
  );
  return joint.reduce((bits, row) => {
    const chance = row.reduce((a, b) => a + b, 0);
    return chance > 0 ? bits - (chance / total) * entropyBits(row.map((weight) => weight / chance)) : bits;
  }, entropyBits(columns));
}

/** A need as what has to be decided about it: too little, fits, too much; a cause as absent, present. */
export function decisionOf(layout: Layout, variable: number, belief: Float64Array): number[] {
  const own = layout.variables[variable]!;
  if (own.kind === 'cause') return [belief[0]!, belief[1]!];
  const { more, less } = tailsOf(layout, own.dimension, belief);
  return [less, Math.max(0, 1 - more - less), more];
}

/** Entropy of every decision together, bits, as if they were independent. */
export function decisionBits(layout: Layout, marginals: readonly Float64Array[]): number {
  return marginals.reduce(
    (sum, belief, variable) => sum + entropyBits(decisionOf(layout, variable, belief)),
    0,
  );
}
