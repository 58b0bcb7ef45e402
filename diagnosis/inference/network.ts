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

/**
 * Two variables with a joint factor, row-major over (first, second). Pairs form stars: variables that are `first` (centres)
 * are never `second` (leaves), and a leaf is in one pair only.
 */
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

/** A star of variables that are eliminated together (mostly a single one), and the bits that they touch. */
export interface Group {
  centre: number;
  /** Places of its pairs in the network. */
  pairs: readonly number[];
  bits: readonly number[];
}

/** Groups the variables of a network into stars: a centre with the leaves of its pairs, or one variable alone. */
export function groupsOf({ unary, slots, pairs }: Network): Group[] {
  const leaves = new Set(pairs.map(({ second }) => second));
  return unary.flatMap((_, centre) => {
    if (leaves.has(centre)) return [];
    const own = pairs.flatMap(({ first }, place) => (first === centre ? [place] : []));
    const variables = [centre, ...own.map((place) => pairs[place]!.second)];
    const bits = new Set(variables.flatMap((variable) => slots[variable]!.flatMap((slot) => slot.bits)));
    return [{ centre, pairs: own, bits: [...bits] }];
  });
}
