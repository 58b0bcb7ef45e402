import type { FigurePoint } from '@/diagnosis/figure/point';
import type { DrawingSpace } from './drawing-space';

type XY = { x: number; y: number };

/** Points that stray from the line between their neighbours by less than this are left out, in viewBox units. */
const STRAY_MAX = 0.05;

function strayFrom(a: XY, b: XY, p: XY): number {
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  return length === 0 ? Infinity : Math.abs((b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x)) / length;
}

/** A zone as SVG path data. */
export function polygonPath(polygon: readonly FigurePoint[], { place }: DrawingSpace): string {
  const kept: XY[] = [];
  const placed = polygon.map(place);
  placed.forEach((point, index) => {
    const before = kept.at(-1);
    const after = placed[(index + 1) % placed.length]!;
    if (before === undefined || strayFrom(before, after, point) > STRAY_MAX) kept.push(point);
  });
  return `M${kept.map(({ x, y }) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`;
}
