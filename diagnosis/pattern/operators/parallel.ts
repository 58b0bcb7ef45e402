import { mapCubic, straight } from '../geometry/cubic';
import { distance, minus, plus, xy, type XY } from '../geometry/xy';
import { bend } from '../bend';
import { cutAt } from '../cut';
import { indexOfPoint, pointOf, walkFrom, type Piece, type Station } from '../piece';
import { changes, edge, keeps, type Declared, type Outcome } from './outcome';

/** A slash straight through the piece, across (`axis` y) or along the grain (`axis` x), opened or tucked by the same amount all along. */
export interface Parallel {
  readonly axis: 'x' | 'y';
  /** Height (or plumb line) of the slash on the paper, mm. */
  readonly at: number;
  /** The two edges it runs through. */
  readonly edges: readonly [string, string];
  /** A named point on the side that moves. */
  readonly moves: string;
  readonly amountMm: number;
}

interface Through {
  readonly piece: Piece;
  readonly joints: readonly [number, number];
}

const station = (axis: 'x' | 'y', name: string, at: number): Station =>
  axis === 'y' ? { edge: name, y: at } : { edge: name, x: at };

/** The piece with joints where a line passes its two edges. */
function cutThrough(piece: Piece, { axis, edges }: Parallel, at: number): Through {
  const once = cutAt(piece, station(axis, edges[0], at));
  const mark = once.piece.parts[once.index]!.cubic.from;
  const twice = cutAt(once.piece, station(axis, edges[1], at));
  const first = twice.piece.parts.findIndex(({ cubic }) => distance(cubic.from, mark) < 1e-9);
  return { piece: twice.piece, joints: [first, twice.index] };
}

const vector = (axis: 'x' | 'y', mm: number): XY => (axis === 'y' ? xy(0, mm) : xy(mm, 0));

/** Which way the moved side lies from the slash: −1 up or toward the side seam, +1 down or toward the inseam. */
const sideOf = (piece: Piece, { axis, at, moves }: Parallel): number =>
  Math.sign(pointOf(piece, moves)[axis] - at);

function shifted(through: Through, args: Parallel, at: number, mm: number): Piece {
  const { piece, joints } = through;
  const onward = walkFrom(piece, joints[0], joints[1]);
  const target = indexOfPoint(piece, args.moves);
  // A joint belongs to the side it begins, unless the slash runs through it.
  const isOnward = onward.slice(1).includes(target);
  const moved = new Set(isOnward ? onward : walkFrom(piece, joints[1], joints[0]));
  const by = vector(args.axis, mm);
  const side = sideOf(piece, args);
  const place = (point: XY) => plus(point, by);
  return {
    ...piece,
    parts: piece.parts.map((one, index) =>
      moved.has(index) ? { ...one, cubic: mapCubic(one.cubic, place) } : one,
    ),
    marks: Object.fromEntries(
      Object.entries(piece.marks).map(([name, mark]) => [
        name,
        Math.sign(mark[args.axis] - at) === side ? place(mark) : mark,
      ]),
    ),
  };
}

/** Wherever the outline no longer meets, a straight piece of the edge before it is let in. */
function bridged(piece: Piece): Piece {
  const parts = piece.parts.flatMap((one, index) => {
    const before = piece.parts.at(index - 1)!;
    const gap = distance(before.cubic.to, one.cubic.from);
    if (gap < 1e-7) return [one];
    const name = before.start !== undefined && before.edge !== one.edge ? one.edge : before.edge;
    return [{ edge: name, cubic: straight(before.cubic.to, one.cubic.from), restMm: gap }, one];
  });
  return { ...piece, parts };
}

const declare = (piece: Piece, { edges, amountMm }: Parallel, withinMm: number): Declared[] => [
  ...[...new Set(edges)].map((name) => changes(`the ${name}`, edge(name), amountMm, withinMm)),
  ...[...new Set(piece.parts.map((one) => one.edge))]
    .filter((name) => !edges.includes(name))
    .map((name) => keeps(name.startsWith('dart') ? 'the intake of the dart' : `the ${name}`, edge(name))),
];

const line = (piece: Piece, { edges, axis, at }: Parallel): [XY, XY] => {
  const through = cutThrough(piece, { axis, edges, at, moves: '', amountMm: 0 }, at);
  return [
    through.piece.parts[through.joints[0]]!.cubic.from,
    through.piece.parts[through.joints[1]]!.cubic.from,
  ];
};

/** Slash right through and spread: both edges gain exactly the amount, everything else keeps its shape. */
export function parallelSpread(piece: Piece, args: Parallel): Outcome {
  const side = sideOf(piece, args);
  const moved = shifted(cutThrough(piece, args, args.at), args, args.at, side * args.amountMm);
  return {
    before: piece,
    piece: bridged(moved),
    declared: declare(piece, args, 0.01),
    drawn: { slashes: [line(piece, args)] },
  };
}

/** The named point that the outline comes to next, walking on or back from a joint. */
function nextPoint(piece: Piece, joint: number, step: 1 | -1): string {
  const count = piece.parts.length;
  for (let index = joint + step; ; index += step) {
    const name = piece.parts[((index % count) + count) % count]!.start;
    if (name !== undefined) return name;
  }
}

/**
 * Fold a tuck right across: the strip beyond the slash is taken out and the moved side follows. Where an edge runs aslant, its
 * two ends no longer meet; the moved side is then drawn to the other, to nothing at the next named point.
 */
export function parallelTuck(piece: Piece, args: Parallel): Outcome {
  const side = sideOf(piece, args);
  const far = args.at + side * args.amountMm;
  const first = cutThrough(piece, args, args.at);
  const second = cutThrough(first.piece, args, far);
  const moved = shifted(second, args, far - side * 1e-9, -side * args.amountMm);
  const tucked = without(moved, stripOf(second.piece, args, far));
  return {
    before: piece,
    piece: joined(tucked.piece, tucked.joints),
    // Seams that run aslant lose a little more or less than the strip is wide.
    declared: declare(piece, { ...args, amountMm: -args.amountMm }, 0.2 * args.amountMm),
    drawn: {
      slashes: [line(piece, args)],
      folds: [[...line(piece, args), ...line(piece, { ...args, at: far }).reverse()]],
    },
  };
}

/** Parts of the two edges that lie between the slash and the far edge of the strip. */
function stripOf(piece: Piece, { axis, edges, at }: Parallel, far: number): Set<number> {
  const [low, high] = [Math.min(at, far) - 1e-6, Math.max(at, far) + 1e-6];
  const within = (value: number) => value > low && value < high;
  return new Set(
    piece.parts.flatMap(({ edge: name, cubic }, index) =>
      edges.includes(name) && within(cubic.from[axis]) && within(cubic.to[axis]) ? [index] : [],
    ),
  );
}

/** The outline without some of its parts, and the joints that are torn by it. */
function without(piece: Piece, strip: ReadonlySet<number>): { piece: Piece; joints: number[] } {
  const parts = piece.parts.filter((_, index) => !strip.has(index));
  const joints = parts.flatMap((one, index) =>
    distance(parts.at(index - 1)!.cubic.to, one.cubic.from) > 1e-9 ? [index] : [],
  );
  return { piece: { ...piece, parts }, joints };
}

/** Each torn joint closed: the stretch after it is drawn to the end before it. */
function joined(piece: Piece, joints: readonly number[]): Piece {
  return joints.reduce((closing, index) => {
    const before = closing.parts.at(index - 1)!.cubic.to;
    const name = `tuck-${index}`;
    const own = closing.parts[index]!;
    const gap = minus(before, own.cubic.from);
    const named = {
      ...closing,
      parts: closing.parts.map((one, at) => (at === index ? { ...one, start: own.start ?? name } : one)),
    };
    const from = { point: own.start ?? name };
    const to = { point: nextPoint(named, index, 1) };
    const bent = bend(named, { from, to, weights: [1, 0], shape: 'smooth', by: 'length' }, gap);
    return {
      ...bent,
      parts: bent.parts.map((one) => (one.start === name ? withoutName(one) : one)),
    };
  }, piece);
}

function withoutName({ edge: name, cubic, restMm }: Piece['parts'][number]): Piece['parts'][number] {
  return { edge: name, cubic, restMm };
}
