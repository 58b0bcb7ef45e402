import { cuttingLine } from './allowance';
import { pointAt, velocityAt, type Cubic } from './geometry/cubic';
import { flatten } from './geometry/outline';
import { between, distance, plus, times, unit, type XY } from './geometry/xy';
import { edgeLength } from './measure';
import type { Drawn } from './operators/outcome';
import { isDart, type Piece } from './piece';

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** One piece, before and after, as SVG path data in millimetres of paper. */
export interface PieceDrawing {
  /** Where the change lies, with room about it. */
  readonly box: Box;
  /** The whole piece with its allowances. */
  readonly whole: Box;
  readonly before: string;
  readonly after: string;
  readonly cutting: string;
  /** What of the stitching line has moved. */
  readonly changed: string;
  /** Edges that are longer or shorter, with a place to write it at. */
  readonly labels: readonly { readonly edge: string; readonly at: XY; readonly byMm: number }[];
  readonly slashes: readonly string[];
  readonly folds: readonly string[];
  readonly hinges: readonly XY[];
  readonly darts: string;
  readonly grain: string;
  /** Short strokes outward from the stitching line, where seams are matched. */
  readonly notches: string;
}

const n = (value: number) => value.toFixed(2);
const at = ({ x, y }: XY) => `${n(x)} ${n(y)}`;
const curve = ({ control1, control2, to }: Cubic) => `C${at(control1)} ${at(control2)} ${at(to)}`;
const line = (points: readonly XY[]) => `M${points.map(at).join('L')}`;
const outline = (piece: Piece) =>
  `M${at(piece.parts[0]!.cubic.from)}${piece.parts.map(({ cubic }) => curve(cubic)).join('')}Z`;

/** Farther than this from the old line, mm, a part counts as moved. */
const MOVED_MM = 0.3;
const SAMPLES = [0, 0.25, 0.5, 0.75, 1];

function fromOutline(points: readonly XY[], p: XY): number {
  let best = Infinity;
  for (let index = 0; index < points.length; index++) {
    const [a, b] = [points[index]!, points[(index + 1) % points.length]!];
    const square = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
    const t = square === 0 ? 0 : ((p.x - a.x) * (b.x - a.x) + (p.y - a.y) * (b.y - a.y)) / square;
    best = Math.min(best, distance(p, between(a, b, Math.min(1, Math.max(0, t)))));
  }
  return best;
}

const movedParts = (before: Piece, after: Piece) => {
  const old = flatten(
    before.parts.map(({ cubic }) => cubic),
    0.1,
  );
  return after.parts.filter(({ cubic }) =>
    SAMPLES.some((t) => fromOutline(old, pointAt(cubic, t)) > MOVED_MM),
  );
};

function boxOf(points: readonly XY[], roomMm: number, leastMm: number): Box {
  const [xs, ys] = [points.map(({ x }) => x), points.map(({ y }) => y)];
  const span = (low: number, high: number): [number, number] => {
    const size = Math.max(high - low + 2 * roomMm, leastMm);
    return [(low + high - size) / 2, size];
  };
  const [x, width] = span(Math.min(...xs), Math.max(...xs));
  const [y, height] = span(Math.min(...ys), Math.max(...ys));
  return { x, y, width, height };
}

function labelsOf(before: Piece, after: Piece, moved: Piece['parts']): PieceDrawing['labels'] {
  return [...new Set(after.parts.map(({ edge }) => edge))].flatMap((edge) => {
    const byMm = edgeLength(after, edge) - edgeLength(before, edge);
    const parts = moved.filter((one) => one.edge === edge);
    const middle = parts[Math.floor(parts.length / 2)];
    return Math.abs(byMm) > 0.5 && middle ? [{ edge, byMm, at: pointAt(middle.cubic, 0.5) }] : [];
  });
}

/** Each dart as its two legs: mouth, point, mouth. */
const dartsOf = (piece: Piece): XY[][] =>
  [...new Set(piece.parts.map(({ edge }) => edge).filter(isDart))].flatMap((dart) => {
    const mouth = piece.parts.filter(({ edge }) => edge === dart);
    const point = piece.marks[`${dart}-point`];
    return point ? [[mouth[0]!.cubic.from, point, mouth.at(-1)!.cubic.to]] : [];
  });

const NOTCHES = ['notch', 'hip-in', 'hip-out', 'knee-in', 'knee-out'];
const NOTCH_MM = 6;
const notchesOf = (piece: Piece) =>
  piece.parts
    .filter(({ start }) => start !== undefined && NOTCHES.includes(start))
    .map(({ cubic }) => {
      const { x, y } = unit(velocityAt(cubic, 0));
      return line([cubic.from, plus(cubic.from, times({ x: y, y: -x }, NOTCH_MM))]);
    })
    .join('');

/** Before and after of one piece over each other, with what each operator marks: slash, hinge, fold. */
export function drawPiece(before: Piece, after: Piece, drawn: readonly Drawn[]): PieceDrawing {
  const moved = movedParts(before, after);
  const slashes = drawn.flatMap((one) => one.slashes ?? []);
  const folds = drawn.flatMap((one) => one.folds ?? []);
  const darts = { before: dartsOf(before), after: dartsOf(after) };
  const isDarted = darts.before.map(line).join('') !== darts.after.map(line).join('');
  const spots = [
    ...moved.flatMap(({ cubic }) => SAMPLES.map((t) => pointAt(cubic, t))),
    ...slashes.flat(),
    ...folds.flat(),
    ...(isDarted ? [...darts.before, ...darts.after].flat() : []),
  ];
  const cutting = cuttingLine(after);
  const top = after.marks['grain-top'] ?? after.parts[0]!.cubic.from;
  const foot = after.marks['grain-foot'] ?? top;
  return {
    box: boxOf(spots.length > 0 ? spots : cutting, 45, 240),
    whole: boxOf(cutting, 15, 40),
    before: outline(before) + darts.before.map(line).join(''),
    after: outline(after),
    cutting: `${line(cutting)}Z`,
    changed:
      moved.map(({ cubic }) => `M${at(cubic.from)}${curve(cubic)}`).join('') +
      (isDarted ? darts.after.map(line).join('') : ''),
    labels: labelsOf(before, after, moved),
    slashes: slashes.map(line),
    folds: folds.map((one) => `${line(one)}Z`),
    hinges: drawn.flatMap((one) => one.hinges ?? []),
    darts: darts.after.map(line).join(''),
    grain: line([top, foot]),
    notches: notchesOf(after),
  };
}
