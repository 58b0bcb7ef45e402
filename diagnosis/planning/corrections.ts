import type { Side } from '../case-schema';
import type { Correction } from '../garments/schema';
import { variablesFor } from '../inference/layout';
import type { CorrectionRow } from '../reading';
import { NO_AMOUNTS, amountsOf, limitsOf } from './amounts';
import { expectedMisfit } from './misfit';
import { tailAt } from './outlook';
import type { Outlook, Tail } from './outlook';
import { type Support, supportOf } from './support';
import { wordOf } from './words';

/** Amounts tried for the best admissible one, as parts of the cap. */
const AMOUNTS_TRIED = 12;
/** Cost, in tolerances of the need served, of a change that was not needed, beside the misfit it makes: for any, and per unit of risk. */
const NEEDLESS_COST = 0.04;
const RISK_COST = 0.15;
/** How much of what a coupling spoils counts where it is set right later in the order of work. */
const LATER_SHARE = 0.2;
/** How much of a need is expected to go where the change is not a length. */
const REMEDY_SHARE = 0.7;
/** Left and right are one below this difference, mm (1/4 in). */
const SIDES_APART_MM = 6;

/** A correction that was scored, with what planning needs beside the row. */
export interface Scored {
  correction: Correction;
  side: Side;
  score: number;
  /** P(the need that it serves most). */
  probability: number;
  serves: Tail[];
  row: CorrectionRow;
}

/** Scores every correction on each side it makes sense on; one whose total cap is used up has no amount left and is left out. */
export function scoreCorrections(outlook: Outlook): { scored: Scored[]; spent: Correction[] } {
  const scored: Scored[] = [];
  const spent: Correction[] = [];
  const support = supportOf(outlook);
  for (const correction of outlook.layout.index.knowledge.corrections) {
    for (const side of sidesOf(outlook, correction)) {
      const one = scoreOne(outlook, support, correction, side);
      if (one) scored.push(one);
      else spent.push(correction);
    }
  }
  scored.sort(byScore);
  return { scored, spent };
}

function byScore(a: Scored, b: Scored): number {
  if (Math.abs(a.score - b.score) > 1e-9) return b.score - a.score;
  const pieces = a.correction.pieces.length - b.correction.pieces.length;
  if (pieces !== 0) return pieces;
  return a.correction.id < b.correction.id
    ? -1
    : a.correction.id > b.correction.id
      ? 1
      : a.side < b.side
        ? -1
        : 1;
}

/** One row for both legs while their needs are one or nearly so, else one for each. */
function sidesOf(outlook: Outlook, correction: Correction): Side[] {
  const split = servedBy(outlook, correction, 'both').filter(({ side }) => side !== 'both');
  if (!correction.sided || split.length === 0) return ['both'];
  const left = split.filter(({ side }) => side === 'left');
  const leastApartMm = (SIDES_APART_MM / 2) * outlook.layout.factors.length + 1e-9;
  const apart = left.some((own) => {
    const other = split.find(({ side, dimension }) => side === 'right' && dimension === own.dimension)!;
    return Math.abs(own.probability * own.meanMm - other.probability * other.meanMm) >= leastApartMm;
  });
  return apart ? ['left', 'right'] : ['both'];
}

/** The needs that a correction is made for, in the direction in which it meets them. */
function servedBy({ layout, marginals }: Outlook, { vector }: Correction, side: Side): Tail[] {
  return vector
    .filter(({ coupling }) => !coupling)
    .flatMap(({ dimension, perMm }) =>
      variablesFor(layout, layout.index.dimensions.get(dimension)!, side).map((variable) =>
        tailAt(layout, marginals, variable, perMm > 0 ? 'more' : 'less'),
      ),
    );
}

function scoreOne(outlook: Outlook, support: Support, correction: Correction, side: Side): Scored | null {
  const serves = servedBy(outlook, correction, side);
  const most = serves.reduce<Tail | null>(
    (best, tail) => (best && best.probability >= tail.probability ? best : tail),
    null,
  );
  const probability = most?.probability ?? 0;
  const limits = limitsOf(outlook, correction, side);
  if (limits && limits.leftMm <= 0) return null;
  const gain = limits
    ? bestGain(outlook, support, correction, side, limits.capMm)
    : remedyGain(
        outlook,
        serves.filter(({ dimension, direction }) => support(dimension, direction)),
      );
  const loss = most ? outlook.layout.index.knowledge.dimensions[most.dimension]!.loss[most.direction] : 1;
  const score = gain - loss * (NEEDLESS_COST + RISK_COST * correction.risk) * (1 - probability);
  const row: CorrectionRow = {
    correction: correction.id,
    name: correction.name,
    side,
    word: wordOf(probability, outlook.marksAlone),
    score,
    ...(limits ? amountsOf(outlook, correction, serves, limits) : NO_AMOUNTS),
    because: [],
    against: [],
    cautions: correction.cautions,
  };
  return { correction, side, score, probability, serves, row };
}

/**
 * Expected misfit removed at the best amount up to a cap. A coupling is no reason to make a change, nor is a need that nothing
 * found speaks for: what that may mend does not count; what it spoils does, of a coupling less where the order of work comes to it later anyway (a hem that drops is set last).
 */
function bestGain(
  { layout, marginals }: Outlook,
  support: Support,
  { vector, stage }: Correction,
  side: Side,
  capMm: number,
): number {
  const moves = vector.flatMap(({ dimension, perMm, coupling }) => {
    const at = layout.index.dimensions.get(dimension)!;
    const later = layout.index.knowledge.dimensions[at]!.stage > stage;
    const isMeant = support(at, perMm > 0 ? 'more' : 'less');
    return variablesFor(layout, at, side).map((variable) => {
      const belief = marginals[variable]!;
      const before = expectedMisfit(layout, at, belief, 0);
      return (amountMm: number) => {
        const gain = before - expectedMisfit(layout, at, belief, (-perMm * amountMm) / layout.scaleMm[at]!);
        if (coupling) return Math.min(0, gain) * (later ? LATER_SHARE : 1);
        return isMeant ? gain : Math.min(0, gain);
      };
    });
  });
  let best = -Infinity;
  for (let part = 1; part <= AMOUNTS_TRIED; part++) {
    const amountMm = (capMm * part) / AMOUNTS_TRIED;
    best = Math.max(
      best,
      moves.reduce((sum, gainOf) => sum + gainOf(amountMm), 0),
    );
  }
  return best;
}

function remedyGain({ layout }: Outlook, serves: readonly Tail[]): number {
  return serves.reduce((sum, { dimension, direction, probability, meanMm }) => {
    const toleranceMm = layout.toleranceMm[dimension]!;
    const { loss } = layout.index.knowledge.dimensions[dimension]!;
    return sum + (REMEDY_SHARE * probability * loss[direction] * (meanMm - toleranceMm)) / toleranceMm;
  }, 0);
}
