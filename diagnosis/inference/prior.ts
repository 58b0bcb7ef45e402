import type { Case } from '../case-schema';
import type { Direction } from '../garments/schema';
import { GRID_FIT, GRID_SIZE, GRID_STEP, normalise } from './grid';
import type { Layout } from './layout';
import type { Strengths } from './strengths';

/** A shape note, and all notes together, shift the odds of a tail by a factor of 2 at the most. */
const LEAN_MAX = Math.log(2);
/** z where a tail is most likely, roughly where a fault becomes clearly visible. */
const TAIL_PEAK = 1;
/** Share of the prior of a split need in which left and right know nothing of each other. */
const APART = 0.3;
const NEAR_DECAY = 0.5;
const NEAR_SHARE = 0.6;
/** A cause that somebody ticked or crossed off is as good as known. */
const CAUSE_KNOWN = 0.995;

/** Beliefs before any evidence: a spike at "fits" and two tails per need, the knowledge's prior per cause. */
export function priorBeliefs(layout: Layout, fitting: Case, strengths: Strengths): Float64Array[] {
  const leans = leansOf(layout, fitting);
  return layout.variables.map((variable) => {
    if (variable.kind === 'cause') return causePrior(layout, fitting, variable.cause);
    const lean = (direction: Direction) => {
      const sum = leans.get(`${variable.dimension} ${direction} both`) ?? 0;
      const own = leans.get(`${variable.dimension} ${direction} ${variable.side}`) ?? 0;
      return Math.min(LEAN_MAX, variable.side === 'both' ? sum : sum + own);
    };
    return needPrior(strengths.tail, lean('more'), lean('less'));
  });
}

/** Spike and tails; `more` and `less` are log-odds that raise a tail. */
export function needPrior(tail: number, more: number, less: number): Float64Array {
  const weights = new Float64Array(GRID_SIZE);
  let shape = 0;
  for (let step = 2; step <= GRID_FIT; step++) shape += tailShape(step);
  for (let step = 2; step <= GRID_FIT; step++) {
    weights[GRID_FIT + step] = (tail * Math.exp(more) * tailShape(step)) / shape;
    weights[GRID_FIT - step] = (tail * Math.exp(less) * tailShape(step)) / shape;
  }
  const spike = 1 - 2 * tail;
  weights[GRID_FIT] = spike * 0.6;
  weights[GRID_FIT - 1] = weights[GRID_FIT + 1] = spike * 0.2;
  normalise(weights);
  return weights;
}

function tailShape(step: number): number {
  const z = step * GRID_STEP;
  return z * Math.exp(-z / TAIL_PEAK);
}

function leansOf(layout: Layout, fitting: Case): Map<string, number> {
  const { index } = layout;
  const { shape, cloth = [] } = index.knowledge;
  const given = new Set(fitting.shape);
  const notes = shape.filter(
    ({ id, fittedFor }) => given.has(id) || (fittedFor !== undefined && fittedFor === fitting.fittedFor),
  );
  const sums = new Map<string, number>();
  for (const { leans } of [...notes, ...cloth.filter(({ kind }) => kind === fitting.cloth.kind)])
    for (const { to, direction, logOdds, side = 'both' } of leans) {
      const key = `${index.dimensions.get(to)!} ${direction} ${side}`;
      sums.set(key, (sums.get(key) ?? 0) + logOdds);
    }
  return sums;
}

function causePrior(layout: Layout, fitting: Case, cause: number): Float64Array {
  const { id, prior, onlyIn } = layout.index.knowledge.causes[cause]!;
  if (fitting.causes.present.includes(id)) return Float64Array.of(1 - CAUSE_KNOWN, CAUSE_KNOWN);
  const cannotBe = onlyIn !== undefined && !onlyIn.includes(fitting.cloth.kind);
  if (cannotBe || fitting.causes.absent.includes(id)) return Float64Array.of(CAUSE_KNOWN, 1 - CAUSE_KNOWN);
  return Float64Array.of(1 - prior, prior);
}

/**
 * Joint prior of left and right, row-major, whose margins are the two given: mostly near each other (a reversible step
 * from one side to the other), a little independent.
 */
export function sidesPrior(left: Float64Array, right: Float64Array): Float64Array {
  const joint = new Float64Array(GRID_SIZE * GRID_SIZE);
  const mean = left.map((weight, i) => (weight + right[i]!) / 2);
  let reach = 0;
  for (let away = 1; away < GRID_SIZE; away++) reach += 2 * Math.exp((-away * GRID_STEP) / NEAR_DECAY);
  for (let l = 0; l < GRID_SIZE; l++) {
    let moved = 0;
    for (let r = 0; r < GRID_SIZE; r++) {
      if (r === l) continue;
      const near = (NEAR_SHARE / reach) * Math.exp((-Math.abs(r - l) * GRID_STEP) / NEAR_DECAY);
      const share = near * Math.min(mean[l]!, mean[r]!);
      moved += share;
      joint[l * GRID_SIZE + r] = (1 - APART) * share + APART * mean[l]! * mean[r]!;
    }
    joint[l * GRID_SIZE + l] = (1 - APART) * (mean[l]! - moved) + APART * mean[l]! * mean[l]!;
  }
  for (let l = 0; l < GRID_SIZE; l++)
    for (let r = 0; r < GRID_SIZE; r++)
      joint[l * GRID_SIZE + r]! *= (left[l]! / mean[l]!) * (right[r]! / mean[r]!);
  normalise(joint);
  return joint;
}
