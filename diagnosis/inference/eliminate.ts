import { normalise } from './grid';
import { groupTable, singleMarginal, starJoints } from './group-tables';
import { groupsOf } from './network';
import type { Finding, Group, Network, Posterior } from './network';
import { orBackward, orProduct, orWeights } from './or-product';
import { orderGroups } from './order';
import type { Order, Step } from './order';
import { Workspace } from './workspace';

/** One step as it was walked forward, kept for the way back. */
interface Walked {
  step: Step;
  local: number[];
  run: number;
  /** Weights before the group is combined, with its new findings opened. */
  before: Float64Array;
  table: Float64Array;
  /** Place of each earlier pattern in this step's layout. */
  places: Int32Array;
  opening: Float64Array;
}

const space = new Workspace();

/**
 * Exact beliefs of a network of noisy-MAX observations (Pearl 1988; leak: Henrion 1989; several severities: Díez 1993), by
 * eliminating one variable after another over the patterns of reached findings, forward and then backward.
 * Cost grows with 2^(findings open at once), not with their number; every term is positive, so digits are kept.
 */
export function eliminate(network: Network, order = orderOf(network)): Posterior {
  space.release();
  const groups = groupsOf(network);
  const { walked, logWeight } = walkForward(network, order);
  const weights = walkBackward(walked);
  const alone = leaksAlone(network);
  const result: Posterior = {
    logWeight: logWeight + alone,
    marginals: [],
    joints: [],
    width: order.widest.length,
  };
  const unlinked = Float64Array.of(1);
  for (const group of groups) {
    const at = walked.findIndex(({ step }) => step.group.centre === group.centre);
    if (at >= 0) collect(network, group, walked[at]!.local, weights[at]!, result);
    else result.logWeight += collect(network, group, [], unlinked, result);
  }
  return result;
}

/** Findings that no variable touches are reached by their leaks or not at all; logarithm of that. */
function leaksAlone({ slots, findings }: Network): number {
  const touched = new Set(slots.flatMap((own) => own.flatMap(({ bits }) => bits)));
  return findings
    .filter(({ bits }) => !bits.some((bit) => touched.has(bit)))
    .reduce((sum, { leak }) => sum + Math.log(leak.at(-1)!), 0);
}

/** The order of elimination of a network, and the most findings open at once. */
export function orderOf(network: Network): Order {
  return orderGroups(groupsOf(network), network.findings);
}

/** Stores the beliefs of a group and returns the logarithm of its whole weight. */
function collect(
  network: Network,
  group: Group,
  local: readonly number[],
  weights: Float64Array,
  result: Posterior,
): number {
  if (group.pairs.length === 0) {
    const belief = singleMarginal(network, group.centre, local, weights, space);
    const sum = normalise(belief);
    result.marginals[group.centre] = belief;
    return Math.log(sum);
  }
  let whole = 0;
  starJoints(network, group, local, weights, space).forEach((joint, place) => {
    whole = Math.log(normalise(joint));
    const pair = group.pairs[place]!;
    const { second } = network.pairs[pair]!;
    const [rows, columns] = [network.unary[group.centre]!.length, network.unary[second]!.length];
    result.joints[pair] = joint;
    result.marginals[group.centre] = marginOf(joint, rows, columns, true);
    result.marginals[second] = marginOf(joint, rows, columns, false);
  });
  return whole;
}

function marginOf(joint: Float64Array, rows: number, columns: number, ofRows: boolean): Float64Array {
  const margin = new Float64Array(ofRows ? rows : columns);
  for (let row = 0; row < rows; row++)
    for (let column = 0; column < columns; column++)
      margin[ofRows ? row : column]! += joint[row * columns + column]!;
  return margin;
}

function walkForward(network: Network, order: Order): { walked: Walked[]; logWeight: number } {
  let weights = space.take(1).fill(1);
  let open: number[] = [];
  let logWeight = 0;
  const walked: Walked[] = [];
  for (const step of order.steps) {
    const local = [...step.held, ...step.opened];
    const places = placesOf(open, [...step.rest, ...step.held]);
    const opening = openingOf(step.opened, network.findings);
    const run = 1 << step.rest.length;
    const before = space.take(run << local.length);
    for (let pattern = 0; pattern < opening.length; pattern++)
      for (let i = 0; i < weights.length; i++)
        before[pattern * weights.length + places[i]!] = opening[pattern]! * weights[i]!;
    const table = groupTable(network, step.group, local, space);
    const after = space.take(before.length);
    orProduct(local.length, run, before, 0, table, 0, after, 0, space.take(table.length), 0);
    walked.push({ step, local, run, before, table, places, opening });
    weights = close(after, step, local, run);
    logWeight += Math.log(normalise(weights));
    open = [...step.rest, ...local].filter((bit) => !step.closed.has(bit));
  }
  return { walked, logWeight };
}

/** Walks back over the steps and returns, for each, the weight of every pattern of its group's firings. */
function walkBackward(walked: readonly Walked[]): Float64Array[] {
  const result: Float64Array[] = [];
  let ahead = space.take(1).fill(1);
  for (let at = walked.length - 1; at >= 0; at--) {
    const { step, local, run, before, table, places, opening } = walked[at]!;
    const reached = reopen(ahead, step, local, run);
    const weights = space.take(table.length);
    orWeights(local.length, run, before, 0, reached, 0, weights, 0, space.take(before.length), 0);
    result[at] = weights;
    const back = space.take(before.length);
    orBackward(local.length, run, table, 0, reached, 0, back, 0, space.take(table.length), 0);
    ahead = space.take(places.length);
    for (let pattern = 0; pattern < opening.length; pattern++)
      for (let i = 0; i < ahead.length; i++)
        ahead[i]! += opening[pattern]! * back[pattern * ahead.length + places[i]!]!;
    normalise(ahead);
  }
  return result;
}

/** Where each pattern over `from` lies among the patterns over `to` (the same bits in another order). */
function placesOf(from: readonly number[], to: readonly number[]): Int32Array {
  const places = new Int32Array(1 << from.length);
  from.forEach((bit, index) => {
    const size = 1 << index;
    const moved = 1 << to.indexOf(bit);
    for (let i = 0; i < size; i++) places[size + i] = places[i]! | moved;
  });
  return places;
}

/** Starting weights of the patterns of newly opened bits: the leaks of their findings, multiplied. */
function openingOf(opened: readonly number[], findings: readonly Finding[]): Float64Array {
  let weights = Float64Array.of(1);
  for (let at = 0; at < opened.length;) {
    const { bits, leak } = findings.find((finding) => finding.bits[0] === opened[at])!;
    const wider = new Float64Array(weights.length << bits.length);
    for (let pattern = 0; pattern < leak.length; pattern++)
      for (let i = 0; i < weights.length; i++)
        wider[pattern * weights.length + i] = leak[pattern]! * weights[i]!;
    weights = wider;
    at += bits.length;
  }
  return weights;
}

/** Local patterns of a step in which every closing bit is reached, in the order of the patterns of the bits that stay. */
function stayingPatterns(step: Step, local: readonly number[]): Int32Array {
  let closedMask = 0;
  const kept: number[] = [];
  local.forEach((bit, index) => {
    if (step.closed.has(bit)) closedMask |= 1 << index;
    else kept.push(index);
  });
  const patterns = new Int32Array(1 << kept.length);
  patterns[0] = closedMask;
  kept.forEach((index, place) => {
    const size = 1 << place;
    for (let i = 0; i < size; i++) patterns[size + i] = patterns[i]! | (1 << index);
  });
  return patterns;
}

function close(after: Float64Array, step: Step, local: readonly number[], run: number): Float64Array {
  const patterns = stayingPatterns(step, local);
  const kept = space.take(patterns.length * run);
  for (let p = 0; p < patterns.length; p++)
    for (let i = 0; i < run; i++) kept[p * run + i] = after[patterns[p]! * run + i]!;
  return kept;
}

function reopen(ahead: Float64Array, step: Step, local: readonly number[], run: number): Float64Array {
  const patterns = stayingPatterns(step, local);
  const reached = space.take(run << local.length);
  for (let p = 0; p < patterns.length; p++)
    for (let i = 0; i < run; i++) reached[patterns[p]! * run + i] = ahead[p * run + i]!;
  return reached;
}
