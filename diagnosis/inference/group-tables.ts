import type { Group, Network, Slot } from './network';
import { orBackward, orProduct } from './or-product';
import type { Workspace } from './workspace';

/** Patterns of a variable's own slots → patterns of the step's local bits. */
function spread(slots: readonly Slot[], local: readonly number[]): Int32Array {
  const map = new Int32Array(1 << slots.length);
  slots.forEach((slot, place) => {
    let mask = 0;
    for (const bit of slot.bits) mask |= 1 << local.indexOf(bit);
    const size = 1 << place;
    for (let i = 0; i < size; i++) map[size + i] = map[i]! | mask;
  });
  return map;
}

/** row[pattern] = weight · Π slots (hit where the pattern has it, else miss) at one state. */
function fillRow(row: Float64Array, slots: readonly Slot[], state: number, weight: number): void {
  row[0] = weight;
  let size = 1;
  for (const { miss, hit } of slots) {
    const missed = miss[state]!;
    const reached = hit[state]!;
    for (let i = 0; i < size; i++) {
      const value = row[i]!;
      row[size + i] = value * reached;
      row[i] = value * missed;
    }
    size *= 2;
  }
}

/** Σ pattern weights[pattern] · Π slots at one state; `folded` is spoilt. */
function foldRow(folded: Float64Array, slots: readonly Slot[], state: number): number {
  let size = 1 << slots.length;
  for (let place = slots.length - 1; place >= 0; place--) {
    size /= 2;
    const missed = slots[place]!.miss[state]!;
    const reached = slots[place]!.hit[state]!;
    for (let i = 0; i < size; i++) folded[i] = folded[i]! * missed + folded[size + i]! * reached;
  }
  return folded[0]!;
}

/** The table of a group over its local bits: every state summed out once, so that the grid is never walked inside the patterns. */
export function groupTable(
  network: Network,
  group: Group,
  local: readonly number[],
  space: Workspace,
): Float64Array {
  const table = space.take(1 << local.length);
  if (group.pair >= 0) fillPairTable(network, group, local, table, space);
  else {
    const variable = group.variables[0]!;
    const slots = network.slots[variable]!;
    const map = spread(slots, local);
    const row = space.take(map.length);
    const weights = network.unary[variable]!;
    for (let state = 0; state < weights.length; state++) {
      if (weights[state] === 0) continue;
      fillRow(row, slots, state, weights[state]!);
      for (let i = 0; i < map.length; i++) table[map[i]!]! += row[i]!;
    }
  }
  return table;
}

function fillPairTable(
  network: Network,
  group: Group,
  local: readonly number[],
  table: Float64Array,
  space: Workspace,
): void {
  const [first, second] = group.variables as [number, number];
  const joint = network.pairs[group.pair]!.table;
  const rows = slotRows(network, second, local, space);
  const own = network.slots[first]!;
  const map = spread(own, local);
  const row = space.take(map.length);
  const mine = space.take(table.length);
  const others = space.take(table.length);
  const spare = space.take(table.length);
  const states = network.unary[second]!.length;
  network.unary[first]!.forEach((weight, state) => {
    if (weight === 0) return;
    others.fill(0);
    for (let other = 0; other < states; other++) {
      const share = joint[state * states + other]!;
      if (share === 0) continue;
      for (let i = 0; i < rows.map.length; i++)
        others[rows.map[i]!]! += share * rows.values[other * rows.map.length + i]!;
    }
    mine.fill(0);
    fillRow(row, own, state, weight);
    for (let i = 0; i < map.length; i++) mine[map[i]!]! += row[i]!;
    orProduct(local.length, 1, others, 0, mine, 0, table, 0, spare, 0);
  });
}

/** All rows of a variable (states × patterns of its slots), its unary weight included. */
function slotRows(network: Network, variable: number, local: readonly number[], space: Workspace) {
  const slots = network.slots[variable]!;
  const map = spread(slots, local);
  const weights = network.unary[variable]!;
  const values = space.take(weights.length * map.length);
  for (let state = 0; state < weights.length; state++)
    fillRow(values.subarray(state * map.length), slots, state, weights[state]!);
  return { map, values };
}

/** Unnormalised belief of a single variable from the weights of its firing patterns. */
export function singleMarginal(
  network: Network,
  variable: number,
  local: readonly number[],
  weights: Float64Array,
  space: Workspace,
): Float64Array {
  const slots = network.slots[variable]!;
  const map = spread(slots, local);
  const folded = space.take(map.length);
  return network.unary[variable]!.map((prior, state) => {
    for (let i = 0; i < map.length; i++) folded[i] = weights[map[i]!]!;
    return prior * foldRow(folded, slots, state);
  });
}

/** Unnormalised joint belief of a pair, row-major, from the weights of its firing patterns. */
export function pairMarginal(
  network: Network,
  group: Group,
  local: readonly number[],
  weights: Float64Array,
  space: Workspace,
): Float64Array {
  const [first, second] = group.variables as [number, number];
  const { table } = network.pairs[group.pair]!;
  const rows = slotRows(network, second, local, space);
  const own = network.slots[first]!;
  const map = spread(own, local);
  const row = space.take(map.length);
  const mine = space.take(weights.length);
  const left = space.take(weights.length);
  const spare = space.take(weights.length);
  const states = network.unary[second]!.length;
  const joint = new Float64Array(table.length);
  network.unary[first]!.forEach((weight, state) => {
    if (weight === 0) return;
    mine.fill(0);
    left.fill(0);
    fillRow(row, own, state, weight);
    for (let i = 0; i < map.length; i++) mine[map[i]!]! += row[i]!;
    orBackward(local.length, 1, mine, 0, weights, 0, left, 0, spare, 0);
    for (let other = 0; other < states; other++) {
      let sum = 0;
      for (let i = 0; i < rows.map.length; i++)
        sum += left[rows.map[i]!]! * rows.values[other * rows.map.length + i]!;
      joint[state * states + other] = table[state * states + other]! * sum;
    }
  });
  return joint;
}
