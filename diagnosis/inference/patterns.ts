import type { Network, Slot } from './network';
import type { Workspace } from './workspace';

/** Patterns of a variable's own slots → patterns of the step's local bits. */
export function spread(slots: readonly Slot[], local: readonly number[]): Int32Array {
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
export function fillRow(row: Float64Array, slots: readonly Slot[], state: number, weight: number): void {
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
export function foldRow(folded: Float64Array, slots: readonly Slot[], state: number): number {
  let size = 1 << slots.length;
  for (let place = slots.length - 1; place >= 0; place--) {
    size /= 2;
    const missed = slots[place]!.miss[state]!;
    const reached = slots[place]!.hit[state]!;
    for (let i = 0; i < size; i++) folded[i] = folded[i]! * missed + folded[size + i]! * reached;
  }
  return folded[0]!;
}

/** A variable's firings: one row of weights over its own patterns for each state, its unary weight included. */
export interface Rows {
  states: number;
  width: number;
  map: Int32Array;
  values: Float64Array;
}

export function rowsOf(
  { slots, unary }: Network,
  variable: number,
  local: readonly number[],
  space: Workspace,
): Rows {
  const map = spread(slots[variable]!, local);
  const weights = unary[variable]!;
  const values = space.take(weights.length * map.length);
  for (let state = 0; state < weights.length; state++)
    fillRow(values.subarray(state * map.length), slots[variable]!, state, weights[state]!);
  return { states: weights.length, width: map.length, map, values };
}
