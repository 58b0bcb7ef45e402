import type { Case, RoundEvidence, Side } from '../case-schema';
import type { Link } from '../garments/schema';
import { solveRound } from '../inference/beliefs';
import type { Fitting } from '../inference/beliefs';
import { termsKey } from '../inference/measured';
import type { Reason } from '../reading';

/** Pieces of evidence that are left out one at a time; more would keep the reading waiting. */
const LEFT_OUT_MAX = 20;
/** A reason that changes the log-odds by less is not worth a line. */
const LOG_ODDS_MIN = 0.05;
const REASONS_MAX = 6;
const SEVERITY_WORDS = ['not there', 'faint', 'clear', 'pulling'] as const;

/** One piece of evidence, and the beliefs without it. */
export interface WithoutOne {
  kind: Reason['kind'];
  id: string;
  side: Side;
  text: string;
  /** Sources of what links the evidence to an id. */
  sourcesTo: (id: string) => string[];
  marginals: readonly Float64Array[];
}

/** The beliefs without each piece of evidence of the current round, and without all earlier rounds. */
export function leaveEachOut(ready: Fitting, fitting: Case): WithoutOne[] {
  const pieces = piecesOf(ready, fitting).slice(0, LEFT_OUT_MAX);
  const result: WithoutOne[] = pieces.map(({ without, ...piece }) => ({
    ...piece,
    marginals: solveRound(ready.layout, ready.tables, ready.start, without).marginals,
  }));
  if (fitting.history.length > 0)
    result.push({
      kind: 'history',
      id: 'history',
      side: 'both',
      text: `What the ${fitting.history.length === 1 ? 'round' : `${fitting.history.length} rounds`} before showed`,
      sourcesTo: () => [],
      marginals: solveRound(ready.layout, ready.tables, ready.prior, fitting).marginals,
    });
  return result;
}

type Piece = Omit<WithoutOne, 'marginals'> & { without: RoundEvidence; rank: number };

function piecesOf({ layout }: Fitting, fitting: Case): Piece[] {
  const { index } = layout;
  const linkSources = (links: readonly Link[]) => (id: string) => [
    ...new Set(links.filter(({ to }) => to === id).flatMap(({ sources }) => sources)),
  ];
  const seen = fitting.signs.map((entry, i): Piece => {
    const sign = index.knowledge.signs[index.signs.get(entry.sign)!]!;
    return {
      kind: entry.severity === 0 ? 'absent' : 'sign',
      id: entry.sign,
      side: entry.side,
      text: `${sign.name}: ${SEVERITY_WORDS[entry.severity]!}`,
      sourcesTo: linkSources(sign.links),
      without: { ...fitting, signs: fitting.signs.filter((_, j) => j !== i) },
      rank: entry.severity,
    };
  });
  const absent = fitting.absent.map((entry, i): Piece => {
    const sign = index.knowledge.signs[index.signs.get(entry.sign)!]!;
    return {
      kind: 'absent',
      id: entry.sign,
      side: entry.side,
      text: `${sign.name}: looked, not there`,
      sourcesTo: linkSources(sign.links),
      without: { ...fitting, absent: fitting.absent.filter((_, j) => j !== i) },
      rank: 0,
    };
  });
  const tests = fitting.tests.map((entry, i): Piece => {
    const check = index.knowledge.checks[index.checks.get(entry.check)!]!;
    const outcome = check.outcomes.find(({ id }) => id === entry.outcome)!;
    return {
      kind: 'test',
      id: entry.check,
      side: entry.side,
      text: `${check.name}: ${outcome.name}`,
      sourcesTo: () => check.sources,
      without: { ...fitting, tests: fitting.tests.filter((_, j) => j !== i) },
      rank: 5,
    };
  });
  const measured = fitting.measured.map((entry, i): Piece => {
    const names = entry.terms.map(
      ({ dimension }) => index.knowledge.dimensions[index.dimensions.get(dimension)!]!.name,
    );
    return {
      kind: 'measured',
      id: termsKey(entry),
      side: entry.terms[0]!.side,
      text: `Measured: ${names.join(' + ')}`,
      sourcesTo: () => [],
      without: { ...fitting, measured: fitting.measured.filter((_, j) => j !== i) },
      rank: 4,
    };
  });
  return [...tests, ...measured, ...seen, ...absent].sort(
    (a, b) => b.rank - a.rank || (a.id < b.id ? -1 : 1),
  );
}

/** Reasons for and against something whose probability each set of beliefs gives, the strongest first. */
export function reasonsFor(
  pieces: readonly WithoutOne[],
  marginals: readonly Float64Array[],
  probability: (marginals: readonly Float64Array[]) => number,
  ids: readonly string[],
): { because: Reason[]; against: Reason[] } {
  const now = logOdds(probability(marginals));
  const reasons = pieces
    .map(({ kind, id, side, text, sourcesTo, marginals: without }): Reason => {
      const sources = [...new Set(ids.flatMap(sourcesTo))];
      return { kind, id, side, text, sources, logOdds: now - logOdds(probability(without)) };
    })
    .filter((reason) => Math.abs(reason.logOdds) >= LOG_ODDS_MIN)
    .sort((a, b) => Math.abs(b.logOdds) - Math.abs(a.logOdds));
  return {
    because: reasons.filter((reason) => reason.logOdds > 0).slice(0, REASONS_MAX),
    against: reasons.filter((reason) => reason.logOdds < 0).slice(0, REASONS_MAX),
  };
}

function logOdds(probability: number): number {
  const kept = Math.min(1 - 1e-12, Math.max(1e-12, probability));
  return Math.log(kept / (1 - kept));
}
