import type { Case } from '../case-schema';
import { startReading } from '../diagnose';
import type { Knowledge, Sign } from '../garments/schema';
import { prepare, solveRound } from '../inference/beliefs';
import { STRENGTHS } from '../inference/strengths';
import { outlookOf } from '../planning/outlook';
import { scoreCorrections } from '../planning/corrections';
import { emptyCase } from './calibration';
import type { Random } from './random';

export interface SpeedRow {
  drawing: string;
  positives: number;
  /** Beliefs and corrections, ms. */
  readMs: { median: number; worst: number };
  /** The first part of a reading, checks ranked on their marginals included, ms. */
  firstMs: { median: number; worst: number };
  /** Reasons and the exact re-score of the best checks, afterwards, ms. */
  finishMs: { median: number; worst: number };
}

/** Times readings of drawn signs, each after a warm-up; `clock` gives milliseconds. */
export function timeReadings(
  knowledge: Knowledge,
  clock: () => number,
  random: Random,
  drawings: number,
  { name, positives, from }: { name: string; positives: number; from: (random: Random) => readonly Sign[] },
): SpeedRow {
  const cases = Array.from({ length: drawings }, () => {
    const signs = random.sample(from(random), positives);
    return withSigns(knowledge, signs, random);
  });
  for (const fitting of cases.slice(0, 20)) startReading(knowledge, fitting).finish();
  const read = cases.map((fitting) => timed(clock, () => readOnly(knowledge, fitting)));
  const first = cases.map((fitting) => timed(clock, () => startReading(knowledge, fitting)));
  const finish = cases.slice(0, Math.max(20, drawings / 10)).map((fitting) => {
    const started = startReading(knowledge, fitting);
    return timed(clock, () => started.finish());
  });
  return {
    drawing: name,
    positives,
    readMs: spread(read),
    firstMs: spread(first),
    finishMs: spread(finish),
  };
}

function withSigns(knowledge: Knowledge, signs: readonly Sign[], random: Random): Case {
  return {
    ...emptyCase(knowledge),
    signs: signs.map(({ id }) => ({ sign: id, severity: 1 + random.below(3), side: 'both', reliability: 1 })),
  };
}

function readOnly(knowledge: Knowledge, fitting: Case): void {
  const ready = prepare(knowledge, fitting, STRENGTHS);
  const { marginals } = solveRound(ready.layout, ready.tables, ready.start, fitting);
  scoreCorrections(outlookOf(ready.layout, fitting, marginals));
}

function timed(clock: () => number, work: () => unknown): number {
  const before = clock();
  work();
  return clock() - before;
}

function spread(values: readonly number[]): { median: number; worst: number } {
  const ascending = [...values].sort((a, b) => a - b);
  return { median: ascending[Math.floor(ascending.length / 2)]!, worst: ascending.at(-1)! };
}
