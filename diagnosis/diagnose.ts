import type { Case } from './case-schema';
import type { Knowledge } from './garments/schema';
import { prepare, solveRound, tailsOf } from './inference/beliefs';
import type { Fitting } from './inference/beliefs';
import type { Solution } from './inference/solve';
import { STRENGTHS } from './inference/strengths';
import type { Strengths } from './inference/strengths';
import { CAUSE_FIRST_FROM, causeRows, settleBefore } from './planning/causes';
import { rankChecks, rescoreChecks } from './planning/checks';
import { scoreCorrections } from './planning/corrections';
import type { Scored } from './planning/corrections';
import { doubtOf } from './planning/doubt';
import { needRows } from './planning/needs';
import { outlookOf } from './planning/outlook';
import { planOf } from './planning/plan';
import { leaveEachOut, reasonsFor } from './planning/reasons';
import type { CauseRow, RankedItem, Reading } from './reading';
import { engineVersion } from './version';

/** A reading in two parts: what can be shown at once, and the rest when there is time. */
export interface StartedReading {
  /** Needs, causes, corrections, plan, checks ranked on their marginals; no reasons yet. */
  first: Reading;
  /** The whole reading: reasons by leaving each piece of evidence out, the best checks scored again exactly. */
  finish: () => Reading;
}

/** Reads a parsed case. Pure: the same knowledge, case and strengths give the same reading, whatever the order of evidence. */
export function diagnose(knowledge: Knowledge, fitting: Case, strengths: Strengths = STRENGTHS): Reading {
  return startReading(knowledge, fitting, strengths).finish();
}

/** Starts a reading, so that its first part can be shown before the rest is worked out. */
export function startReading(
  knowledge: Knowledge,
  fitting: Case,
  strengths: Strengths = STRENGTHS,
): StartedReading {
  const ready = prepare(knowledge, fitting, strengths);
  const solution = solveRound(ready.layout, ready.tables, ready.start, fitting);
  const decision = decide(ready, fitting, solution);
  const ranked = rankChecks(ready, fitting, solution.marginals);
  const first: Reading = {
    ...decision.part,
    checks: ranked.map(({ row }) => row),
    exact: solution.exact && ready.exactBefore,
    engine: engineVersion(knowledge),
  };
  const finish = () => {
    const planKey = (other: Solution) => keyOf(decide(ready, fitting, other).part);
    const checks = rescoreChecks(ready, fitting, solution, ranked, planKey).map(({ row }) => row);
    return { ...first, checks, ...withReasons(ready, fitting, solution, first.causes, decision.scored) };
  };
  return { first, finish };
}

/** The ranking alone, for trying many strengths on many cases. */
export function rankCase(knowledge: Knowledge, fitting: Case, strengths: Strengths): RankedItem[] {
  const ready = prepare(knowledge, fitting, strengths);
  const { marginals } = solveRound(ready.layout, ready.tables, ready.start, fitting);
  const outlook = outlookOf(ready.layout, fitting, marginals);
  return rankedItems(causeRows(outlook), scoreCorrections(outlook).scored);
}

type Part = Omit<Reading, 'checks' | 'exact' | 'engine'>;

/** Everything that follows from the beliefs alone. */
function decide(ready: Fitting, fitting: Case, { marginals }: Solution): { part: Part; scored: Scored[] } {
  const { layout, tables } = ready;
  const outlook = outlookOf(ready.layout, fitting, marginals);
  const { scored, spent } = scoreCorrections(outlook);
  const causes = causeRows(outlook);
  const { plan, muslin, leftOut } = planOf(outlook, scored, settleBefore(outlook, causes));
  const needs = needRows(outlook);
  const probabilities = [
    ...needs.map(({ probability }) => probability),
    ...causes.map(({ probability }) => probability),
  ];
  const part: Part = {
    needs,
    causes,
    corrections: scored.map(({ row }) => row),
    ranked: rankedItems(causes, scored),
    plan,
    muslin,
    leftOut: [
      ...leftOut,
      ...spent.map(({ id }) => ({
        id,
        why: 'Its stop mark is reached: the next step is another size, or another draft.',
      })),
    ],
    doubt: doubtOf(layout, tables, fitting, marginals, probabilities, outlook),
  };
  return { part, scored };
}

function rankedItems(causes: readonly CauseRow[], scored: readonly Scored[]): RankedItem[] {
  return [
    ...causes
      .filter(({ probability }) => probability > CAUSE_FIRST_FROM)
      .map(({ cause }): RankedItem => ({ kind: 'cause', id: cause, side: 'both' })),
    ...scored
      .filter(({ score }) => score > 0)
      .map(({ correction, side }): RankedItem => ({ kind: 'correction', id: correction.id, side })),
  ];
}

/** What is to be done, as a key: a check is worth asking only while an outcome would change it. */
function keyOf({ plan, ranked }: Part): string {
  const causes = ranked.filter(({ kind }) => kind === 'cause');
  return [...causes.map(({ id }) => id), ...plan.map(({ correction, side }) => `${correction} ${side}`)].join(
    '; ',
  );
}

function withReasons(
  ready: Fitting,
  fitting: Case,
  { marginals }: Solution,
  causes: readonly CauseRow[],
  scored: readonly Scored[],
): Pick<Reading, 'causes' | 'corrections'> {
  const { layout } = ready;
  const pieces = leaveEachOut(ready, fitting);
  return {
    causes: causes.map((row) => {
      const variable = layout.ofCause[layout.index.causes.get(row.cause)!]!;
      return { ...row, ...reasonsFor(pieces, marginals, (beliefs) => beliefs[variable]![1]!, [row.cause]) };
    }),
    corrections: scored.map(({ row, serves }) => {
      const most = serves.reduce(
        (best, tail) => (tail.probability > best.probability ? tail : best),
        serves[0]!,
      );
      const probability = (beliefs: readonly Float64Array[]) =>
        tailsOf(layout, most.dimension, beliefs[most.variable]!)[most.direction];
      const ids = [layout.index.knowledge.dimensions[most.dimension]!.id];
      return { ...row, ...reasonsFor(pieces, marginals, probability, ids) };
    }),
  };
}
