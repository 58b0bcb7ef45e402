import type { MarkKind } from './model/mark';

interface Point {
  x: number;
  y: number;
}

/** A mark as strokes, in pixels of the surface it is drawn on. `dash` is empty for an unbroken line. */
export interface Stroke {
  d: string;
  width: number;
  dash: string;
}

const WIDTH = { 1: 2, 2: 3, 3: 4.5 } as const;
const n = (value: number) => Math.round(value * 100) / 100;

const polyline = (points: Point[]) =>
  points.map(({ x, y }, i) => `${i === 0 ? 'M' : 'L'}${n(x)} ${n(y)}`).join('');

/** The unit vector across the line at one of its ends. */
function across(points: Point[], atEnd: boolean): Point {
  const a = atEnd ? points.at(-2) : points[0];
  const b = atEnd ? points.at(-1) : points[1];
  if (!a || !b) return { x: 0, y: 1 };
  const length = Math.hypot(b.x - a.x, b.y - a.y) || 1;
  return { x: -(b.y - a.y) / length, y: (b.x - a.x) / length };
}

const tick = ({ x, y }: Point, way: Point, half: number) =>
  `M${n(x - way.x * half)} ${n(y - way.y * half)}L${n(x + way.x * half)} ${n(y + way.y * half)}`;

/** The same line moved sideways; normals are taken at each point from its neighbours. */
function beside(points: Point[], by: number): Point[] {
  return points.map((point, i) => {
    const way = across(
      [points[Math.max(0, i - 1)] ?? point, points[Math.min(points.length - 1, i + 1)] ?? point],
      false,
    );
    return { x: point.x + way.x * by, y: point.y + way.y * by };
  });
}

function bracket(points: Point[], depth: number): string {
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last) return '';
  const way = across([first, last], false);
  const out = ({ x, y }: Point) => ({ x: x + way.x * depth, y: y + way.y * depth });
  return polyline([out(first), first, last, out(last)]);
}

const circle = ({ x, y }: Point, r: number) =>
  `M${n(x - r)} ${n(y)}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0`;

const middle = (points: Point[]): Point => {
  const first = points[0] ?? { x: 0, y: 0 };
  const last = points.at(-1) ?? first;
  return { x: (first.x + last.x) / 2, y: (first.y + last.y) / 2 };
};

/**
 * Our own shapes, the same on photos, figures and paper, so that no colour has to carry the meaning: a tight line is solid with
 * a tick at each end, a slack fold a double dashed line, a gap an open bracket, pooling a row of arcs, a tilt a level with its
 * bubble, a pin a pin.
 * @param points in pixels
 * @param unit pixels that one drawn unit takes (1 on a screen at rest)
 */
export function markStrokes(kind: MarkKind, points: Point[], severity: 1 | 2 | 3, unit: number): Stroke[] {
  const width = WIDTH[severity] * unit;
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last) return [];
  const solid = (d: string, scale = 1): Stroke => ({ d, width: width * scale, dash: '' });
  switch (kind) {
    case 'tight':
      return [
        solid(polyline(points)),
        solid(tick(first, across(points, false), 8 * unit)),
        solid(tick(last, across(points, true), 8 * unit)),
      ];
    case 'slack': {
      const dash = `${n(9 * unit)} ${n(7 * unit)}`;
      return [-4, 4].map((by) => ({ d: polyline(beside(points, by * unit)), width: width * 0.8, dash }));
    }
    case 'gap':
      return [solid(bracket(points, 14 * unit))];
    case 'pooling':
      return [-7, 0, 7].map((by) => solid(polyline(beside(points, by * unit)), 0.6));
    case 'tilt':
      return [solid(polyline([first, last])), solid(circle(middle(points), 7 * unit), 0.8)];
    case 'pin':
      return [
        solid(circle(first, 5 * unit)),
        solid(
          polyline([first, points.length > 1 ? last : { x: first.x + 22 * unit, y: first.y + 22 * unit }]),
          0.7,
        ),
      ];
  }
}
