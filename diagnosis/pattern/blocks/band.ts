import { straight, type Cubic } from '../geometry/cubic';
import { plus, times, xy, type XY } from '../geometry/xy';
import { part, type Part, type Piece } from '../piece';

/** An arc round `centre` as cubics of at most 15°, each with handles of 4/3·tan(θ/4) radii. */
function arc(centre: XY, radius: number, from: number, to: number): Cubic[] {
  const count = Math.max(1, Math.ceil(Math.abs(to - from) / (Math.PI / 12)));
  const step = (to - from) / count;
  const handle = (4 / 3) * Math.tan(step / 4) * radius;
  return Array.from({ length: count }, (_, index) => {
    const [a, b] = [from + index * step, from + (index + 1) * step];
    const at = (angle: number) => plus(centre, times(xy(Math.sin(angle), Math.cos(angle)), radius));
    const along = (angle: number) => times(xy(Math.cos(angle), -Math.sin(angle)), handle);
    return { from: at(a), control1: plus(at(a), along(a)), control2: plus(at(b), times(along(b), -1)), to: at(b) };
  }); // prettier-ignore
}

const named = (edge: string, cubics: readonly Cubic[], start: string): Part[] =>
  cubics.map((cubic, index) => part(edge, cubic, index === 0 ? start : undefined));

/**
 * Half a waistband, from centre back (left) to centre front, on the stitching line. Its lower edge is as long as the waist it is
 * sewn to; with `contourMm` the top edge is so much shorter (negative: longer), as a ring of paper round a cone. All mm.
 * @throws RangeError when the top edge would be shorter than half the lower.
 */
export function draftBand({
  lowerMm,
  heightMm,
  contourMm,
}: {
  lowerMm: number;
  heightMm: number;
  contourMm: number;
}): Piece {
  if (contourMm > lowerMm / 2) throw new RangeError('the band cannot be curved so much');
  const marks = { 'grain-top': xy(0, 0), 'grain-foot': xy(0, heightMm) };
  const allowancesMm = { upper: 10, front: 10, lower: 10 };
  if (Math.abs(contourMm) < 0.5) {
    const [a, b, c, d] = [xy(0, 0), xy(lowerMm, 0), xy(lowerMm, heightMm), xy(0, heightMm)] as const;
    const sides = [
      part('upper', straight(a, b), 'back-top'),
      part('front', straight(b, c), 'front-top'),
      part('lower', straight(c, d), 'front-foot'),
      part('back', straight(d, a), 'back-foot'),
    ];
    return { id: 'waistband', parts: sides, marks, folds: [], allowancesMm };
  }
  const angle = contourMm / heightMm;
  const radius = lowerMm / angle;
  const centre = xy(0, heightMm - radius);
  const top = arc(centre, radius - heightMm, 0, angle);
  const foot = arc(centre, radius, angle, 0);
  const parts = [
    ...named('upper', top, 'back-top'),
    part('front', straight(top.at(-1)!.to, foot[0]!.from), 'front-top'),
    ...named('lower', foot, 'front-foot'),
    part('back', straight(foot.at(-1)!.to, top[0]!.from), 'back-foot'),
  ];
  return { id: 'waistband', parts, marks, folds: [], allowancesMm };
}
