import { rankCase } from '../diagnose';
import type { Knowledge } from '../garments/schema';
import { GRADES } from '../garments/schema';
import type { Strengths } from '../inference/strengths';
import { parsedCase, placeOf } from './published';
import type { PublishedCase } from './published';

/**
 * A number of the strengths that is fitted, and how to set it. Knowledge (which link, which grade) is never fitted, nor are
 * thresholds and softness: a scale is by its definition the amount at which a fault is clearly seen, and ranks cannot tell.
 */
interface Knob {
  get: (strengths: Strengths) => number;
  set: (strengths: Strengths, value: number) => Strengths;
  low: number;
  high: number;
}

const STEPS = [1.3, 1 / 1.3, 1.1, 1 / 1.1];

const KNOBS: readonly Knob[] = [
  ...GRADES.map((grade): Knob => ({
    get: (strengths) => strengths.grade[grade],
    set: (strengths, value) => ({ ...strengths, grade: { ...strengths.grade, [grade]: value } }),
    low: 0.02,
    high: 0.97,
  })),
  {
    get: (strengths) => strengths.leak.usual[0],
    set: (strengths, value) => {
      const by = value / strengths.leak.usual[0];
      const scaled = (row: readonly number[]) => row.map((leak) => leak * by) as [number, number, number];
      const { low, usual, high } = strengths.leak;
      return { ...strengths, leak: { low: scaled(low), usual: scaled(usual), high: scaled(high) } };
    },
    low: 0.01,
    high: 0.12,
  },
];

/** Mean reciprocal place of the accepted answers: 1 when each is first. */
export function meanReciprocalPlace(
  knowledge: Knowledge,
  cases: readonly PublishedCase[],
  strengths: Strengths,
): number {
  const sum = cases.reduce((total, published) => {
    const ranked = rankCase(knowledge, parsedCase(knowledge, published), strengths);
    return total + 1 / placeOf(ranked, published.accept);
  }, 0);
  return sum / cases.length;
}

/**
 * Fits the few common numbers by coordinate steps until none helps: grades in their order, then leaks.
 * Steps that leave the order of the grades, or a knob's range, are not tried.
 */
export function fitStrengths(
  knowledge: Knowledge,
  cases: readonly PublishedCase[],
  start: Strengths,
  passes = 2,
): Strengths {
  let best = start;
  let most = meanReciprocalPlace(knowledge, cases, best);
  for (let pass = 0; pass < passes; pass++) {
    const before = most;
    for (const knob of KNOBS)
      for (const step of STEPS) {
        const value = knob.get(best) * step;
        if (value < knob.low || value > knob.high) continue;
        const tried = knob.set(best, value);
        if (!inOrder(tried)) continue;
        const score = meanReciprocalPlace(knowledge, cases, tried);
        if (score > most + 1e-9) [best, most] = [tried, score];
      }
    if (most <= before + 1e-9) break;
  }
  return best;
}

function inOrder({ grade }: Strengths): boolean {
  return GRADES.every((name, i) => i === 0 || grade[GRADES[i - 1]!] > grade[name]);
}

/** Share of cases with an accepted id first when the strengths were fitted without any case of its source. */
export function leaveSourcesOut(
  knowledge: Knowledge,
  cases: readonly PublishedCase[],
  start: Strengths,
): { top1: number; sources: number } {
  const sources = [...new Set(cases.map(({ source }) => source))];
  const right = sources.reduce((sum, source) => {
    const strengths = fitStrengths(
      knowledge,
      cases.filter((one) => one.source !== source),
      start,
    );
    return (
      sum +
      cases
        .filter((one) => one.source === source)
        .filter((one) => {
          return placeOf(rankCase(knowledge, parsedCase(knowledge, one), strengths), one.accept) === 1;
        }).length
    );
  }, 0);
  return { top1: right / cases.length, sources: sources.length };
}
