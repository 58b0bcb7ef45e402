import { lengthOf, solve, velocityAt, type Cubic } from './geometry/cubic';
import { angleBetween, plus, times, unit, type XY } from './geometry/xy';
import { indexOfPoint, walkFrom, type Part, type Piece } from './piece';

/** A corner inside one edge, in degrees, that paper would not show. */
export const SMOOTH_DEG = 0.5;

const leaving = ({ cubic }: Part): XY => velocityAt(cubic, 0);
const arriving = ({ cubic }: Part): XY => velocityAt(cubic, 1);

/** Corners inside one edge: where it breaks by more than {@link SMOOTH_DEG}, with the break in degrees. */
export const cornersOf = (piece: Piece): { edge: string; at: XY; degrees: number }[] =>
  piece.parts.flatMap((one, index) => {
    const before = piece.parts.at(index - 1)!;
    if (before.edge !== one.edge) return [];
    const degrees = angleBetween(arriving(before), leaving(one));
    return degrees > SMOOTH_DEG ? [{ edge: one.edge, at: one.cubic.from, degrees }] : [];
  });

/** One cubic that leaves and arrives as the run does, its handles long enough to measure what the run measured. */
function runOf(parts: readonly Part[], lengthMm: number): Cubic {
  const [first, last] = [parts[0]!, parts.at(-1)!];
  const [from, to] = [first.cubic.from, last.cubic.to];
  const [out, back] = [unit(leaving(first)), unit(arriving(last))];
  const draw = (handle: number): Cubic => ({
    from,
    control1: plus(from, times(out, handle)),
    control2: plus(to, times(back, -handle)),
    to,
  });
  const [low, high] = [lengthMm / 12, lengthMm * 0.75];
  const miss = (handle: number) => lengthOf(draw(handle)) - lengthMm;
  // A run that is nearly straight has no handle that makes it longer: then the smoothest is as near as it comes.
  if (miss(low) * miss(high) > 0) return draw(lengthMm / 3);
  return draw(solve(miss, low, high, lengthMm / 3));
}

/**
 * Trues the outline between two named points of one edge: one smooth curve instead of what the changes left, leaving and arriving
 * as before and, where it can, exactly as long.
 */
export function trueRun(piece: Piece, from: string, to: string): Piece {
  const indices = walkFrom(piece, indexOfPoint(piece, from), indexOfPoint(piece, to));
  const run = indices.map((index) => piece.parts[index]!);
  const lengthMm = run.reduce((total, { cubic }) => total + lengthOf(cubic), 0);
  const restMm = run.reduce((total, one) => total + one.restMm, 0);
  const drawn: Part = { edge: run[0]!.edge, cubic: runOf(run, lengthMm), restMm, start: from };
  const others = piece.parts.filter((_, index) => !indices.includes(index));
  const place = indices[0]! > indices.at(-1)! ? others.length : indices[0]!;
  return { ...piece, parts: [...others.slice(0, place), drawn, ...others.slice(place)] };
}

/** The named points between which a part lies. */
function namedAround(piece: Piece, index: number): { from: string; to: string } {
  const count = piece.parts.length;
  const name = (at: number) => piece.parts[((at % count) + count) % count]!.start;
  let [before, after] = [index - 1, index + 1];
  while (name(before) === undefined) before--;
  while (name(after) === undefined) after++;
  return { from: name(before)!, to: name(after)! };
}

/**
 * Trues whatever corners a change has left inside an edge, each between the named points around it. Corners at named points belong
 * to the draft and stay. @returns the piece as it is when nothing breaks.
 */
export function trueAll(piece: Piece): Piece {
  const index = piece.parts.findIndex((one, at) => {
    const before = piece.parts.at(at - 1)!;
    return (
      one.start === undefined &&
      before.edge === one.edge &&
      angleBetween(arriving(before), leaving(one)) > SMOOTH_DEG
    );
  });
  if (index === -1) return piece;
  const { from, to } = namedAround(piece, index);
  return trueAll(trueRun(piece, from, to));
}
