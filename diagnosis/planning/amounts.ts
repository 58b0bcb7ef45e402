import type { Side } from '../case-schema';
import type { Correction } from '../garments/schema';
import { ownAmount } from '../inference/replay';
import type { Range } from '../reading';
import { amountText } from './amount-text';
import { type Caps, capsOn } from './caps';
import type { Outlook, Tail } from './outlook';
import { LIKELY_FROM, POSSIBLE_FROM } from './words';

/** A first change takes two thirds of what is estimated. */
const FIRST_SHARE = 2 / 3;
/** An estimate is firm when its likely range is no wider than this share of it. */
const FIRM_SHARE = 0.8;

/** Where the change is no length. */
export const NO_AMOUNTS = {
  amountMm: null,
  amountText: null,
  estimateMm: null,
  basis: null,
  firstMm: null,
  capRoundMm: null,
  capTotalMm: null,
  beyond: null,
};

/** How far a correction may go on this body, mm of its own basis. */
export interface Limits extends Caps {
  /** What is left of the total cap after the rounds before. */
  leftMm: number;
  /** What this round may take at the most. */
  capMm: number;
}

/** Its first amount and caps at this size, and what earlier rounds have left of them; null where the change is no length. */
export function limitsOf(outlook: Outlook, correction: Correction, side: Side): Limits | null {
  const { layout } = outlook;
  const caps = capsOn(correction, layout.factors);
  if (!caps) return null;
  const leftMm = caps.capTotalMm - netMade(outlook, correction, side);
  // Rests below a hundredth of a millimetre come from adding, not from cutting.
  return { ...caps, leftMm: leftMm > 0.01 ? leftMm : 0, capMm: Math.min(caps.capRoundMm, leftMm) };
}

/** What earlier rounds made of a correction, less what they took back by its opposite, mm of its own basis; not below 0. */
function netMade({ layout, fitting }: Outlook, correction: Correction, side: Side): number {
  const { index } = layout;
  const sum = fitting.history
    .flatMap(({ changes }) => changes)
    .filter((change) => side === 'both' || change.side === 'both' || change.side === side)
    .reduce((total, change) => {
      const other = index.knowledge.corrections[index.corrections.get(change.correction)!]!;
      if (other.id === correction.id) return total + ownAmount(layout, change);
      const per = takenBackPerMm(correction, other);
      return total - per * ownAmount(layout, change);
    }, 0);
  return Math.max(0, sum);
}

/** Millimetres of a correction that a millimetre of another takes back: 0 unless they serve the same needs in opposite directions. */
function takenBackPerMm(correction: Correction, other: Correction): number {
  const served = ({ vector }: Correction) => vector.filter(({ coupling }) => !coupling);
  const [own, others] = [served(correction), served(other)];
  if (own.length !== others.length) return 0;
  const ratios = own.map(({ dimension, perMm }) => {
    const against = others.find((entry) => entry.dimension === dimension);
    return against ? -against.perMm / perMm : 0;
  });
  return ratios.every((ratio) => ratio > 0) ? Math.min(...ratios) : 0;
}

/** Whether somebody put a length on what is served: a fold pinned, a gap measured, a tape against the paper. */
function isMeasured({ layout: { index }, fitting }: Outlook, serves: readonly Tail[]): boolean {
  const served = (id: string) => serves.some(({ dimension }) => index.dimensions.get(id) === dimension);
  const pinned = fitting.tests.some(({ check, amountMm }) => {
    const { amountTo } = index.knowledge.checks[index.checks.get(check)!]!;
    return amountMm !== null && amountTo !== null && served(amountTo.dimension);
  });
  return pinned || fitting.measured.some(({ terms }) => terms.some(({ dimension }) => served(dimension)));
}

/**
 * The amount proposed for this round: the smaller of the first amount and two thirds of the estimate, the whole estimate
 * once somebody measured it and it is firm (take the amount from the toile, not from a table: trousers:TF053); never past a cap.
 */
export function amountsOf(outlook: Outlook, correction: Correction, serves: readonly Tail[], limits: Limits) {
  const amounts = correction.amounts!;
  const estimate = estimateOf(outlook, correction, serves);
  const [lowMm, highMm] = estimate.rangeMm;
  const firm =
    isMeasured(outlook, serves) &&
    estimate.probability >= LIKELY_FROM &&
    highMm - lowMm <= FIRM_SHARE * estimate.meanMm;
  const wantedMm = firm ? estimate.meanMm : Math.min(limits.firstMm, FIRST_SHARE * estimate.meanMm);
  const amountMm = Math.min(wantedMm, limits.capMm);
  const tooFar = estimate.probability >= POSSIBLE_FROM && estimate.meanMm > limits.leftMm;
  return {
    amountMm,
    amountText: amountText(amountMm, correction, outlook.fitting.unit),
    estimateMm: estimate.rangeMm,
    basis: amounts.basis,
    firstMm: limits.firstMm,
    capRoundMm: limits.capRoundMm,
    capTotalMm: limits.capTotalMm,
    beyond: tooFar ? beyondOf(correction) : null,
  };
}

function beyondOf({ amounts }: Correction): 'another-size' | 'another-draft' {
  return amounts!.sizeLevel === 'length' ? 'another-draft' : 'another-size';
}

/** What the served needs ask of this correction, in its own basis: the mean of their means, weighed by probability. */
function estimateOf(outlook: Outlook, { vector }: Correction, serves: readonly Tail[]) {
  const { index } = outlook.layout;
  let weight = 0;
  let meanMm = 0;
  const rangeMm: Range = [0, 0];
  for (const tail of serves) {
    const { perMm } = vector.find(({ dimension }) => index.dimensions.get(dimension) === tail.dimension)!;
    const share = Math.max(tail.probability, 1e-9);
    weight += share;
    meanMm += (share * tail.meanMm) / Math.abs(perMm);
    for (const end of [0, 1] as const) rangeMm[end] += (share * tail.rangeMm[end]) / Math.abs(perMm);
  }
  const probability = serves.reduce((most, tail) => Math.max(most, tail.probability), 0);
  return { probability, meanMm: meanMm / weight, rangeMm: rangeMm.map((end) => end / weight) as Range };
}
