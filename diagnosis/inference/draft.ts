import { GRID_REACH, GRID_SIZE, SD_MIN_Z, transpose, zAt } from './grid';
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
 * Turns gathered evidence into a network. A sum of two needs becomes their joint as long as the joints keep the shape of
 * stars (one need with several others); the other sums are left for messages.
 */
export function assemble(draft: Draft): Assembled {
  const joints = draft.beliefs.pairs.map((pair): Joint => ({ ...pair, logs: null }));
  const kept = joints.length;
  const sums = draft.sums.filter((sum) => !joinAsPair(sum, joints));
  let logShift = 0;
  const leaves = new Set(joints.slice(0, kept).map(({ second }) => second));
  const unary = draft.beliefs.marginals.map((belief, variable) => {
    const { weights, shift } = weightsOf(draft.logs[variable]!);
    logShift += shift;
    // The joint of a leaf given its centre holds the leaf's own belief.
    return leaves.has(variable) ? weights : weights.map((weight, state) => weight * belief[state]!);
  });
  const pairs = joints.map((joint, place): Pair => {
    const { first, second } = joint;
    const table = place < kept ? givenCentre(joint.table, draft.beliefs.marginals[first]!) : joint.table;
    if (!joint.logs) return { first, second, table };
    const { weights, shift } = weightsOf(joint.logs);
    logShift += shift;
    return { first, second, table: weights.map((weight, i) => weight * table[i]!) };
  });
  return { network: { unary, pairs, ...layFindings(draft.findings, unary.length) }, logShift, sums };
}

/** P(leaf | centre), row by row. */
function givenCentre(joint: Float64Array, centre: Float64Array): Float64Array {
  const columns = joint.length / centre.length;
  return joint.map((weight, i) => {
    const whole = centre[Math.floor(i / columns)]!;
    return whole > 0 ? weight / whole : 0;
  });
}

/** Evidence of one kind never speaks more strongly than this, so that contradictory evidence leaves some belief (e^−200). */
const LOG_MIN = -200;

/** Weights with their greatest at 1, and the logarithm taken out. */
function weightsOf(logs: Float64Array): { weights: Float64Array; shift: number } {
  const shift = logs.reduce((most, log) => Math.max(most, log), -Infinity);
  return { weights: logs.map((log) => Math.exp(Math.max(LOG_MIN, log - shift))), shift };
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

/** A joint being gathered: what it was before, and the logarithms of the sums that it takes in. */
interface Joint extends Pair {
  logs: Float64Array | null;
}

function joinAsPair({ terms, meanMm, sdMm }: SumFactor, joints: Joint[]): boolean {
  if (terms.length !== 2) return false;
  const [a, b] = terms as [SumFactor['terms'][number], SumFactor['terms'][number]];
  const joint = jointOf(a.variable, b.variable, joints);
  if (!joint) return false;
  const [rows, columns] = joint.first === a.variable ? [a, b] : [b, a];
  joint.logs ??= new Float64Array(GRID_SIZE * GRID_SIZE);
  addSumLogs(joint.logs, rows.perZ, columns.perZ, meanMm, sdMm);
  return true;
}

/** The joint of two variables, made where it keeps the shape of stars; undefined where it would not. */
function jointOf(a: number, b: number, joints: Joint[]): Joint | undefined {
  const made = joints.find(
    ({ first, second }) => (first === a && second === b) || (first === b && second === a),
  );
  if (made) return made;
  const pairsOf = (variable: number) =>
    joints.filter((one) => one.first === variable || one.second === variable);
  const [second, first] = pairsOf(b).length === 0 ? [b, a] : [a, b];
  const held = pairsOf(first);
  if (pairsOf(second).length > 0) return undefined;
  const asLeaf = held.find((one) => one.second === first);
  if (asLeaf && pairsOf(asLeaf.first).length > 1) return undefined;
  if (asLeaf) turn(asLeaf);
  const table = new Float64Array(GRID_SIZE * GRID_SIZE).fill(1);
  const joint = { first, second, table, logs: null };
  joints.push(joint);
  return joint;
}

/** Makes the leaf of a lone pair its centre. */
function turn(joint: Joint): void {
  [joint.first, joint.second] = [joint.second, joint.first];
  joint.table = transpose(joint.table);
  joint.logs = joint.logs && transpose(joint.logs);
}

/** Adds the logarithm of a Gaussian on a sum; a mean out of reach lies at the end of what the grid reaches. */
function addSumLogs(
  logs: Float64Array,
  perRow: number,
  perColumn: number,
  meanMm: number,
  sdMm: number,
): void {
  const reachMm = (Math.abs(perRow) + Math.abs(perColumn)) * GRID_REACH;
  const mean = Math.min(reachMm, Math.max(-reachMm, meanMm));
  const sd = Math.max(sdMm, SD_MIN_Z * Math.max(Math.abs(perRow), Math.abs(perColumn)));
  for (let row = 0; row < GRID_SIZE; row++)
    for (let column = 0; column < GRID_SIZE; column++) {
      const off = (perRow * zAt(row) + perColumn * zAt(column) - mean) / sd;
      logs[row * GRID_SIZE + column]! -= 0.5 * off * off;
    }
}
