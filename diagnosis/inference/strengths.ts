import type { Direction, Grade, Sign } from '../garments/schema';
import { GRID_SIZE, zAt } from './grid';

/** Severity levels that a sign can pass: above none, above faint, above clear. */
export const LEVELS = 3;

/** The few numbers that are fitted; everything else is knowledge. */
export interface Strengths {
  /** How surely a need far beyond its scale shows a sign, 0 … 1, by grade of the link. */
  grade: Record<Grade, number>;
  /** z at which a sign passes none, faint and clear half of the time, ascending. */
  thresholds: readonly [number, number, number];
  /** Softness of those thresholds, in z. */
  width: number;
  /** P(severity above none, faint, clear) where nothing is wrong. */
  leak: Record<Sign['leak'], readonly [number, number, number]>;
  /** Prior probability of each of the two tails of a need. */
  tail: number;
}

/**
 * Set by judgement before anything was fitted; where fitting starts from. A need of one scale is by definition clearly seen;
 * half of it is faint, twice as much pulls.
 */
export const STRENGTHS_BEFORE: Strengths = {
  grade: { defining: 0.92, strong: 0.78, usual: 0.58, sometimes: 0.34, rare: 0.14 },
  thresholds: [0.5, 1, 2],
  width: 0.3,
  leak: { low: [0.01, 0.003, 0.001], usual: [0.03, 0.008, 0.0015], high: [0.1, 0.03, 0.005] },
  tail: 0.06,
};

/** In use: fitted by coordinate steps on the tuning cases, from those above. What moved is named: the two weak grades and the leaks. */
export const STRENGTHS: Strengths = {
  ...STRENGTHS_BEFORE,
  grade: { ...STRENGTHS_BEFORE.grade, sometimes: 0.26, rare: 0.11 },
  leak: { low: [0.009, 0.0027, 0.0009], usual: [0.019, 0.005, 0.001], high: [0.09, 0.027, 0.0045] },
};

/** A cause that is present acts like a need this many scales out. */
const CAUSE_Z = 1.6;

/**
 * How far a need of `x` scales in the link's direction has risen above a threshold, 0 at x ≤ 0 and toward 1 far out:
 * (σ((x−t)/w) − σ(−t/w)) / (1 − σ(−t/w)), written without a difference so that it is never negative.
 */
export function rise(x: number, threshold: number, width: number): number {
  if (x <= 0) return 0;
  const base = 1 / (1 + Math.exp(threshold / width));
  const grown = base * Math.expm1(x / width);
  return Number.isFinite(grown) ? grown / (1 + grown) : 1;
}

/** `above[k][state]`: how far each state of a source has risen above severity k (k = 0, 1, 2). */
export type RiseTable = readonly Float64Array[];

function tableOver(length: number, value: (state: number, level: number) => number): RiseTable {
  return Array.from({ length: LEVELS }, (_, level) =>
    Float64Array.from({ length }, (_, state) => value(state, level)),
  );
}

/** Rise tables for the two directions of a need and for a cause (states: absent, present). */
export function riseTables(strengths: Strengths): Record<Direction | 'cause', RiseTable> {
  const { thresholds, width } = strengths;
  return {
    more: tableOver(GRID_SIZE, (bin, level) => rise(zAt(bin), thresholds[level]!, width)),
    less: tableOver(GRID_SIZE, (bin, level) => rise(-zAt(bin), thresholds[level]!, width)),
    cause: tableOver(2, (state, level) => (state === 0 ? 0 : rise(CAUSE_Z, thresholds[level]!, width))),
  };
}
