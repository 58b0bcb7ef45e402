import { mapCubic, straight } from '../geometry/cubic';
import { meeting } from '../geometry/outline';
import { distance, minus, plus, times, turn, type XY } from '../geometry/xy';
import { cutAt } from '../cut';
import { angleAt } from '../operators/dart';
import { markOf, part, walkFrom, type Part, type Piece } from '../piece';

/** Where the yoke seam runs, mm below the waist along centre back and along the side. */
export interface YokeLine {
  readonly centreMm: number;
  readonly sideMm: number;
}

const carried = (one: Part, place: (point: XY) => XY): Part => ({
  ...one,
  cubic: mapCubic(one.cubic, place),
});

/** The dart's mouth and where its middle line meets the yoke seam. */
function dartAt(piece: Piece, upper: readonly number[], from: XY, to: XY) {
  const mouth = upper.filter((index) => piece.parts[index]!.edge === 'dart-1');
  if (mouth.length === 0) return null;
  const [a, b] = [piece.parts[mouth[0]!]!.cubic.from, piece.parts[mouth.at(-1)!]!.cubic.to];
  const point = meeting(times(plus(a, b), 1 / 2), markOf(piece, 'dart-1-point'), from, to);
  return point && { mouth: new Set(mouth), point, angle: angleAt(point, a, b) };
}

/**
 * Cuts a yoke off the back. The dart is ended on the yoke seam and closed in the yoke, which bends it; both sides of the new seam
 * are equally long, and the yoke's waist is the sewn waist. Named points go with their piece.
 * @throws RangeError when the line does not pass the piece.
 */
export function cutYoke(back: Piece, { centreMm, sideMm }: YokeLine): { yoke: Piece; back: Piece } {
  const sideWhole = back.parts.filter(({ edge }) => edge === 'side');
  const sideLength = sideWhole.reduce((total, one) => total + one.restMm, 0);
  const once = cutAt(back, { edge: 'side', mm: sideLength - sideMm });
  const sidePoint = once.piece.parts[once.index]!.cubic.from;
  const { piece, index: centreIndex } = cutAt(once.piece, { edge: 'centre', mm: centreMm });
  const sideIndex = piece.parts.findIndex(({ cubic }) => distance(cubic.from, sidePoint) < 1e-9);
  const centrePoint = piece.parts[centreIndex]!.cubic.from;
  const upper = walkFrom(piece, sideIndex, centreIndex);
  const lower = walkFrom(piece, centreIndex, sideIndex);
  const below: Piece = {
    ...piece,
    parts: [
      ...lower.map((index) => piece.parts[index]!),
      part('yoke-seam', straight(sidePoint, centrePoint), 'yoke-out'),
    ],
    marks: Object.fromEntries(Object.entries(piece.marks).filter(([name]) => name !== 'dart-1-point')),
  };
  const dart = dartAt(piece, upper, sidePoint, centrePoint);
  return { yoke: yokeOf(piece, upper, [sidePoint, centrePoint], dart), back: below };
}

function yokeOf(
  piece: Piece,
  upper: readonly number[],
  [sidePoint, centrePoint]: readonly [XY, XY],
  dart: ReturnType<typeof dartAt>,
): Piece {
  const base = { ...piece, id: 'yoke' as const, folds: [], marks: {} };
  const parts = upper.map((index) => piece.parts[index]!);
  if (!dart)
    return { ...base, parts: [...parts, part('yoke-seam', straight(centrePoint, sidePoint), 'yoke-in')] };
  const place = (point: XY) => turn(point, dart.point, dart.angle);
  const first = upper.findIndex((index) => dart.mouth.has(index));
  const toSide = parts.slice(0, first).map((one) => carried(one, place));
  const toCentre = parts.slice(first + dart.mouth.size);
  return {
    ...base,
    parts: [
      ...toSide,
      ...toCentre,
      part('yoke-seam', straight(centrePoint, dart.point), 'yoke-in'),
      part('yoke-seam', straight(dart.point, place(sidePoint))),
    ],
    marks: { 'grain-top': centrePoint, 'grain-foot': plus(dart.point, times(minus(dart.point, centrePoint), -0.5)) },
  }; // prettier-ignore
}
