import type { Check } from '../garments/schema';
import type { Case } from '../case-schema';
import { solveRound } from '../inference/beliefs';
import type { Fitting } from '../inference/beliefs';
import type { Solution } from '../inference/solve';
import type { CheckRow } from '../reading';
import { gainOnMarginals } from './check-gain';
import { decisionBits } from './entropy';

/** What a check costs, in looks. */
const EFFORT_COST = { look: 1, lift: 1.5, pinned: 3, release: 6 } as const;
const SECOND_PERSON_COST = 1.5;
/** Checks that are scored once more exactly. */
export const RESCORED = 5;
/** Below this nothing is learnt, bits. */
const GAIN_MIN_BITS = 0.005;

export interface RankedCheck {
  check: Check;
  row: CheckRow;
}

/** Checks not yet done in this round, by expected information on the marginals per effort. */
export function rankChecks(
  { layout, tables }: Fitting,
  fitting: Case,
  marginals: readonly Float64Array[],
): RankedCheck[] {
  const done = new Set(fitting.tests.map(({ check }) => check));
  const ranked = layout.index.knowledge.checks
    .filter(({ id }) => !done.has(id))
    .map((check) => rankedOf(check, gainOnMarginals(layout, tables, marginals, check)))
    .filter(({ row }) => row.gainBits >= GAIN_MIN_BITS);
  return ranked.sort(byWorth);
}

function rankedOf(check: Check, gainBits: number): RankedCheck {
  return { check, row: { check: check.id, question: check.question, gainBits, effort: check.effort } };
}

function byWorth(a: RankedCheck, b: RankedCheck): number {
  const difference = worthOf(b) - worthOf(a);
  return Math.abs(difference) > 1e-9 ? difference : a.check.id < b.check.id ? -1 : 1;
}

function worthOf({ check, row }: RankedCheck): number {
  return row.gainBits / (EFFORT_COST[check.effort] * (check.secondPerson ? SECOND_PERSON_COST : 1));
}

/** What each outcome of a check would leave: its chance and the beliefs after it. */
export interface Prospect {
  chance: number;
  solution: Solution;
}

/** Every outcome of a check worked through exactly. */
export function prospectsOf(ready: Fitting, fitting: Case, check: Check): Prospect[] {
  const solutions = check.outcomes.map(({ id }) => {
    const test = {
      check: check.id,
      outcome: id,
      side: 'both' as const,
      amountMm: null,
      basis: null,
      places: 1,
    };
    return solveRound(ready.layout, ready.tables, ready.start, {
      ...fitting,
      tests: [...fitting.tests, test],
    });
  });
  const most = Math.max(...solutions.map(({ logWeight }) => logWeight));
  const weights = solutions.map(({ logWeight }) => Math.exp(logWeight - most));
  const total = weights.reduce((a, b) => a + b, 0);
  return solutions.map((solution, i) => ({ chance: weights[i]! / total, solution }));
}

/**
 * The best few checks scored again exactly, put in order before the rest. None are asked when no outcome of any of them
 * would change what is to be done.
 */
export function rescoreChecks(
  ready: Fitting,
  fitting: Case,
  solution: Solution,
  ranked: readonly RankedCheck[],
  planKey: (solution: Solution) => string,
): RankedCheck[] {
  const before = decisionBits(ready.layout, solution.marginals);
  const now = planKey(solution);
  const best = ranked.slice(0, RESCORED).flatMap(({ check }) => {
    const prospects = prospectsOf(ready, fitting, check);
    if (prospects.every((prospect) => planKey(prospect.solution) === now)) return [];
    const after = prospects.reduce(
      (sum, prospect) => sum + prospect.chance * decisionBits(ready.layout, prospect.solution.marginals),
      0,
    );
    const gainBits = before - after;
    return gainBits >= GAIN_MIN_BITS ? [rankedOf(check, gainBits)] : [];
  });
  if (best.length === 0) return [];
  return [...best.sort(byWorth), ...ranked.slice(RESCORED)];
}
