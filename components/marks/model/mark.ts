declare const space: unique symbol;

/** A point on a photo as fractions of the current master's width and height, 0 … 1. */
export interface PhotoPoint {
  readonly x: number;
  readonly y: number;
  readonly [space]: 'photo';
}

export const MARK_KINDS = ['tight', 'slack', 'gap', 'pooling', 'tilt', 'pin'] as const;
export type MarkKind = (typeof MARK_KINDS)[number];
export type MarkSide = 'left' | 'right' | 'both';
export type MarkSeverity = 1 | 2 | 3;

export interface Mark {
  id: string;
  kind: MarkKind;
  severity: MarkSeverity;
  /** The wearer's side. */
  side: MarkSide;
  points: PhotoPoint[];
  note: string;
}

const within = (value: number) => Math.min(1, Math.max(0, value));

/** The only way to a point: what lies outside the photo is brought to its edge. Rounded to a millionth, far below a pixel. */
export const photoPoint = (x: number, y: number): PhotoPoint =>
  ({ x: Math.round(within(x) * 1e6) / 1e6, y: Math.round(within(y) * 1e6) / 1e6 }) as PhotoPoint;

/** The whole mark moved, as far as it stays on the photo. */
export function moveMark(mark: Mark, dx: number, dy: number): Mark {
  const xs = mark.points.map(({ x }) => x);
  const ys = mark.points.map(({ y }) => y);
  const clamp = (by: number, low: number, high: number) => Math.min(1 - high, Math.max(-low, by));
  const byX = clamp(dx, Math.min(...xs), Math.max(...xs));
  const byY = clamp(dy, Math.min(...ys), Math.max(...ys));
  return { ...mark, points: mark.points.map(({ x, y }) => photoPoint(x + byX, y + byY)) };
}

export const movePoint = (mark: Mark, index: number, to: PhotoPoint): Mark => ({
  ...mark,
  points: mark.points.map((point, i) => (i === index ? to : point)),
});
