import { figurePoint, mirrorPoint, type FigurePoint } from './point';

/** A place that a curve passes at parameter `v`; the parameters of a curve's knots rise strictly. */
export type Knot = { readonly v: number; readonly x: number; readonly y: number };
export type Curve = { readonly knots: readonly Knot[] };
export type CubicSegment = {
  readonly from: FigurePoint;
  readonly control1: FigurePoint;
  readonly control2: FigurePoint;
  readonly to: FigurePoint;
};

export function knot(v: number, x: number, y = v): Knot {
  return { v, x, y };
}

function slopeAt(knots: readonly Knot[], index: number, axis: 'x' | 'y'): number {
  const before = knots[Math.max(0, index - 1)]!;
  const after = knots[Math.min(knots.length - 1, index + 1)]!;
  return (after[axis] - before[axis]) / (after.v - before.v);
}

/**
 * The curve as cubic Béziers: a cubic Hermite spline whose tangents are the chords through each knot's neighbours
 * (Catmull & Rom 1974, "A class of local interpolating splines"), so that it bends only near a moved knot.
 */
export function curveSegments({ knots }: Curve): CubicSegment[] {
  return knots.slice(1).map((end, index) => {
    const start = knots[index]!;
    const third = (end.v - start.v) / 3;
    return {
      from: figurePoint(start.x, start.y),
      control1: figurePoint(
        start.x + slopeAt(knots, index, 'x') * third,
        start.y + slopeAt(knots, index, 'y') * third,
      ),
      control2: figurePoint(
        end.x - slopeAt(knots, index + 1, 'x') * third,
        end.y - slopeAt(knots, index + 1, 'y') * third,
      ),
      to: figurePoint(end.x, end.y),
    };
  });
}

/** The point of one cubic Bézier at `t` (0–1). */
export function pointOnCubic(segment: CubicSegment, t: number): FigurePoint {
  const s = 1 - t;
  const [w0, w1, w2, w3] = [s * s * s, 3 * s * s * t, 3 * s * t * t, t * t * t];
  return figurePoint(
    w0 * segment.from.x + w1 * segment.control1.x + w2 * segment.control2.x + w3 * segment.to.x,
    w0 * segment.from.y + w1 * segment.control1.y + w2 * segment.control2.y + w3 * segment.to.y,
  );
}

/** The points of a curve by parameter `v`; outside the knots, the nearest end. Segments are worked out once. */
export function curveReader(curve: Curve): (v: number) => FigurePoint {
  const { knots } = curve;
  const segments = curveSegments(curve);
  return (v) => {
    const found = knots.findIndex((next, index) => index > 0 && v <= next.v);
    const index = (found === -1 ? knots.length - 1 : found) - 1;
    const [start, end] = [knots[index]!, knots[index + 1]!];
    const t = Math.min(1, Math.max(0, (v - start.v) / (end.v - start.v)));
    if (t === 0) return segments[index]!.from;
    if (t === 1) return segments[index]!.to;
    return pointOnCubic(segments[index]!, t);
  };
}

/** The same path on the other side of the body. */
export function mirrorSegments(segments: readonly CubicSegment[]): CubicSegment[] {
  return segments.map(({ from, control1, control2, to }) => ({
    from: mirrorPoint(from),
    control1: mirrorPoint(control1),
    control2: mirrorPoint(control2),
    to: mirrorPoint(to),
  }));
}

/** The same path walked the other way. */
export function reverseSegments(segments: readonly CubicSegment[]): CubicSegment[] {
  return segments
    .map(({ from, control1, control2, to }) => ({
      from: to,
      control1: control2,
      control2: control1,
      to: from,
    }))
    .reverse();
}

/** A straight line as one cubic. */
export function straightSegment(from: FigurePoint, to: FigurePoint): CubicSegment {
  const at = (t: number) => figurePoint(from.x + (to.x - from.x) * t, from.y + (to.y - from.y) * t);
  return { from, control1: at(1 / 3), control2: at(2 / 3), to };
}
