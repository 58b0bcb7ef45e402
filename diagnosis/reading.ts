import type { Side } from './case-schema';
import type { Basis, Check, Direction } from './garments/schema';

/** What a case reads as. All lengths are millimetres, unrounded; probabilities are 0 … 1. */
export interface Reading {
  /** Highest probability first: everything at *possible* or above, and at least the five highest. */
  needs: NeedRow[];
  causes: CauseRow[];
  corrections: CorrectionRow[];
  /** Causes above 0.35 first, then corrections by score. */
  ranked: RankedItem[];
  /** At most three changes that can be told apart afterwards; empty without evidence. */
  plan: PlannedChange[];
  muslin: Muslin;
  leftOut: LeftOut[];
  checks: CheckRow[];
  doubt: Doubt;
  /** False where anything had to be approximated. */
  exact: boolean;
  engine: string;
}

export type Word = 'likely' | 'possible' | 'less likely';
export type Muslin = 're-baste' | 'patch' | 'new-cloth';
export type Range = [number, number];

export interface NeedRow {
  dimension: string;
  side: Side;
  direction: Direction;
  /** P(beyond the tolerance in that direction). */
  probability: number;
  word: Word;
  /** Signed; where the need lies if it is beyond its tolerance (middle four fifths). */
  rangeMm: Range;
  basis: Basis;
}

export interface CauseRow {
  cause: string;
  probability: number;
  word: Word;
  action: string;
  because: Reason[];
  against: Reason[];
}

/** One piece of evidence for or against an item: what leaving it out would change. */
export interface Reason {
  kind: 'sign' | 'absent' | 'measured' | 'test' | 'history';
  id: string;
  side: Side;
  /** Change of the item's log-odds that this piece of evidence brought; positive speaks for it. */
  logOdds: number;
  text: string;
  sources: string[];
}

export interface CorrectionRow {
  correction: string;
  name: string;
  side: Side;
  word: Word;
  /** Misfit removed at the best admissible amount, less its risk; in tolerances. */
  score: number;
  /** Null, as the caps, where the change is not a length. */
  amountMm: number | null;
  amountText: string | null;
  estimateMm: Range | null;
  basis: Basis | null;
  firstMm: number | null;
  capRoundMm: number | null;
  capTotalMm: number | null;
  beyond: 'another-size' | 'another-draft' | null;
  because: Reason[];
  against: Reason[];
  cautions: string[];
}

export interface RankedItem {
  kind: 'cause' | 'correction';
  id: string;
  side: Side;
}

export interface PlannedChange {
  correction: string;
  side: Side;
  amountMm: number | null;
  basis: Basis | null;
}

export interface LeftOut {
  id: string;
  why: string;
}

export interface CheckRow {
  check: string;
  question: string;
  /** Expected information about what to do, bits. */
  gainBits: number;
  effort: Check['effort'];
}

export interface Doubt {
  level: 'none' | 'some' | 'high';
  why: string;
}
