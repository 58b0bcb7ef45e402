import { lengthOf, pointAt, zerosOf } from './geometry/cubic';
import { distance, type XY } from './geometry/xy';
import { cutAt } from './cut';
import { isDart, markOf, pointOf, walkFrom, type Piece, type Station } from './piece';

/** Something that can be measured on a piece; each is a length in mm. */
export type Measure =
  | { readonly of: 'edge'; readonly edge: string }
  /** Along the stitching line from one station to the next, dart mouths left out. */
  | { readonly of: 'seam'; readonly from: Station; readonly to: Station }
  /** Straight across at the height of a mark. */
  | { readonly of: 'width'; readonly level: string }
  | { readonly of: 'intake'; readonly dart: string }
  | { readonly of: 'dart-length'; readonly dart: string }
  /** How far a point or mark lies from another, along one axis of the paper. */
  | { readonly of: 'offset'; readonly point: string; readonly from: string; readonly axis: 'x' | 'y' }
  /** Down the middle of the piece, folds taken off. */
  | { readonly of: 'middle'; readonly from: string; readonly to: string }
  /** How far a point stands off the straight line between two others, outward. */
  | { readonly of: 'off-line'; readonly point: string; readonly from: string; readonly to: string };

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

/** Length of every part of one edge, mm. */
export const edgeLength = (piece: Piece, edge: string): number =>
  sum(piece.parts.filter((one) => one.edge === edge).map(({ cubic }) => lengthOf(cubic)));

/** Length along the outline between two stations, mm; mouths of darts are sewn away and do not count. */
export function seamLength(piece: Piece, from: Station, to: Station): number {
  const once = cutAt(piece, from);
  const twice = cutAt(once.piece, to);
  const start = cutAt(twice.piece, from).index;
  return sum(
    walkFrom(twice.piece, start, twice.index)
      .map((index) => twice.piece.parts[index]!)
      .filter(({ edge }) => !isDart(edge))
      .map(({ cubic }) => lengthOf(cubic)),
  );
}

/** Where the outline passes a height, from the side to the inseam. */
export const crossings = (piece: Piece, y: number): XY[] =>
  piece.parts
    .flatMap(({ cubic }) => zerosOf(cubic, (point) => point.y - y).map((t) => pointAt(cubic, t)))
    .sort((a, b) => a.x - b.x);

/** Width straight across at a height, mm: from the first crossing to the last. @throws RangeError outside the piece. */
export function widthAt(piece: Piece, y: number): number {
  const found = crossings(piece, y);
  if (found.length < 2) throw new RangeError(`the ${piece.id} has no width at ${y.toFixed(1)} mm`);
  return found.at(-1)!.x - found[0]!.x;
}

/** A point of the outline or a mark, by name. */
export const placeOf = (piece: Piece, name: string): XY =>
  name in piece.marks ? markOf(piece, name) : pointOf(piece, name);

/** How far a point lies off the line through two others, outward of the piece, mm. */
function offLine(piece: Piece, point: string, from: string, to: string): number {
  const [p, a, b] = [placeOf(piece, point), placeOf(piece, from), placeOf(piece, to)];
  return ((p.x - a.x) * (b.y - a.y) - (p.y - a.y) * (b.x - a.x)) / distance(a, b);
}

/** A measure of a piece, mm. @throws RangeError when the piece has no such edge, point or level. */
export function read(piece: Piece, measure: Measure): number {
  switch (measure.of) {
    case 'edge':
      return edgeLength(piece, measure.edge);
    case 'seam':
      return seamLength(piece, measure.from, measure.to);
    case 'width':
      return widthAt(piece, markOf(piece, measure.level).y);
    case 'intake':
      return edgeLength(piece, measure.dart);
    case 'dart-length':
      return dartLength(piece, measure.dart);
    case 'offset':
      return placeOf(piece, measure.point)[measure.axis] - placeOf(piece, measure.from)[measure.axis];
    case 'middle':
      return middleLength(piece, markOf(piece, measure.from).y, markOf(piece, measure.to).y);
    case 'off-line':
      return offLine(piece, measure.point, measure.from, measure.to);
  }
}

/** From the middle of a dart's mouth to its point, mm. */
function dartLength(piece: Piece, dart: string): number {
  const mouth = piece.parts.filter(({ edge }) => edge === dart);
  const [a, b] = [mouth[0]!.cubic.from, mouth.at(-1)!.cubic.to];
  return distance({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 }, markOf(piece, `${dart}-point`));
}

function middleLength(piece: Piece, top: number, foot: number): number {
  const inside = piece.folds.filter(({ upper }) => upper.y > top && upper.y < foot);
  return foot - top - sum(inside.map(({ amountMm }) => amountMm));
}
