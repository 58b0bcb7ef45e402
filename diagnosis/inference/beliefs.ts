import type { Case, PastRound, RoundEvidence, Side } from '../case-schema';
import { addTest } from './checks';
import { Draft } from './draft';
import type { Beliefs } from './draft';
import { GRID_SIZE, zAt } from './grid';
import { believedAfter, type Hindsight, hindsightOf } from './hindsight';
import { layoutOf, variablesFor } from './layout';
import type { Layout } from './layout';
import { addMeasured, termsKey } from './measured';
import { priorBeliefs, sidesPrior } from './prior';
import { advance } from './replay';
import { addSign, notesOf } from './signs';
import type { AbsenceWeight } from './signs';
import { CURRENT_ROUND, PAST_ROUND, solve } from './solve';
import type { Solution } from './solve';
import { tablesOf } from './sources';
import type { Tables } from './sources';
import type { Strengths } from './strengths';
import type { Knowledge } from '../garments/schema';

/** How much of "looked, not there" is lost where something that hides the sign is certain. */
const MASKED_SHARE = 0.7;

/** A bin that lies on the tolerance is within it, whatever the last digit of a scaled tolerance. */
const ON_EDGE = 1e-9;

/** A case made ready: its variables, its prior, and the beliefs that the current round starts from. */
export interface Fitting {
  layout: Layout;
  tables: Tables;
  prior: Beliefs;
  start: Beliefs;
  /** False when some earlier round had to be approximated. */
  exactBefore: boolean;
}

/** Replays the history of a case up to the current round. */
export function prepare(knowledge: Knowledge, fitting: Case, strengths: Strengths): Fitting {
  const layout = layoutOf(knowledge, fitting);
  const tables = tablesOf(strengths);
  const prior = startBeliefs(layout, fitting, strengths);
  let start = prior;
  let exactBefore = true;
  fitting.history.forEach((round, i) => {
    const next = fitting.history[i + 1] ?? fitting;
    const { beliefs, exact } = lookBack(layout, tables, start, round, next);
    exactBefore &&= exact;
    start = advance(layout, beliefs, prior, round);
  });
  return { layout, tables, prior, start, exactBefore };
}

/** A past round, read with what came after it. */
function lookBack(
  layout: Layout,
  tables: Tables,
  start: Beliefs,
  round: PastRound,
  next: RoundEvidence,
): { beliefs: Beliefs; exact: boolean } {
  const then = solveRound(layout, tables, start, round, PAST_ROUND);
  const hindsight = hindsightOf(layout, round, next);
  if (!hindsight) return then;
  const now = solveRound(layout, tables, start, round, PAST_ROUND, hindsight);
  return {
    beliefs: believedAfter(then.beliefs, now.beliefs, hindsight),
    exact: then.exact && now.exact,
  };
}

function startBeliefs(layout: Layout, fitting: Case, strengths: Strengths): Beliefs {
  const marginals = priorBeliefs(layout, fitting, strengths);
  const pairs = layout.ofDimension
    .filter((variables) => variables.length === 2)
    .map(([first, second]) => {
      const table = sidesPrior(marginals[first!]!, marginals[second!]!);
      return { first: first!, second: second!, table };
    });
  for (const { first, second, table } of pairs) {
    marginals[first] = marginOf(table, true);
    marginals[second] = marginOf(table, false);
  }
  return { marginals, pairs };
}

function marginOf(table: Float64Array, ofRows: boolean): Float64Array {
  const margin = new Float64Array(GRID_SIZE);
  table.forEach((weight, i) => (margin[ofRows ? Math.floor(i / GRID_SIZE) : i % GRID_SIZE]! += weight));
  return margin;
}

/**
 * Beliefs after a round's evidence. Absent signs that something may hide are weighed twice: first by the beliefs before
 * the round, then by those of the first pass.
 */
export function solveRound(
  layout: Layout,
  tables: Tables,
  start: Beliefs,
  round: RoundEvidence,
  care = CURRENT_ROUND,
  hindsight: Hindsight | null = null,
): Solution {
  const notes = notesOf(layout, round.signs, round.absent);
  const gather = (weigh: AbsenceWeight) => {
    const draft = new Draft(start);
    for (const note of notes) addSign(draft, layout, tables, note, weigh, hindsight);
    for (const test of sortedBy(round.tests, ({ check, side }) => `${check} ${side}`))
      addTest(draft, layout, tables, test, hindsight);
    for (const measured of sortedBy(round.measured, termsKey)) addMeasured(draft, layout, measured);
    return solve(draft, care);
  };
  const first = gather((sign, side) => absenceWeight(layout, start.marginals, sign, side));
  const masked = notes.some(
    ({ sign, both, left, right }) =>
      layout.index.knowledge.signs[sign]!.maskedBy.length > 0 &&
      [both, left, right].some((noted) => noted?.severity === 0),
  );
  if (!masked) return first;
  return gather((sign, side) => absenceWeight(layout, first.marginals, sign, side));
}

/** The order of evidence never matters, not even in the last digit. */
function sortedBy<T>(items: readonly T[], key: (item: T) => string): T[] {
  return items
    .map((item) => [key(item), item] as const)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([, item]) => item);
}

function absenceWeight(layout: Layout, marginals: readonly Float64Array[], sign: number, side: Side): number {
  const { index } = layout;
  let hidden = 0;
  for (const { to, direction } of index.knowledge.signs[sign]!.maskedBy) {
    const cause = index.causes.get(to);
    if (cause !== undefined) hidden = Math.max(hidden, marginals[layout.ofCause[cause]!]![1]!);
    else {
      const dimension = index.dimensions.get(to)!;
      for (const variable of variablesFor(layout, dimension, side)) {
        const tails = tailsOf(layout, dimension, marginals[variable]!);
        hidden = Math.max(hidden, direction === 'less' ? tails.less : tails.more);
      }
    }
  }
  return 1 - MASKED_SHARE * hidden;
}

/** P(need beyond its tolerance) on either side. */
export function tailsOf(
  layout: Layout,
  dimension: number,
  belief: Float64Array,
): { more: number; less: number } {
  const edge = layout.toleranceMm[dimension]! / layout.scaleMm[dimension]! + ON_EDGE;
  let more = 0;
  let less = 0;
  for (let bin = 0; bin < GRID_SIZE; bin++) {
    const z = zAt(bin);
    if (z > edge) more += belief[bin]!;
    else if (z < -edge) less += belief[bin]!;
  }
  return { more, less };
}
