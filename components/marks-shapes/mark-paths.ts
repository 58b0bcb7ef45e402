/** A place on the drawing, in its own pixels. */
export type PixelPoint = { readonly x: number; readonly y: number };

export type MarkKind = 'tight' | 'slack' | 'gap' | 'pooling' | 'tilt' | 'pin';
export type MarkStrength = 'faint' | 'clear' | 'pulling';

/** One stroke or filled spot of a mark. Widths and dashes are pixels of the drawing. */
export type MarkPath = {
  readonly d: string;
  readonly width: number;
  readonly dash: readonly number[] | null;
  readonly isFilled: boolean;
};

/** Line widths; the strengths also differ in ticks and spacing, so that they can be told apart in print and without colour. */
const WIDTH: Record<MarkStrength, number> = { faint: 1.75, clear: 2.75, pulling: 4 };
const SPREAD: Record<MarkStrength, number> = { faint: 5, clear: 7, pulling: 9.5 };
const TICK: Record<MarkStrength, number> = { faint: 5, clear: 7.5, pulling: 9 };

const number = (value: number) => (Math.round(value * 100) / 100).toString();
const text = ({ x, y }: PixelPoint) => `${number(x)} ${number(y)}`;

/** SVG path data through the points by straight lines: a mark stays exactly where it was drawn. */
export function polylinePath(points: readonly PixelPoint[]): string {
  return points.map((point, index) => `${index === 0 ? 'M' : 'L'}${text(point)}`).join('');
}

function unit(from: PixelPoint, to: PixelPoint): PixelPoint {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  return length === 0 ? { x: 1, y: 0 } : { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
}

/** Direction of travel at each point: the chord through its neighbours. */
function directions(points: readonly PixelPoint[]): PixelPoint[] {
  return points.map((_, i) => unit(points[Math.max(0, i - 1)]!, points[Math.min(points.length - 1, i + 1)]!));
}

/** The polyline moved sideways by pixels; + is to the right of travel on a drawing whose y runs down. */
export function offsetPolyline(points: readonly PixelPoint[], by: number): PixelPoint[] {
  const along = directions(points);
  return points.map(({ x, y }, i) => ({ x: x - along[i]!.y * by, y: y + along[i]!.x * by }));
}

function stroke(d: string, width: number, dash: readonly number[] | null = null): MarkPath {
  return { d, width, dash, isFilled: false };
}

/** A short line across the mark at a point. */
function tick(at: PixelPoint, along: PixelPoint, half: number, width: number): MarkPath {
  const [from, to] = [-half, half].map((by) => ({ x: at.x - along.y * by, y: at.y + along.x * by }));
  return stroke(polylinePath([from!, to!]), width);
}

function tightPaths(points: readonly PixelPoint[], strength: MarkStrength): MarkPath[] {
  const along = directions(points);
  const width = WIDTH[strength];
  const ends = [0, points.length - 1];
  const ticks = ends.map((i) => tick(points[i]!, along[i]!, TICK[strength], width));
  const inner = ends.map((i, end) => {
    const inward = (end === 0 ? 1 : -1) * (width + 3.5);
    const at = { x: points[i]!.x + along[i]!.x * inward, y: points[i]!.y + along[i]!.y * inward };
    return tick(at, along[i]!, TICK[strength], width * 0.75);
  });
  return [stroke(polylinePath(points), width), ...ticks, ...(strength === 'pulling' ? inner : [])];
}

function slackPaths(points: readonly PixelPoint[], strength: MarkStrength): MarkPath[] {
  const width = WIDTH[strength];
  const dash = [3 * width + 2, 2 * width + 2];
  return [-0.5, 0.5].map((side) =>
    stroke(polylinePath(offsetPolyline(points, side * SPREAD[strength])), width, dash),
  );
}

function gapPaths(points: readonly PixelPoint[], strength: MarkStrength): MarkPath[] {
  const arms = offsetPolyline(points, SPREAD[strength] * 1.6);
  return [stroke(polylinePath([arms[0]!, ...points, arms.at(-1)!]), WIDTH[strength])];
}

/** Cloth lying in heaps: a scalloped line. */
function poolingPaths(points: readonly PixelPoint[], strength: MarkStrength): MarkPath[] {
  const bump = SPREAD[strength] * 1.1;
  const parts = points.slice(1).map((to, i) => {
    const from = points[i]!;
    const length = Math.hypot(to.x - from.x, to.y - from.y);
    const count = Math.max(1, Math.round(length / (bump * 2)));
    const radius = number(length / count / 2);
    return Array.from({ length: count }, (_, k) => {
      const share = (k + 1) / count;
      const end = { x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share };
      return `A${radius} ${radius} 0 0 0 ${text(end)}`;
    }).join('');
  });
  return [stroke(`M${text(points[0]!)}${parts.join('')}`, WIDTH[strength])];
}

function circlePath({ x, y }: PixelPoint, radius: number): string {
  const r = number(radius);
  return `M${number(x - radius)} ${number(y)}a${r} ${r} 0 1 0 ${number(radius * 2)} 0a${r} ${r} 0 1 0 ${number(-radius * 2)} 0Z`;
}

/** A spirit level on the line: the bubble sits toward the higher end, and midway when the line is level. */
function tiltPaths(points: readonly PixelPoint[], strength: MarkStrength): MarkPath[] {
  const [from, to] = [points[0]!, points.at(-1)!];
  const width = WIDTH[strength];
  const along = unit(from, to);
  const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 };
  const [half, radius] = [16, 6.5];
  const place = (down: number, across: number): PixelPoint => ({
    x: middle.x + along.x * down - along.y * across,
    y: middle.y + along.y * down + along.x * across,
  });
  const r = number(radius);
  const vial =
    `M${text(place(-half, -radius))}L${text(place(half, -radius))}A${r} ${r} 0 0 1 ${text(place(half, radius))}` +
    `L${text(place(-half, radius))}A${r} ${r} 0 0 1 ${text(place(-half, -radius))}Z`;
  const shift = Math.max(-1, Math.min(1, -along.y * 4)) * (half - 3);
  return [
    stroke(polylinePath([from, place(-half - radius, 0)]), width),
    stroke(polylinePath([place(half + radius, 0), to]), width),
    stroke(vial, Math.min(width, 2.25)),
    { d: circlePath(place(shift, 0), radius - 2.5), width: 0, dash: null, isFilled: true },
  ];
}

/** A straight pin: the head at the first point, the point at the last. */
function pinPaths(points: readonly PixelPoint[], strength: MarkStrength): MarkPath[] {
  const [head, tip] = [points[0]!, points.at(-1)!];
  return [
    stroke(polylinePath([head, tip]), WIDTH[strength] * 0.75),
    { d: circlePath(head, 4.5), width: 0, dash: null, isFilled: true },
  ];
}

const SHAPES = {
  tight: tightPaths,
  slack: slackPaths,
  gap: gapPaths,
  pooling: poolingPaths,
  tilt: tiltPaths,
  pin: pinPaths,
} as const;

/**
 * The strokes of a mark along a polyline of pixels. Tight: solid with a tick at each end (two when pulling). Slack: a
 * double dashed line. Gap: an open bracket. Pooling: scallops. Tilt: a level with its bubble. Pin: a pin.
 * @returns no strokes for fewer than two points.
 */
export function markPaths(kind: MarkKind, points: readonly PixelPoint[], strength: MarkStrength): MarkPath[] {
  return points.length < 2 ? [] : SHAPES[kind](points, strength);
}
