/**
 * What the elimination works on: variables with unary weights, pairs of variables that share a joint table, and findings
 * (positive observations) that sources reach. It knows neither garments nor lengths.
 */

/** One variable's part in a finding: the weights that it stays below the observed severity, and that it reaches it exactly. */
export interface Slot {
  /** Findings' bits that one firing reaches: one, or two when the same firing shows on both sides. */
  bits: readonly number[];
  miss: Float64Array;
  hit: Float64Array;
}

/** One observation, or the two sides of one: its bits and the starting weight of each pattern of them (the leak). */
export interface Finding {
  bits: readonly number[];
  /** 2^bits.length weights; index bit i belongs to bits[i]. */
  leak: Float64Array;
}

/** Two variables with a joint factor, row-major over (first, second). A variable is in one pair at the most. */
export interface Pair {
  first: number;
  second: number;
  table: Float64Array;
}

export interface Network {
  unary: Float64Array[];
  slots: Slot[][];
  pairs: Pair[];
  findings: Finding[];
}

export interface Posterior {
  /** Natural logarithm of the weight of all evidence. */
  logWeight: number;
  /** One normalised histogram per variable. */
  marginals: Float64Array[];
  /** One normalised joint per pair, row-major. */
  joints: Float64Array[];
  /** Most findings open at once. */
  width: number;
}

/** Variables that are eliminated together, and the bits that they touch. */
export interface Group {
  variables: readonly number[];
  /** Index into `pairs`, or −1. */
  pair: number;
  bits: readonly number[];
}

/** Groups the variables of a network: each pair is one group, each other variable one of its own. */
export function groupsOf(network: Network): Group[] {
  const paired = new Set(network.pairs.flatMap((pair) => [pair.first, pair.second]));
  const touched = (variables: number[]) => [
    ...new Set(variables.flatMap((v) => network.slots[v]!.flatMap((slot) => slot.bits))),
  ];
  const pairs = network.pairs.map((pair, index) => {
    const variables = [pair.first, pair.second];
    return { variables, pair: index, bits: touched(variables) };
  });
  const singles = network.unary
    .map((_, variable) => variable)
    .filter((variable) => !paired.has(variable))
    .map((variable) => ({ variables: [variable], pair: -1, bits: touched([variable]) }));
  return [...pairs, ...singles];
}
