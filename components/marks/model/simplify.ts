interface Point {
  x: number;
  y: number;
}

/** From a point to the nearest spot of the chord from a to b, in their unit. */
export function distanceToChord({ x, y }: Point, a: Point, b: Point): number {
  const square = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
  if (square === 0) return Math.hypot(x - a.x, y - a.y);
  const along = Math.min(1, Math.max(0, ((x - a.x) * (b.x - a.x) + (y - a.y) * (b.y - a.y)) / square));
  return Math.hypot(x - a.x - along * (b.x - a.x), y - a.y - along * (b.y - a.y));
}

/**
 * Fewer points on nearly the same line: every left-out point lies within the tolerance of what stays. First and last stay.
 * Source: Ramer (1972), "An iterative procedure for the polygonal approximation of plane curves"; Douglas and Peucker (1973).
 * @param tolerance in the unit of the points
 */
export function simplify<P extends Point>(points: readonly P[], tolerance: number): P[] {
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last || points.length < 3) return [...points];
  const kept = new Set([0, points.length - 1]);
  const spans: [number, number][] = [[0, points.length - 1]];
  for (let span = spans.pop(); span; span = spans.pop()) {
    const [from, to] = span;
    let farthest = -1;
    let distance = tolerance;
    for (let i = from + 1; i < to; i += 1) {
      const off = distanceToChord(points[i]!, points[from]!, points[to]!);
      if (off > distance) [farthest, distance] = [i, off];
    }
    if (farthest < 0) continue;
    kept.add(farthest);
    spans.push([from, farthest], [farthest, to]);
  }
  return points.filter((_, i) => kept.has(i));
}
