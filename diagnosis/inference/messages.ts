import type { SumFactor } from './draft';
import { GRID_REACH, zAt } from './grid';

/** Bins of a sum's distribution in one of its standard deviations. */
const BINS_PER_SD = 6;
const BINS_MAX = 2048;
/** A sum is not known better than this share of its reach, so that no weight vanishes altogether. */
const REACH_SDS_MAX = 18;

/**
 * Messages of a Gaussian on a sum to each of its needs, given what the rest of the evidence says of the others (beliefs
 * without this sum's own message): the sum of the others is convolved on a fine grid, then weighed by the Gaussian.
 */
export function sumMessages(sum: SumFactor, beliefs: readonly Float64Array[]): Float64Array[] {
  const reachMm = sum.terms.reduce((total, { perZ }) => total + Math.abs(perZ) * GRID_REACH, 0);
  const sdMm = Math.max(sum.sdMm, reachMm / REACH_SDS_MAX);
  const stepMm = Math.max(sdMm / BINS_PER_SD, (2 * reachMm) / BINS_MAX);
  const half = Math.ceil(reachMm / stepMm) + 1;
  const meanMm = Math.min(reachMm, Math.max(-reachMm, sum.meanMm));
  const size = 2 * half + 1;
  const before: Float64Array[] = [pointAtZero(size, half)];
  for (let i = 0; i < sum.terms.length - 1; i++)
    before.push(convolve(before[i]!, beliefs[i]!, sum.terms[i]!.perZ / stepMm));
  let after: Float64Array = Float64Array.from({ length: size }, (_, bin) => {
    const off = ((bin - half) * stepMm - meanMm) / sdMm;
    return Math.exp(-0.5 * off * off);
  });
  const messages: Float64Array[] = [];
  for (let i = sum.terms.length - 1; i >= 0; i--) {
    const perBin = sum.terms[i]!.perZ / stepMm;
    messages[i] = expectationsAt(before[i]!, after, perBin, beliefs[i]!.length);
    after = correlate(after, beliefs[i]!, perBin);
  }
  return messages;
}

function pointAtZero(size: number, half: number): Float64Array {
  const point = new Float64Array(size);
  point[half] = 1;
  return point;
}

/** Distribution of the sum so far plus one need, each shift shared between the two nearest bins. */
function convolve(so: Float64Array, belief: Float64Array, perZ: number): Float64Array {
  const out = new Float64Array(so.length);
  belief.forEach((weight, bin) => {
    const shift = zAt(bin) * perZ;
    const whole = Math.floor(shift);
    const part = shift - whole;
    for (let i = Math.max(0, -whole); i < so.length && i + whole + 1 < so.length; i++) {
      const share = weight * so[i]!;
      if (share === 0) continue;
      out[i + whole]! += share * (1 - part);
      out[i + whole + 1]! += share * part;
    }
  });
  return out;
}

/** What the sum will weigh, seen from before one need is added. */
function correlate(ahead: Float64Array, belief: Float64Array, perZ: number): Float64Array {
  const out = new Float64Array(ahead.length);
  belief.forEach((weight, bin) => {
    const shift = zAt(bin) * perZ;
    const whole = Math.floor(shift);
    const part = shift - whole;
    for (let i = Math.max(0, -whole); i < out.length && i + whole + 1 < out.length; i++)
      out[i]! += weight * (ahead[i + whole]! * (1 - part) + ahead[i + whole + 1]! * part);
  });
  return out;
}

function expectationsAt(so: Float64Array, ahead: Float64Array, perZ: number, states: number): Float64Array {
  const message = new Float64Array(states);
  for (let bin = 0; bin < states; bin++) {
    const shift = zAt(bin) * perZ;
    const whole = Math.floor(shift);
    const part = shift - whole;
    let sum = 0;
    for (let i = Math.max(0, -whole); i < so.length && i + whole + 1 < so.length; i++)
      sum += so[i]! * (ahead[i + whole]! * (1 - part) + ahead[i + whole + 1]! * part);
    message[bin] = sum;
  }
  return message;
}
