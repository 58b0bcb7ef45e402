import { lengthOf, splitCubic, type Cubic } from './geometry/cubic';
import type { XY } from './geometry/xy';

export type PieceId = 'front' | 'back' | 'waistband' | 'yoke' | 'fly';

/** A stretch of outline that belongs to one edge. `start` names the point that it begins at. */
export interface Part {
  readonly edge: string;
  readonly cubic: Cubic;
  /** Length as drafted, mm: tapers are spread by it, so that a change taken back leaves no trace. */
  readonly restMm: number;
  readonly start?: string;
}

/** A wedge folded away (or, with a negative amount, let in) inside a piece, nothing at both ends. */
export interface Fold {
  readonly from: XY;
  readonly to: XY;
  /** Millimetres that the middle loses. */
  readonly amountMm: number;
  /** The widest place, above and below. */
  readonly upper: XY;
  readonly lower: XY;
}

/**
 * One pattern piece on its stitching line: a closed outline, clockwise as drawn (waist, centre, curve, inseam, hem, side).
 * An edge whose name begins with `dart` is the mouth of a dart; its point is the mark `<edge>-point`.
 */
export interface Piece {
  readonly id: PieceId;
  readonly parts: readonly Part[];
  /** Places inside, or levels of which only `y` counts: hip, crotch, thigh, knee, calf, grain-top, grain-foot … */
  readonly marks: Readonly<Record<string, XY>>;
  readonly folds: readonly Fold[];
  /** Allowance outside the stitching line, mm, by edge; an edge left out has none. */
  readonly allowancesMm: Readonly<Record<string, number>>;
}

/** A place on the outline: a named point, where an edge passes a height or a plumb line, or so many millimetres along an edge. */
export type Station =
  | { readonly point: string }
  | { readonly edge: string; readonly y: number }
  | { readonly edge: string; readonly x: number }
  | { readonly edge: string; readonly mm: number };

export const isDart = (edge: string): boolean => edge.startsWith('dart');

/** A part as drafted: its rest length is its length now. */
export const part = (edge: string, cubic: Cubic, start?: string): Part => ({
  edge,
  cubic,
  restMm: lengthOf(cubic),
  ...(start === undefined ? {} : { start }),
});

/** Where a named point lies in the outline. @throws RangeError when the piece has no such point. */
export function indexOfPoint(piece: Piece, name: string): number {
  const index = piece.parts.findIndex(({ start }) => start === name);
  if (index === -1) throw new RangeError(`the ${piece.id} has no point ${name}`);
  return index;
}

export const pointOf = (piece: Piece, name: string): XY => piece.parts[indexOfPoint(piece, name)]!.cubic.from;
export const hasPoint = (piece: Piece, name: string): boolean =>
  piece.parts.some(({ start }) => start === name);

/** A mark inside the piece. @throws RangeError when the piece has no such mark. */
export function markOf(piece: Piece, name: string): XY {
  const mark = piece.marks[name];
  if (!mark) throw new RangeError(`the ${piece.id} has no mark ${name}`);
  return mark;
}

/** Indices of the parts walked from one joint to another, in the order of the outline; the same joint twice is the whole outline. */
export function walkFrom(piece: Piece, from: number, to: number): number[] {
  const count = piece.parts.length;
  const steps = (((to - from) % count) + count) % count || count;
  return Array.from({ length: steps }, (_, step) => (from + step) % count);
}

/** The outline cut in two at parameter `t` of one part; the shape does not change. */
export function splitPart(piece: Piece, index: number, t: number): Piece {
  const old = piece.parts[index]!;
  const [first, second] = splitCubic(old.cubic, t);
  const share = lengthOf(first) / lengthOf(old.cubic);
  const parts = [...piece.parts];
  parts.splice(
    index,
    1,
    { ...old, cubic: first, restMm: old.restMm * share },
    { edge: old.edge, cubic: second, restMm: old.restMm * (1 - share) },
  );
  return { ...piece, parts };
}
