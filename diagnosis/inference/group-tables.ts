import type { Group, Network } from './network';
import { orBackward, orProduct } from './or-product';
import { fillRow, foldRow, rowsOf, spread } from './patterns';
import type { Rows } from './patterns';
import type { Workspace } from './workspace';

/** The table of a group over its local bits: every state summed out once, so that the grid is never walked inside the patterns. */
export function groupTable(
  network: Network,
  group: Group,
  local: readonly number[],
  space: Workspace,
): Float64Array {
  if (group.pairs.length > 0) return starTable(network, group, local, space);
  const table = space.take(1 << local.length);
  const slots = network.slots[group.centre]!;
  const map = spread(slots, local);
  const row = space.take(map.length);
  const weights = network.unary[group.centre]!;
  for (let state = 0; state < weights.length; state++) {
    if (weights[state] === 0) continue;
    fillRow(row, slots, state, weights[state]!);
    for (let i = 0; i < map.length; i++) table[map[i]!]! += row[i]!;
  }
  return table;
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

/** The parts of a star, with room to combine them in. */
interface Star {
  centre: Rows;
  leaves: { rows: Rows; table: Float64Array; fired: Float64Array }[];
  own: Float64Array;
  product: Float64Array;
  next: Float64Array;
  spare: Float64Array;
  bits: number;
}

function starOf(network: Network, group: Group, local: readonly number[], space: Workspace): Star {
  const size = 1 << local.length;
  const [own, product, next, spare] = [
    space.take(size),
    space.take(size),
    space.take(size),
    space.take(size),
  ] as const;
  const leaves = group.pairs.map((place) => {
    const { second, table } = network.pairs[place]!;
    return { rows: rowsOf(network, second, local, space), table, fired: space.take(size) };
  });
  return {
    centre: rowsOf(network, group.centre, local, space),
    leaves,
    own,
    product,
    next,
    spare,
    bits: local.length,
  };
}

/** Fills what centre and leaves fire, over the local patterns, while the centre is in one state. */
function fillStar({ centre, leaves, own }: Star, state: number): void {
  own.fill(0);
  for (let i = 0; i < centre.width; i++) own[centre.map[i]!]! += centre.values[state * centre.width + i]!;
  for (const { rows, table, fired } of leaves) {
    fired.fill(0);
    for (let other = 0; other < rows.states; other++) {
      const share = table[state * rows.states + other]!;
      if (share === 0) continue;
      for (let i = 0; i < rows.width; i++)
        fired[rows.map[i]!]! += share * rows.values[other * rows.width + i]!;
    }
  }
}

/** What the centre and its leaves fire together, all but one leaf (−1: none left out). */
function firedBut(star: Star, leftOut: number): Float64Array {
  star.product.set(star.own);
  star.leaves.forEach(({ fired }, place) => {
    if (place === leftOut) return;
    star.next.fill(0);
    orProduct(star.bits, 1, star.product, 0, fired, 0, star.next, 0, star.spare, 0);
    star.product.set(star.next);
  });
  return star.product;
}

function starTable(network: Network, group: Group, local: readonly number[], space: Workspace): Float64Array {
  const table = space.take(1 << local.length);
  const star = starOf(network, group, local, space);
  for (let state = 0; state < star.centre.states; state++) {
    fillStar(star, state);
    const fired = firedBut(star, -1);
    for (let i = 0; i < table.length; i++) table[i]! += fired[i]!;
  }
  return table;
}

/** Unnormalised joint beliefs of a star's pairs, row-major over (centre, leaf), from the weights of its firing patterns. */
export function starJoints(
  network: Network,
  group: Group,
  local: readonly number[],
  weights: Float64Array,
  space: Workspace,
): Float64Array[] {
  const star = starOf(network, group, local, space);
  const left = space.take(weights.length);
  const joints = star.leaves.map(({ table }) => new Float64Array(table.length));
  for (let state = 0; state < star.centre.states; state++) {
    fillStar(star, state);
    star.leaves.forEach(({ rows, table }, place) => {
      left.fill(0);
      orBackward(star.bits, 1, firedBut(star, place), 0, weights, 0, left, 0, star.spare, 0);
      for (let other = 0; other < rows.states; other++) {
        let sum = 0;
        for (let i = 0; i < rows.width; i++)
          sum += left[rows.map[i]!]! * rows.values[other * rows.width + i]!;
        joints[place]![state * rows.states + other] = table[state * rows.states + other]! * sum;
      }
    });
  }
  return joints;
}
