import { lengthOf, mapCubic, straight } from '../geometry/cubic';
import { distance, minus, plus, times, turn, unit, type XY } from '../geometry/xy';
import { cutAt } from '../cut';
import { edgeLength, read } from '../measure';
import { markOf, walkFrom, type Part, type Piece, type Station } from '../piece';
import { changes, edge, keeps, type Outcome } from './outcome';

const mouthOf = (piece: Piece, dart: string) => {
  const first = piece.parts.findIndex((one) => one.edge === dart);
  const last = piece.parts.findLastIndex((one) => one.edge === dart);
  if (first === -1) throw new RangeError(`the ${piece.id} has no ${dart}`);
  return { first, last };
};

/** Where the mouth begins and ends, counted along edge and mouth together, mm. */
function mouthMm(piece: Piece, dart: string, along: string): [number, number] {
  const { first } = mouthOf(piece, dart);
  const before = piece.parts.slice(0, first).filter((one) => one.edge === along || one.edge === dart);
  const startMm = before.reduce((total, { cubic }) => total + lengthOf(cubic), 0);
  return [startMm, startMm + edgeLength(piece, dart)];
}

/** The same outline with the mouth between two other places of the edge. */
function withMouth(piece: Piece, dart: string, along: string, [startMm, endMm]: [number, number]): Piece {
  const names = new Map(piece.parts.map((one) => [one, one.edge]));
  const whole = {
    ...piece,
    parts: piece.parts.map((one) => (names.get(one) === dart ? renamed(one, along) : one)),
  };
  const first = cutAt(whole, { edge: along, mm: startMm });
  const second = cutAt(first.piece, { edge: along, mm: endMm });
  const start = cutAt(second.piece, { edge: along, mm: startMm }).index;
  const mouth = new Set(walkFrom(second.piece, start, second.index));
  const parts = second.piece.parts.map((one, index) => {
    if (mouth.has(index)) return renamed(one, dart, index === start ? `${dart}-out` : undefined);
    return index === second.index ? renamed(one, one.edge, `${dart}-in`) : dropMouthName(one, dart);
  });
  return { ...second.piece, parts };
}

function renamed({ cubic, restMm }: Part, name: string, start?: string): Part {
  return { edge: name, cubic, restMm, ...(start === undefined ? {} : { start }) };
}

const dropMouthName = (one: Part, dart: string): Part =>
  one.start?.startsWith(`${dart}-`) ? renamed(one, one.edge) : one;

export interface ResizedDart {
  readonly dart: string;
  /** The edge that it opens in. */
  readonly along: string;
  /** + takes more in, half at each leg. */
  readonly amountMm: number;
}

/** A dart's intake made larger or smaller, half the amount at each leg; the outline does not move. @throws RangeError when nothing would be left. */
export function resizeDart(piece: Piece, { dart, along, amountMm }: ResizedDart): Outcome {
  const [start, end] = mouthMm(piece, dart, along);
  const half = amountMm / 2;
  if (end - start + amountMm < 0.5) throw new RangeError('no dart would be left');
  return {
    before: piece,
    piece: withMouth(piece, dart, along, [start - half, end + half]),
    declared: [
      changes('the intake of the dart', { of: 'intake', dart }, amountMm),
      changes(`the ${along} as sewn`, edge(along), -amountMm),
      keeps('the centre', edge('centre')),
      keeps('the side', edge('side')),
    ],
    drawn: {},
  };
}

/** A dart made longer (+) or shorter, its mouth and its direction kept. @throws RangeError when nothing would be left. */
export function moveDartPoint(piece: Piece, { dart, amountMm }: { dart: string; amountMm: number }): Outcome {
  const { first, last } = mouthOf(piece, dart);
  const mouth = times(plus(piece.parts[first]!.cubic.from, piece.parts[last]!.cubic.to), 1 / 2);
  const point = markOf(piece, `${dart}-point`);
  if (distance(mouth, point) + amountMm < 10) throw new RangeError('no dart would be left');
  const moved = plus(point, times(unit(minus(point, mouth)), amountMm));
  return {
    before: piece,
    piece: { ...piece, marks: { ...piece.marks, [`${dart}-point`]: moved } },
    declared: [
      changes('the length of the dart', { of: 'dart-length', dart }, amountMm),
      keeps('the intake of the dart', { of: 'intake', dart }),
      keeps('the waist', edge('waist')),
    ],
    drawn: { slashes: [[point, moved]] },
  };
}

/**
 * A dart closed and opened at another place of the outline, turned round its own point: the angle 2·atan(w/2d) is kept
 * (plane geometry, standards:D17), and every other edge keeps its length.
 * @throws RangeError when the piece has no such dart.
 */
export function rotateDart(piece: Piece, { dart, to }: { dart: string; to: Station }): Outcome {
  const { piece: cut, index } = cutAt(piece, to);
  const { first, last } = mouthOf(cut, dart);
  const point = markOf(cut, `${dart}-point`);
  const [a, b] = [cut.parts[first]!.cubic.from, cut.parts[last]!.cubic.to];
  const angle = angleAt(point, b, a);
  // Everything from the mouth on to the new slash turns until the legs meet.
  const turned = new Set(walkFrom(cut, last + 1, index));
  const place = (mark: XY) => turn(mark, point, angle);
  const all = cut.parts.map((one, at) =>
    turned.has(at) ? { ...one, cubic: mapCubic(one.cubic, place) } : one,
  );
  const target = all[index]!;
  const from = all.at(index - 1)!.cubic.to;
  const mouth = renamed(
    { edge: dart, cubic: straight(from, target.cubic.from), restMm: distance(from, target.cubic.from) },
    dart,
    `${dart}-out`,
  );
  const parts = all.flatMap((one, at) => {
    if (one.edge === dart) return [];
    const own = dropMouthName(one, dart);
    return at === index ? [mouth, { ...own, start: own.start ?? `${dart}-in` }] : [own];
  });
  const kept = [...new Set(piece.parts.map((one) => one.edge))].filter((name) => name !== dart);
  return {
    before: piece,
    piece: { ...cut, parts },
    declared: kept.map((name) => keeps(`the ${name}`, edge(name))),
    drawn: { slashes: [[target.cubic.from, point]], hinges: [point] },
  };
}

/** The turn from one arm to the other round a point, radians, −π…π. */
export function angleAt(point: XY, from: XY, to: XY): number {
  const turned = Math.atan2(to.y - point.y, to.x - point.x) - Math.atan2(from.y - point.y, from.x - point.x);
  return Math.atan2(Math.sin(turned), Math.cos(turned));
}

/** The angle that a dart closes, degrees. */
export function dartDegrees(piece: Piece, dart: string): number {
  const depth = read(piece, { of: 'dart-length', dart });
  const { first, last } = mouthOf(piece, dart);
  const chord = distance(piece.parts[first]!.cubic.from, piece.parts[last]!.cubic.to);
  return (2 * Math.atan(chord / 2 / depth) * 180) / Math.PI;
}
