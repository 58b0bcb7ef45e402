import type { LeftOut, Muslin, PlannedChange } from '../reading';
import type { Scored } from './corrections';
import { tailsIn } from './outlook';
import type { Outlook } from './outlook';
import { POSSIBLE_FROM } from './words';

const CHANGES_MAX = 3;
/** A change less probable than this waits for a check, unless nothing else is planned. */
const PLANNED_FROM = 0.25;
const FIRST_GUESS_FROM = 0.15;
/** What is left out is named down to this probability. */
const NAMED_FROM = 0.2;
const TIGHT_STAGE = 1;
const MUSLINS: readonly Muslin[] = ['re-baste', 'patch', 'new-cloth'];

export interface Plan {
  plan: PlannedChange[];
  muslin: Muslin;
  leftOut: LeftOut[];
}

/**
 * The best set of at most three changes that can be told apart afterwards: taken by score, one of each seam, never two
 * that hide each other's effect, and nothing taken out or shortened while something tight is still to be let out.
 * `settleFirst` are corrections that a likely cause has to be settled before, with that cause's name.
 */
export function planOf(
  outlook: Outlook,
  scored: readonly Scored[],
  settleFirst: (one: Scored) => string | undefined,
): Plan {
  if (!outlook.evidence) return { plan: [], muslin: 're-baste', leftOut: [] };
  const wanted = scored.filter(({ score }) => score > 0);
  const chosen: Scored[] = [];
  const leftOut: LeftOut[] = [];
  const tight = tightestOf(outlook);
  const leave = ({ correction, probability }: Scored, why: string) => {
    if (
      probability >= NAMED_FROM &&
      !leftOut.some(({ id }) => id === correction.id) &&
      !isIn(chosen, correction.id)
    )
      leftOut.push({ id: correction.id, why });
  };
  for (const one of wanted) {
    const why = reasonAgainst(one, chosen, tight, settleFirst);
    if (why) leave(one, why);
    else chosen.push(one);
  }
  chosen.sort((a, b) => a.correction.stage - b.correction.stage);
  return {
    plan: chosen.map(({ correction, side, row }) => ({
      correction: correction.id,
      side,
      amountMm: row.amountMm,
      basis: row.basis,
    })),
    muslin: muslinFor(chosen),
    leftOut,
  };
}

function isIn(chosen: readonly Scored[], id: string): boolean {
  return chosen.some(({ correction }) => correction.id === id);
}

function reasonAgainst(
  one: Scored,
  chosen: readonly Scored[],
  tight: string | undefined,
  settleFirst: (one: Scored) => string | undefined,
): string | undefined {
  const { probability } = one;
  const cause = settleFirst(one);
  if (cause) return `First settle this: ${cause}. It can look the same, and paper would not help it.`;
  if (probability < (chosen.length === 0 ? FIRST_GUESS_FROM : PLANNED_FROM))
    return 'Too little speaks for it yet.';
  if (tight && takesAway(one))
    return `While ${tight} is still tight, nobody can see whether anything is spare here. Let out first.`;
  const served = chosen.find((other) => servesSame(one, other));
  if (served) return `“${served.correction.name}” is tried first; it serves the same place.`;
  const rival = chosen.find((other) => cannotTellApart(one, other));
  if (rival) return `Its effect could not be told from “${rival.correction.name}” in one try-on.`;
  if (chosen.length >= CHANGES_MAX) return 'Three changes are enough for one try-on.';
  return undefined;
}

/** The name of the tight width most likely to be let out, while there is one. */
function tightestOf(outlook: Outlook): string | undefined {
  const { dimensions } = outlook.layout.index.knowledge;
  const tight = tailsIn(outlook)
    .filter(
      ({ dimension, direction, probability }) =>
        direction === 'more' && probability >= POSSIBLE_FROM && dimensions[dimension]!.stage === TIGHT_STAGE,
    )
    .sort((a, b) => b.probability - a.probability)[0];
  return tight && dimensions[tight.dimension]!.name.toLowerCase();
}

function takesAway({ serves }: Scored): boolean {
  return serves.length > 0 && serves.every(({ direction }) => direction === 'less');
}

function servesSame(a: Scored, b: Scored): boolean {
  return a.serves.some(({ variable }) => b.serves.some((other) => other.variable === variable));
}

function cannotTellApart(a: Scored, b: Scored): boolean {
  const [first, second] = [a.correction, b.correction];
  if (first.id === second.id) return false;
  if (first.neverWith.includes(second.id) || second.neverWith.includes(first.id)) return true;
  return first.seam === second.seam && ['front-crotch', 'back-crotch', 'girth'].includes(first.seam);
}

function muslinFor(chosen: readonly Scored[]): Muslin {
  const most = chosen.reduce((at, { correction }) => Math.max(at, MUSLINS.indexOf(correction.muslin)), 0);
  return MUSLINS[most]!;
}
