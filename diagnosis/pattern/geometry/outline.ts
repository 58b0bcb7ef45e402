import { isStraight, pointAt, velocityAt, type Cubic } from './cubic';
import { cross, distance, minus, plus, times, unit, xy, type XY } from './xy';

/** The area of a closed outline, mm², by Green's theorem on each cubic: exact, positive when it runs clockwise as drawn. */
export const areaOf = (cubics: readonly Cubic[]): number =>
  cubics.reduce((total, cubic) => total + cubicArea(cubic), 0);

/** ½∮(x dy − y dx) of one cubic, in closed form of its four points. */
function cubicArea({ from, control1, control2, to }: Cubic): number {
  return (
    (6 * cross(from, control1) +
      3 * cross(from, control2) +
      cross(from, to) +
      3 * cross(control1, control2) +
      3 * cross(control1, to) +
      6 * cross(control2, to)) /
    20
  );
}

/** Steps that one cubic is walked in so that the chords stay within `withinMm` of it (Wang's bound on the second difference). */
function stepsFor({ from, control1, control2, to }: Cubic, withinMm: number): number {
  const bend = (a: XY, b: XY, c: XY) => Math.hypot(a.x - 2 * b.x + c.x, a.y - 2 * b.y + c.y);
  const most = Math.max(bend(from, control1, control2), bend(control1, control2, to));
  return Math.max(1, Math.ceil(Math.sqrt((0.75 * most) / withinMm)));
}

/** The outline as points whose chords stay within `withinMm` of it; the first point is not repeated. */
export function flatten(cubics: readonly Cubic[], withinMm: number): XY[] {
  return cubics.flatMap((cubic) => {
    const steps = isStraight(cubic) ? 1 : stepsFor(cubic, withinMm);
    return Array.from({ length: steps }, (_, step) => pointAt(cubic, step / steps));
  });
}

const normal = (direction: XY) => {
  const { x, y } = unit(direction);
  return xy(y, -x);
};

/** One cubic moved outward by `mm` all along, as points that lie exactly so far from it. */
export function offsetPoints(cubic: Cubic, mm: number, withinMm: number): XY[] {
  const steps = isStraight(cubic) ? 1 : stepsFor(cubic, withinMm);
  return Array.from({ length: steps + 1 }, (_, step) => {
    const t = step / steps;
    const velocity = velocityAt(cubic, t);
    // A handle that lies on its point gives no direction there: look a little further on.
    const usable =
      Math.hypot(velocity.x, velocity.y) > 1e-9 ? velocity : velocityAt(cubic, t < 0.5 ? t + 1e-4 : t - 1e-4);
    return plus(pointAt(cubic, t), times(normal(usable), mm));
  });
}

/** Where two lines meet, each given by two of its points; null for parallels. */
export function meeting(a: XY, b: XY, c: XY, d: XY): XY | null {
  const [r, s] = [minus(b, a), minus(d, c)];
  const turn = cross(r, s);
  if (Math.abs(turn) < 1e-9) return null;
  return plus(a, times(r, cross(minus(c, a), s) / turn));
}

const apart = (a: XY, b: XY, c: XY, d: XY) =>
  Math.max(a.x, b.x) < Math.min(c.x, d.x) ||
  Math.max(c.x, d.x) < Math.min(a.x, b.x) ||
  Math.max(a.y, b.y) < Math.min(c.y, d.y) ||
  Math.max(c.y, d.y) < Math.min(a.y, b.y);

/** Whether two pieces of a drawn line cross between their ends. */
function crossEachOther(a: XY, b: XY, c: XY, d: XY): boolean {
  if (apart(a, b, c, d)) return false;
  const side = (p: XY, q: XY, r: XY) => cross(minus(q, p), minus(r, p));
  return side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;
}

/** Whether a closed outline crosses itself, looked at in chords within `withinMm` of it. */
export function crossesItself(cubics: readonly Cubic[], withinMm = 0.05): boolean {
  const points = flatten(cubics, withinMm).filter(
    (point, index, all) => distance(point, all.at(index - 1)!) > 1e-9,
  );
  const count = points.length;
  const at = (index: number) => points[index % count]!;
  for (let first = 0; first < count; first++)
    for (let second = first + 2; second < count; second++) {
      if (first === 0 && second === count - 1) continue;
      if (crossEachOther(at(first), at(first + 1), at(second), at(second + 1))) return true;
    }
  return false;
}
