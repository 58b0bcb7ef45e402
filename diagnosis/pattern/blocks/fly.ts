import { straight, type Cubic } from '../geometry/cubic';
import { between, distance, minus, plus, times, unit, type XY } from '../geometry/xy';
import { indexOfPoint, part, walkFrom, type Piece } from '../piece';

/** Width of a fly facing, mm (common practice). */
const WIDTH_MM = 40;

/** A point of a centre cubic moved toward the side, square to the centre line. */
const inward = (point: XY, along: XY): XY => plus(point, times({ x: -along.y, y: along.x }, WIDTH_MM));

/**
 * The facing of a fly, on the stitching line: along the centre front of this very front from waist to notch, 40 mm wide, rounded
 * into the seam at its foot. It follows whatever was done to the front.
 */
export function draftFly(front: Piece): Piece {
  const centre = walkFrom(front, indexOfPoint(front, 'centre-waist'), indexOfPoint(front, 'notch')).map(
    (index) => front.parts[index]!,
  );
  const [top, foot] = [centre[0]!.cubic.from, centre.at(-1)!.cubic.to];
  const along = unit(minus(foot, top));
  const straightEnd = between(foot, top, Math.min(0.6, (1.5 * WIDTH_MM) / distance(foot, top)));
  const round: Cubic = {
    from: foot,
    control1: inward(between(foot, straightEnd, 0.15), times(along, 0.5)),
    control2: inward(between(foot, straightEnd, 0.4), along),
    to: inward(straightEnd, along),
  };
  return {
    id: 'fly',
    parts: [
      ...centre.map((one, index) => ({ ...one, start: index === 0 ? 'fly-top' : undefined })),
      part('outer', round, 'fly-foot'),
      part('outer', straight(round.to, inward(top, along))),
      part('waist', straight(inward(top, along), top), 'fly-side'),
    ],
    marks: { 'grain-top': between(top, inward(top, along), 0.5), 'grain-foot': between(straightEnd, round.to, 0.5) },
    folds: [],
    allowancesMm: { centre: 15, waist: 15 },
  }; // prettier-ignore
}
