import { lengthOf, rootsOf, velocityAt } from '../geometry/cubic';
import { cross, minus, times, unit, xy } from '../geometry/xy';
import { withPoint } from '../cut';
import { edgeLength } from '../measure';
import { hasPoint, pointOf, walkFrom, indexOfPoint, type Piece } from '../piece';
import { move, moveAndSlide, stretch } from './move';
import { changes, edge, keeps, type Outcome } from './outcome';

const POINT = { of: 'offset', point: 'crotch-point', from: 'notch', axis: 'x' } as const;
const INSEAM = { of: 'seam', from: { point: 'crotch-point' }, to: { point: 'knee-in' } } as const;

const AROUND_POINT = [
  stretch('notch', 'crotch-point', [0, 1]),
  stretch('crotch-point', 'knee-in', [1, 0]),
] as const;

/** Move the crotch point out (+) or in along the crotch line; it slides up or down until the inseam measures as before. */
export function extendPoint(piece: Piece, amountMm: number): Outcome {
  const moved = {
    stretches: AROUND_POINT,
    by: xy(amountMm, 0),
    declared: [
      changes('the reach of the crotch point', POINT, amountMm),
      keeps('the inseam, fork to knee', INSEAM),
      keeps('the centre', edge('centre')),
      keeps('the side', edge('side')),
      keeps('the knee', { of: 'width', level: 'knee' }),
    ],
  };
  return moveAndSlide(piece, moved, {
    from: 'crotch-point',
    to: 'knee-in',
    stretches: AROUND_POINT,
    direction: xy(0, 1),
  });
}

/** Move the crotch point down and out, curve and inseam following; nothing slides, so the inseam measures as it falls. */
export function moveFork(piece: Piece, outMm: number, downMm: number): Outcome {
  return move(piece, {
    stretches: AROUND_POINT,
    by: xy(outMm, downMm),
    declared: [
      changes(
        'the depth of the fork',
        { of: 'offset', point: 'crotch-point', from: 'notch', axis: 'y' },
        downMm,
      ),
      changes('the reach of the crotch point', POINT, outMm),
      keeps('the waist', edge('waist')),
      keeps('the side', edge('side')),
    ],
  });
}

/** Where, between two named points, the outline runs parallel to the line joining them; failing that, its middle. mm along its edge. */
function farthestMm(piece: Piece, edgeName: string, from: string, to: string): number {
  const chord = minus(pointOf(piece, to), pointOf(piece, from));
  const indices = walkFrom(piece, indexOfPoint(piece, from), indexOfPoint(piece, to));
  const before = piece.parts.slice(0, indices[0]).filter((one) => one.edge === edgeName);
  const startMm = before.reduce((total, { cubic }) => total + lengthOf(cubic), 0);
  let walked = startMm;
  for (const index of indices) {
    const { cubic } = piece.parts[index]!;
    const found = rootsOf((t) => cross(velocityAt(cubic, t), chord)).find((t) => t > 0.02 && t < 0.98);
    if (found !== undefined) return walked + lengthOf(cubic, 0, found);
    walked += lengthOf(cubic);
  }
  return (startMm + walked) / 2;
}

/** The outline between two points bowed outward (+) or inward at its farthest place, both ends and their directions kept. */
function bow(piece: Piece, edgeName: string, [from, to]: readonly [string, string], amountMm: number) {
  const peak = `${edgeName}-peak`;
  const named = hasPoint(piece, peak)
    ? piece
    : withPoint(piece, peak, { edge: edgeName, mm: farthestMm(piece, edgeName, from, to) });
  const { x, y } = unit(minus(pointOf(named, to), pointOf(named, from)));
  return {
    named,
    stretches: [stretch(from, peak, [0, 1]), stretch(peak, to, [1, 0])],
    by: times(xy(y, -x), amountMm),
  };
}

/** Hollow (+) or fill the crotch curve at its deepest place; point, notch and both directions stay. */
export function reshapeCurve(piece: Piece, amountMm: number): Outcome {
  const { named, stretches, by } = bow(piece, 'curve', ['notch', 'crotch-point'], -amountMm);
  return move(named, {
    stretches,
    by,
    declared: [
      changes(
        'the curve at its deepest place',
        { of: 'off-line', point: 'curve-peak', from: 'notch', to: 'crotch-point' },
        -amountMm,
      ),
      keeps('the crotch point', POINT),
      keeps('the centre', edge('centre')),
      keeps('the inseam', edge('inseam')),
    ],
  });
}

/** Round the side out (+) or flatten it between hip and waist; both points stay. */
export function reshapeSide(piece: Piece, amountMm: number): Outcome {
  const { named, stretches, by } = bow(piece, 'side', ['hip-out', 'side-waist'], amountMm);
  return move(named, {
    stretches,
    by,
    declared: [
      changes(
        'the side at its roundest place',
        { of: 'off-line', point: 'side-peak', from: 'hip-out', to: 'side-waist' },
        amountMm,
      ),
      keeps('the hip', { of: 'width', level: 'hip' }),
      keeps('the waist', edge('waist')),
    ],
  });
}

/** Let the hem fall lower (+) in its middle, both seams kept. */
export function slopeHem(piece: Piece, amountMm: number): Outcome {
  const named = withPoint(piece, 'hem-middle', { edge: 'hem', mm: edgeLength(piece, 'hem') / 2 });
  return move(named, {
    stretches: [stretch('hem-in', 'hem-middle', [0, 1]), stretch('hem-middle', 'hem-out', [1, 0])],
    by: xy(0, amountMm),
    declared: [
      changes(
        'the hem at its middle',
        { of: 'offset', point: 'hem-middle', from: 'hem-in', axis: 'y' },
        amountMm,
      ),
      keeps('the side', edge('side')),
      keeps('the inseam', edge('inseam')),
    ],
  });
}
