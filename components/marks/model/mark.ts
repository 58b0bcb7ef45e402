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
  /** One for a pin, 2 to 400 for every other kind. */
  points: PhotoPoint[];
  note: string;
}

const within = (value: number) => Math.min(1, Math.max(0, value));

/** The only way to a point: what lies outside the photo is brought to its edge. Rounded to a millionth, far below a pixel. */
export const photoPoint = (x: number, y: number): PhotoPoint =>
  ({ x: Math.round(within(x) * 1e6) / 1e6, y: Math.round(within(y) * 1e6) / 1e6 }) as PhotoPoint;

/** A new mark as it is drawn: clear, on both sides until said otherwise. A pin keeps its first point. */
export const newMark = (id: string, kind: MarkKind, severity: MarkSeverity, points: PhotoPoint[]): Mark => ({
  id,
  kind,
  severity,
  side: 'both',
  points: kind === 'pin' ? points.slice(0, 1) : points,
  note: '',
});

/** The whole mark moved by fractions of the photo, as far as it stays on the photo. */
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

/** Fractions of the photo from a pin to the other end of the line that it is turned into. */
const GROWN = 0.08;

/** The same place called another kind: a pin that becomes a line grows a second end, a line that becomes a pin keeps its first. */
export function changeKind(mark: Mark, kind: MarkKind): Mark {
  const [first] = mark.points;
  if (!first || kind === mark.kind) return mark;
  if (kind === 'pin') return { ...mark, kind, points: [first] };
  if (mark.points.length > 1) return { ...mark, kind };
  const end = photoPoint(first.x > 0.5 ? first.x - GROWN : first.x + GROWN, first.y);
  return { ...mark, kind, points: [first, end] };
}

/** The fields of a mark and nothing else, in one order. */
export const bareMark = ({ id, kind, severity, side, points, note }: Mark): Mark => ({
  id,
  kind,
  severity,
  side,
  points: points.map(({ x, y }) => photoPoint(x, y)),
  note,
});

export function isSameMark(a: Mark, b: Mark): boolean {
  if (a === b) return true;
  return (
    a.id === b.id &&
    a.kind === b.kind &&
    a.severity === b.severity &&
    a.side === b.side &&
    a.note === b.note &&
    a.points.length === b.points.length &&
    a.points.every(({ x, y }, i) => x === b.points[i]?.x && y === b.points[i]?.y)
  );
}

/** Ids are made in order of time, so the order by id is the order of drawing, here and on the server. */
export const inOrder = (marks: readonly Mark[]): Mark[] =>
  [...marks].sort((a, b) => (a.id < b.id ? -1 : a.id > b.id ? 1 : 0));
