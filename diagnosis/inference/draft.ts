import { GRID_REACH, GRID_SIZE, zAt } from './grid';
import type { Finding, Network, Pair, Slot } from './network';

/** A Gaussian on a weighted sum of needs, in millimetres. */
export interface SumFactor {
  /** Millimetres of the sum per z of each variable. */
  terms: readonly { variable: number; perZ: number }[];
  meanMm: number;
  sdMm: number;
}

/** Beliefs that a round starts from: one histogram per variable, and joints that replace those of their two variables. */
export interface Beliefs {
  marginals: Float64Array[];
  pairs: Pair[];
}

/** A finding with what orders it when too many are open: the weakest is absorbed first. */
export interface OpenFinding {
  slots: { variable: number; miss: Float64Array; hit: Float64Array; parts: readonly number[] }[];
  leak: Float64Array;
  weight: number;
  key: string;
}

/** Evidence of one round while it is being gathered: logarithms of unary weights, findings, sums. */
export class Draft {
  readonly logs: Float64Array[];
  readonly findings: OpenFinding[] = [];
  readonly sums: SumFactor[] = [];

  constructor(readonly beliefs: Beliefs) {
    this.logs = beliefs.marginals.map((belief) => new Float64Array(belief.length));
  }

  /** Multiplies a variable's belief by exp(weight · log). */
  temper(variable: number, log: (state: number) => number, weight = 1): void {
    const logs = this.logs[variable]!;
    for (let state = 0; state < logs.length; state++) logs[state]! += weight * log(state);
  }
}

/** What a draft becomes: the network of everything kept exact, and the factors that have to be passed as messages. */
export interface Assembled {
  network: Network;
  /** Natural logarithm taken out of the unary weights to keep them near 1. */
  logShift: number;
  sums: SumFactor[];
}

/**
 * Turns gathered evidence into a network. A sum of two needs becomes their joint where neither is in another joint;
 * the other sums are left for messages.
 */
export function assemble(draft: Draft): Assembled {
  const pairs = draft.beliefs.pairs.map((pair) => ({ ...pair, table: pair.table.slice() }));
  const inPair = new Set(pairs.flatMap(({ first, second }) => [first, second]));
  const sums: SumFactor[] = [];
  for (const sum of draft.sums) if (!joinAsPair(sum, pairs, inPair)) sums.push(sum);
  const owned = new Set(draft.beliefs.pairs.flatMap(({ first, second }) => [first, second]));
  let logShift = 0;
  const unary = draft.beliefs.marginals.map((belief, variable) => {
    const logs = draft.logs[variable]!;
    const shift = logs.reduce((most, log) => Math.max(most, log), -Infinity);
    logShift += shift;
    return logs.map((log, state) => {
      const prior = owned.has(variable) ? 1 : belief[state]!;
      return Math.exp(log - shift) * prior;
    });
  });
  return { network: { unary, pairs, ...layFindings(draft.findings, unary.length) }, logShift, sums };
}

/** Numbers the bits of findings, in their order, and hands their slots to the variables. */
export function layFindings(
  findings: readonly OpenFinding[],
  variables: number,
): Pick<Network, 'slots' | 'findings'> {
  const slots: Slot[][] = Array.from({ length: variables }, () => []);
  const laid: Finding[] = [];
  let next = 0;
  for (const finding of findings) {
    const bits = finding.leak.length === 4 ? [next, next + 1] : [next];
    next += bits.length;
    laid.push({ bits, leak: finding.leak });
    for (const { variable, miss, hit, parts } of finding.slots)
      slots[variable]!.push({ bits: parts.map((part) => bits[part]!), miss, hit });
  }
  return { slots, findings: laid };
}

function joinAsPair({ terms, meanMm, sdMm }: SumFactor, pairs: Pair[], inPair: Set<number>): boolean {
  if (terms.length !== 2) return false;
  const [a, b] = terms as [SumFactor['terms'][number], SumFactor['terms'][number]];
  const shared = pairs.find(
    ({ first, second }) =>
      (first === a.variable && second === b.variable) || (first === b.variable && second === a.variable),
  );
  if (!shared && (inPair.has(a.variable) || inPair.has(b.variable))) return false;
  const [first, second] = shared?.first === b.variable ? [b, a] : [a, b];
  const table = shared?.table ?? new Float64Array(GRID_SIZE * GRID_SIZE).fill(1);
  multiplyBySum(table, first.perZ, second.perZ, meanMm, sdMm);
  if (!shared) pairs.push({ first: first.variable, second: second.variable, table });
  inPair.add(first.variable).add(second.variable);
  return true;
}

/** Multiplies a joint by the Gaussian of its sum, scaled so that its greatest factor is 1. */
function multiplyBySum(
  table: Float64Array,
  perRow: number,
  perColumn: number,
  meanMm: number,
  sdMm: number,
): void {
  const reachMm = (Math.abs(perRow) + Math.abs(perColumn)) * GRID_REACH;
  const mean = Math.min(reachMm, Math.max(-reachMm, meanMm));
  for (let row = 0; row < GRID_SIZE; row++)
    for (let column = 0; column < GRID_SIZE; column++) {
      const off = (perRow * zAt(row) + perColumn * zAt(column) - mean) / sdMm;
      table[row * GRID_SIZE + column]! *= Math.exp(-0.5 * off * off);
    }
}
