/** Belief about one need is a histogram over z = need / scale, from −5 to +5 in steps of 0.25; the end bins mean "at least". */
export const GRID_STEP = 0.25;
export const GRID_REACH = 5;
export const GRID_SIZE = 41;
export const GRID_FIT = 20;

/** A Gaussian narrower than this, z, would fall between the bins. */
export const SD_MIN_Z = 0.15;

/** z at a bin of the grid, −5 … 5. */
export function zAt(bin: number): number {
  return (bin - GRID_FIT) * GRID_STEP;
}

/** Scales a histogram to sum 1, in place, and returns the sum it had. Zero mass is a bug and throws. */
export function normalise(weights: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < weights.length; i++) sum += weights[i]!;
  if (!(sum > 0)) throw new Error('A belief lost all its mass');
  for (let i = 0; i < weights.length; i++) weights[i]! /= sum;
  return sum;
}

/** A joint of two needs with rows and columns exchanged. */
export function transpose(joint: Float64Array): Float64Array {
  return joint.map((_, i) => joint[(i % GRID_SIZE) * GRID_SIZE + Math.floor(i / GRID_SIZE)]!);
}
