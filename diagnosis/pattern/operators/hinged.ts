import { lengthOf, mapCubic, pointAt, rootsOf, solve, straight, velocityAt } from '../geometry/cubic';
import { cross, distance, dot, minus, turn, type XY } from '../geometry/xy';
import { cutAt, edgeReader, stationPoint } from '../cut';
import { edgeLength } from '../measure';
import { isDart, pointOf, walkFrom, type Piece, type Station } from '../piece';
import { changes, edge, keeps, type Outcome } from './outcome';

/** A slash that stops on the stitching line of one edge and opens (or overlaps) at another. */
export interface Hinged {
  /** On the stitching line: this point keeps its place and its edge its length. */
  readonly hinge: Exclude<Station, { point: string }>;
  /** The edge that gains or loses the amount. */
  readonly target: string;
  /** A named point on the side of the slash that swings. */
  readonly moves: string;
  readonly amountMm: number;
}

/** Marks beyond the slash go with the side that swings. */
function carryMarks(piece: Piece, isMoved: (mark: XY) => boolean, place: (mark: XY) => XY): Piece['marks'] {
  return Object.fromEntries(
    Object.entries(piece.marks).map(([name, mark]) => [name, isMoved(mark) ? place(mark) : mark]),
  );
}

/** Where, along the target edge, the slash that meets it square begins, mm; without such a place, its nearest point. */
function footMm(piece: Piece, target: string, hinge: XY): number {
  let walked = 0;
  let best = { mm: 0, away: Infinity };
  for (const { edge: name, cubic } of piece.parts) {
    if (name !== target) continue;
    const ends = [0, 1, ...rootsOf((t) => dot(velocityAt(cubic, t), minus(pointAt(cubic, t), hinge)))];
    for (const t of ends) {
      const away = distance(pointAt(cubic, t), hinge);
      if (away < best.away) best = { mm: walked + lengthOf(cubic, 0, t), away };
    }
    walked += lengthOf(cubic);
  }
  return best.mm;
}

interface Opened {
  readonly piece: Piece;
  readonly hingeIndex: number;
  readonly slashIndex: number;
}

function openAt(piece: Piece, { hinge, target }: Hinged, slashMm: number): Opened {
  const hinged = cutAt(piece, hinge);
  const hingePoint = hinged.piece.parts[hinged.index]!.cubic.from;
  const slashed = cutAt(hinged.piece, { edge: target, mm: slashMm });
  const hingeIndex = slashed.piece.parts.findIndex(({ cubic }) => distance(cubic.from, hingePoint) < 1e-9);
  return { piece: slashed.piece, hingeIndex, slashIndex: slashed.index };
}

/** The parts on the side of the slash that holds the named point. */
function swinging({ piece, hingeIndex, slashIndex }: Opened, moves: string): Set<number> {
  const onward = walkFrom(piece, slashIndex, hingeIndex);
  const holds = onward.slice(1).some((index) => piece.parts[index]!.start === moves);
  return new Set(holds ? onward : walkFrom(piece, hingeIndex, slashIndex));
}

/** The slash, and on which side of it the named point lies (±1). */
function lineOf({ piece, hingeIndex, slashIndex }: Opened, moves: string) {
  const [hinge, slash] = [piece.parts[hingeIndex]!.cubic.from, piece.parts[slashIndex]!.cubic.from];
  const side = Math.sign(cross(minus(slash, hinge), minus(pointOf(piece, moves), hinge)));
  return { hinge, slash, side };
}

function swing(opened: Opened, moves: string, angle: number): Piece {
  const { piece } = opened;
  const { hinge, slash, side } = lineOf(opened, moves);
  const moved = swinging(opened, moves);
  const place = (point: XY) => turn(point, hinge, angle);
  const parts = piece.parts.map((one, index) =>
    moved.has(index) ? { ...one, cubic: mapCubic(one.cubic, place) } : one,
  );
  const beyond = (mark: XY) => Math.sign(cross(minus(slash, hinge), minus(mark, hinge))) === side;
  return { ...piece, parts, marks: carryMarks(piece, beyond, place) };
}

const declare = (piece: Piece, { hinge, target, amountMm }: Hinged) => [
  changes(`the ${target}`, edge(target), amountMm),
  keeps(`the ${hinge.edge} on its stitching line`, edge(hinge.edge)),
  ...untouched(piece, [hinge.edge, target]).map((name) =>
    keeps(isDart(name) ? 'the intake of the dart' : `the ${name}`, edge(name)),
  ),
];

const untouched = (piece: Piece, touched: readonly string[]) =>
  [...new Set(piece.parts.map((one) => one.edge))].filter((name) => !touched.includes(name));

/**
 * Slash to the stitching line and spread. Opened by w at length L from the hinge, the turn is 2·asin(w/2L)
 * (plane geometry, standards:D15); the target edge gains exactly w, the hinged edge nothing.
 * @throws RangeError when the slash is shorter than half the amount.
 */
export function hingedSpread(piece: Piece, args: Hinged): Outcome {
  const hingePoint = stationPoint(piece, args.hinge);
  const opened = openAt(piece, args, footMm(piece, args.target, hingePoint));
  const { hinge, slash, side } = lineOf(opened, args.moves);
  const length = distance(hinge, slash);
  if (args.amountMm > 2 * length) throw new RangeError('the slash is too short for this amount');
  const turned = swing(opened, args.moves, side * 2 * Math.asin(args.amountMm / (2 * length)));
  const { slashIndex } = opened;
  const count = turned.parts.length;
  const from = turned.parts[(slashIndex - 1 + count) % count]!.cubic.to;
  const gap = straight(from, turned.parts[slashIndex]!.cubic.from);
  const parts = [...turned.parts];
  parts.splice(slashIndex, 0, { edge: args.target, cubic: gap, restMm: args.amountMm });
  return {
    before: piece,
    piece: { ...turned, parts },
    declared: declare(piece, args),
    drawn: { slashes: [[slash, hinge]], hinges: [hinge] },
  };
}

/**
 * Slash to the stitching line and overlap: what lies between two places of the target edge, equally far from the hinge and
 * the amount apart, is folded away. The inverse of {@link hingedSpread} at the same hinge.
 * @throws RangeError when the target edge is shorter than the amount.
 */
export function hingedOverlap(piece: Piece, args: Hinged): Outcome {
  const { target, amountMm } = args;
  const hingePoint = stationPoint(piece, args.hinge);
  const foot = footMm(piece, target, hingePoint);
  const along = edgeReader(piece, target);
  const away = (mm: number) => distance(along(mm), hingePoint);
  const longest = edgeLength(piece, target) - amountMm;
  if (longest < 0) throw new RangeError(`the ${target} is shorter than the amount`);
  const [low, high] = [Math.max(0, foot - amountMm), Math.min(foot, longest)];
  const startMm = solve((mm) => away(mm + amountMm) - away(mm), low, high);
  const second = openAt(piece, args, startMm + amountMm);
  const first = openAt(second.piece, args, startMm);
  const lips = [along(startMm), along(startMm + amountMm)] as const;
  const strip = first.slashIndex;
  const kept = { ...first.piece, parts: first.piece.parts.filter((_, index) => index !== strip) };
  const hingeIndex = kept.parts.findIndex(({ cubic }) => distance(cubic.from, hingePoint) < 1e-9);
  const opened: Opened = { piece: kept, hingeIndex, slashIndex: strip };
  const angle =
    Math.atan2(lips[0].y - hingePoint.y, lips[0].x - hingePoint.x) -
    Math.atan2(lips[1].y - hingePoint.y, lips[1].x - hingePoint.x);
  const wrapped = Math.atan2(Math.sin(angle), Math.cos(angle));
  // The side that comes after the strip turns by the angle, the side before it by the opposite.
  const isAfter = walkFrom(kept, strip, hingeIndex).some(
    (index, step) => step > 0 && kept.parts[index]!.start === args.moves,
  );
  const turned = swing(opened, args.moves, isAfter ? wrapped : -wrapped);
  return {
    before: piece,
    piece: turned,
    declared: declare(piece, { ...args, amountMm: -amountMm }),
    drawn: {
      slashes: [[lips[0], hingePoint]],
      hinges: [hingePoint],
      folds: [[lips[0], hingePoint, lips[1]]],
    },
  };
}
