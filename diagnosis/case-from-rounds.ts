import type { Body, CaseInput } from './case-schema';
import type { Basis } from './garments/schema';

type Side = 'left' | 'right' | 'both';

/** What was found in one round, as a journal keeps it. A fact of the owner and one of a fitter may stand side by side. */
export interface RoundFacts {
  number: number;
  begun: 'new-cloth' | 're-baste' | 'patch';
  cut: 'full' | 'shorts';
  clothKind: 'woven' | 'stretch-woven' | 'knit';
  stretchPercent: number;
  signs: { sign: string; side: Side; severity: number; isOwner: boolean }[];
  checks: {
    check: string;
    side: Side;
    outcome: string;
    amountMm: number | null;
    basis: Basis | null;
    places: number | null;
    isOwner: boolean;
  }[];
  causes: { cause: string; isPresent: boolean; isOwner: boolean }[];
  measured: { terms: { dimension: string; weight: number; side: Side }[]; needMm: number; sdMm: number }[];
  changes: {
    correction: string;
    side: Side;
    basis: Basis | null;
    madeMm: number | null;
    madeAt: string | Date | null;
  }[];
}

export interface WearerFacts {
  fittedFor: 'standing' | 'both' | 'seated';
  shape: string[];
  body: Partial<Record<'waist' | 'hip' | 'thigh' | 'knee' | 'calf', number>>;
}

/** One observation a key: where owner and fitter both say something, the fitter's state counts. */
function oneEach<T extends { isOwner: boolean }>(facts: T[], keyOf: (fact: T) => string): T[] {
  const kept = new Map<string, T>();
  for (const fact of facts) {
    const key = keyOf(fact);
    const had = kept.get(key);
    if (!had || (had.isOwner && !fact.isOwner)) kept.set(key, fact);
  }
  return [...kept.values()];
}

type Evidence = Pick<CaseInput, 'signs' | 'absent' | 'measured' | 'tests'>;

function evidenceOf(round: RoundFacts): Required<Evidence> {
  const signs = oneEach(round.signs, ({ sign, side }) => `${sign} ${side}`);
  const checks = oneEach(round.checks, ({ check, side }) => `${check} ${side}`);
  return {
    signs: signs
      .filter(({ severity }) => severity > 0)
      .map(({ sign, side, severity }) => ({ sign, side, severity })),
    absent: signs.filter(({ severity }) => severity === 0).map(({ sign, side }) => ({ sign, side })),
    measured: round.measured.map(({ terms, needMm, sdMm }) => ({ terms, needMm, sdMm })),
    tests: checks.map(({ check, side, outcome, amountMm, basis, places }) => ({
      check,
      side,
      outcome,
      ...(amountMm === null ? {} : { amountMm, places: places ?? 1, ...(basis === null ? {} : { basis }) }),
    })),
  };
}

/** A length that was never said to be made is no change: the sign that stays must not count against it. */
const changesOf = (round: RoundFacts) =>
  round.changes
    .filter(({ madeAt }) => madeAt !== null)
    .map(({ correction, side, basis, madeMm }) => ({
      correction,
      side,
      ...(madeMm === null ? {} : { amountMm: madeMm, ...(basis === null ? {} : { basis }) }),
    }));

/** The girths that size a body, as a case names them; what was not measured is left out. */
export function bodyOf({ hip, waist, thigh, knee, calf }: WearerFacts['body']): Partial<Body> {
  return {
    ...(hip === undefined ? {} : { hipMm: hip }),
    ...(waist === undefined ? {} : { waistMm: waist }),
    ...(thigh === undefined ? {} : { thighMm: thigh }),
    ...(knee === undefined ? {} : { kneeMm: knee }),
    ...(calf === undefined ? {} : { calfMm: calf }),
  };
}

const HISTORY_MAX = 24;

/**
 * The case of a round: its own evidence, and the rounds before it with what was really changed after each.
 * @param rounds oldest first, the round to be read last; lengths in mm
 * @throws RangeError when there is no round to read
 */
export function caseFromRounds(garment: string, wearer: WearerFacts, rounds: RoundFacts[]): CaseInput {
  const now = rounds.at(-1);
  if (!now) throw new RangeError('a case needs the round that is read');
  const causes = oneEach(now.causes, ({ cause }) => cause);
  const past = rounds.slice(0, -1).slice(-HISTORY_MAX);
  return {
    garment,
    body: bodyOf(wearer.body),
    fittedFor: wearer.fittedFor,
    muslin: now.cut,
    cloth: { kind: now.clothKind, stretchPercent: now.stretchPercent },
    shape: wearer.shape,
    causes: {
      present: causes.filter(({ isPresent }) => isPresent).map(({ cause }) => cause),
      absent: causes.filter(({ isPresent }) => !isPresent).map(({ cause }) => cause),
    },
    ...evidenceOf(now),
    history: past.map((round, i) => ({
      ...evidenceOf(round),
      changes: changesOf(round),
      next: (past[i + 1] ?? now).begun,
    })),
  };
}
