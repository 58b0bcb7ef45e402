import type { XY } from '../geometry/xy';
import type { Measure } from '../measure';
import type { Piece } from '../piece';

/** What an operator says of one measure: that it changes by `byMm`, or (0) that it must not change. */
export interface Declared {
  readonly name: string;
  readonly measure: Measure;
  readonly byMm: number;
  /** How near the geometry must come, mm. */
  readonly withinMm: number;
}

/** What is drawn beside the outline: where to cut or fold, and round which point. */
export interface Drawn {
  readonly slashes?: readonly (readonly [XY, XY])[];
  readonly hinges?: readonly XY[];
  /** Corners of what is folded away, in the order of its outline. */
  readonly folds?: readonly (readonly XY[])[];
}

export interface Outcome {
  /** The piece as it was, with the points that the operator had to name. */
  readonly before: Piece;
  readonly piece: Piece;
  readonly declared: readonly Declared[];
  readonly drawn: Drawn;
}

/** Exact to the last digits of the arithmetic: what an operator does not touch. */
export const UNTOUCHED_MM = 1e-6;
/** What an operator is asked for, to a hundredth of a millimetre. */
export const ASKED_MM = 0.01;

export const keeps = (name: string, measure: Measure, withinMm = UNTOUCHED_MM): Declared => ({
  name,
  measure,
  byMm: 0,
  withinMm,
});

export const changes = (name: string, measure: Measure, byMm: number, withinMm = ASKED_MM): Declared => ({
  name,
  measure,
  byMm,
  withinMm,
});

export const edge = (name: string): Measure => ({ of: 'edge', edge: name });
