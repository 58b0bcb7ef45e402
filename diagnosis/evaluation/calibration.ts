import type { Case, Measured } from '../case-schema';
import { parseCase } from '../case';
import type { Knowledge } from '../garments/schema';
import { prepare, solveRound, tailsOf } from '../inference/beliefs';
import { zAt } from '../inference/grid';
import type { Strengths } from '../inference/strengths';
import { naiveBayesLoss, readingLoss } from './baselines';
import { doCheck, drawStates, isComplete, lookAtSigns, worldOf } from './person';
import type { World } from './person';
import { Random } from './random';
import { calibrationCurve, calibrationError, chiSquared, chiSquaredTail } from './scores';
import type { CalibrationBin, Prediction } from './scores';

const RANK_BINS = 20;
const CURVE_BINS = 15;
/** Each sign is looked at with this probability, so that a fitting has a dozen or more. */
const LOOKED_AT = 0.35;
const CHECKS_DONE = 2;
const SIGNS_FOR_BAYES = 6;

export interface CalibrationResult {
  seed: number;
  fittings: number;
  predictions: number;
  /** p of the χ² test of uniform ranks, by dimension. */
  rankP: { dimension: string; p: number }[];
  leastP: number;
  calibrationError: number;
  curve: CalibrationBin[];
  /** Mean log loss a fitting of all decisions, over fittings with six positive signs and more, nats. */
  lossNats: number;
  naiveBayesLossNats: number;
}

/**
 * Calibration by simulation (Talts et al. 2018): needs drawn from the prior, evidence from the needs, and the needs' ranks
 * within their posteriors must be uniform. It tests the code, not the knowledge. Maskers are left out: they weigh an
 * absence by a belief and are no part of the drawn world. With another `truth` the signs show by other strengths than are read.
 */
export function calibrate(
  knowledge: Knowledge,
  strengths: Strengths,
  seed: number,
  fittings: number,
  truth = strengths,
): CalibrationResult {
  const open = { ...knowledge, signs: knowledge.signs.map((sign) => ({ ...sign, maskedBy: [] })) };
  const random = new Random(seed);
  const empty = emptyCase(open);
  const world = worldOf(open, empty, truth);
  const ranks = open.dimensions.map(() => Array.from({ length: RANK_BINS }, () => 0));
  const predictions: Prediction[] = [];
  const losses: { ours: number; naive: number }[] = [];
  for (let one = 0; one < fittings; one++) {
    const states = drawStates(random, world);
    const fitting = drawEvidence(random, world, empty, states);
    const { layout, tables, start } = prepare(open, fitting, strengths);
    const { marginals } = solveRound(layout, tables, start, fitting);
    open.dimensions.forEach((_, dimension) => {
      const variable = layout.ofDimension[dimension]![0]!;
      ranks[dimension]![rankBin(random, marginals[variable]!, states[variable]!)]! += 1;
      predictions.push(...predictionsOf(world, dimension, marginals[variable]!, states[variable]!));
    });
    if (fitting.signs.filter(({ severity }) => severity > 0).length >= SIGNS_FOR_BAYES)
      losses.push({
        ours: readingLoss(layout, marginals, states),
        naive: naiveBayesLoss(world, fitting.signs, states),
      });
  }
  const rankP = ranks.map((counts, dimension) => ({
    dimension: open.dimensions[dimension]!.id,
    p: chiSquaredTail(chiSquared(counts), RANK_BINS - 1),
  }));
  return {
    seed,
    fittings,
    predictions: predictions.length,
    rankP,
    leastP: Math.min(...rankP.map(({ p }) => p)),
    calibrationError: calibrationError(predictions, CURVE_BINS),
    curve: calibrationCurve(predictions, CURVE_BINS),
    lossNats: meanOf(losses.map(({ ours }) => ours)),
    naiveBayesLossNats: meanOf(losses.map(({ naive }) => naive)),
  };
}

/** A case with nothing recorded. */
export function emptyCase(knowledge: Knowledge): Case {
  const parsed = parseCase(knowledge, { garment: knowledge.garment });
  if (!parsed.ok) throw new Error(parsed.fault.message);
  return parsed.value;
}

function drawEvidence(random: Random, world: World, empty: Case, states: readonly number[]): Case {
  const { knowledge } = world.layout.index;
  const checks = random.sample(knowledge.checks.filter(isComplete), random.below(CHECKS_DONE + 1));
  return {
    ...empty,
    signs: lookAtSigns(random, world, states, LOOKED_AT),
    tests: checks.map((check) => doCheck(random, world, check, states)),
    measured: random.chance(0.5) ? [measure(random, world, states)] : [],
  };
}

/** One or two needs measured with an error of 4 to 12 mm. */
function measure(random: Random, { layout }: World, states: readonly number[]): Measured {
  const dimensions = random.sample([...layout.ofDimension.keys()], 1 + random.below(2));
  const sdMm = random.between(4, 12);
  const trueMm = dimensions.reduce(
    (sum, dimension) => sum + zAt(states[layout.ofDimension[dimension]![0]!]!) * layout.scaleMm[dimension]!,
    0,
  );
  return {
    terms: dimensions.map((dimension) => ({
      dimension: layout.index.knowledge.dimensions[dimension]!.id,
      weight: 1,
      side: 'both',
    })),
    needMm: trueMm + sdMm * random.normal(),
    sdMm,
  };
}

/** Bin of P(need < truth), with the truth's own bin shared out at random, so that ranks on a grid can be uniform. */
function rankBin(random: Random, belief: Float64Array, truth: number): number {
  let below = 0;
  for (let state = 0; state < truth; state++) below += belief[state]!;
  const rank = below + random.next() * belief[truth]!;
  return Math.min(RANK_BINS - 1, Math.floor(rank * RANK_BINS));
}

function predictionsOf(
  { layout }: World,
  dimension: number,
  belief: Float64Array,
  truth: number,
): Prediction[] {
  const edge = layout.toleranceMm[dimension]! / layout.scaleMm[dimension]!;
  const { more, less } = tailsOf(layout, dimension, belief);
  return [
    { p: more, came: zAt(truth) > edge + 1e-9 },
    { p: less, came: zAt(truth) < -edge - 1e-9 },
  ].map(({ p, came }) => ({ p: Math.min(1, p), came }));
}

function meanOf(values: readonly number[]): number {
  return values.reduce((a, b) => a + b, 0) / Math.max(1, values.length);
}
