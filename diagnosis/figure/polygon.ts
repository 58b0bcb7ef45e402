import type { FigurePoint } from './point';

type XY = { readonly x: number; readonly y: number };

/** Area in squared figure units, positive for either direction of walking. */
export function polygonArea(polygon: readonly XY[]): number {
  let twice = 0;
  polygon.forEach((point, index) => {
    const next = polygon[(index + 1) % polygon.length]!;
    twice += point.x * next.y - next.x * point.y;
  });
  return Math.abs(twice) / 2;
}

/** Whether the polygon holds the point. Edges are half open, so that polygons which share an edge never both hold a point of it. */
export function polygonHolds(polygon: readonly XY[], point: XY): boolean {
  let inside = false;
  for (let i = 0, before = polygon.length - 1; i < polygon.length; before = i, i += 1) {
    const [a, b] = [polygon[before]!, polygon[i]!];
    if (a.y > point.y === b.y > point.y) continue;
    // Ordered by height, so that both owners of an edge compute the same crossing to the last digit.
    const [low, high] = a.y < b.y ? [a, b] : [b, a];
    const crossing = low.x + ((point.y - low.y) / (high.y - low.y)) * (high.x - low.x);
    if (point.x < crossing) inside = !inside;
  }
  return inside;
}

function turn(a: XY, b: XY, c: XY): number {
  return (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x);
}

function segmentsCross(a: XY, b: XY, c: XY, d: XY): boolean {
  if (Math.max(a.x, b.x) < Math.min(c.x, d.x) || Math.max(c.x, d.x) < Math.min(a.x, b.x)) return false;
  if (Math.max(a.y, b.y) < Math.min(c.y, d.y) || Math.max(c.y, d.y) < Math.min(a.y, b.y)) return false;
  return turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0;
}

/** Whether any two edges that are not neighbours cross. */
export function crossesItself(polygon: readonly XY[]): boolean {
  const count = polygon.length;
  for (let i = 0; i < count; i += 1) {
    for (let j = i + 2; j < count; j += 1) {
      if (i === 0 && j === count - 1) continue;
      const crossed = segmentsCross(polygon[i]!, polygon[i + 1]!, polygon[j]!, polygon[(j + 1) % count]!);
      if (crossed) return true;
    }
  }
  return false;
}

/** A place well inside the polygon for a label or focus mark: the middle of its widest level crossing. */
export function innerPoint(polygon: readonly FigurePoint[]): XY {
  const ys = polygon.map(({ y }) => y);
  const [top, bottom] = [Math.min(...ys), Math.max(...ys)];
  let best = { x: polygon[0]!.x, y: polygon[0]!.y, width: -1 };
  for (const share of [0.5, 0.4, 0.6, 0.3, 0.7]) {
    const y = top + (bottom - top) * share + 1e-9;
    const xs = polygon
      .flatMap((a, index) => {
        const b = polygon[(index + 1) % polygon.length]!;
        return a.y > y === b.y > y ? [] : [a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x)];
      })
      .sort((left, right) => left - right);
    for (let i = 0; i + 1 < xs.length; i += 2) {
      const width = xs[i + 1]! - xs[i]!;
      if (width > best.width + 1e-9) best = { x: (xs[i]! + xs[i + 1]!) / 2, y, width };
    }
  }
  return { x: best.x, y: best.y };
}
