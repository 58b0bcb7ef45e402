/** A place on the paper, mm: `x` grows toward the inseam, `y` grows toward the hem. */
export interface XY {
  readonly x: number;
  readonly y: number;
}

export const xy = (x: number, y: number): XY => ({ x, y });
export const plus = (a: XY, b: XY): XY => ({ x: a.x + b.x, y: a.y + b.y });
export const minus = (a: XY, b: XY): XY => ({ x: a.x - b.x, y: a.y - b.y });
export const times = (a: XY, factor: number): XY => ({ x: a.x * factor, y: a.y * factor });
export const between = (a: XY, b: XY, t: number): XY => plus(a, times(minus(b, a), t));
export const cross = (a: XY, b: XY): number => a.x * b.y - a.y * b.x;
export const dot = (a: XY, b: XY): number => a.x * b.x + a.y * b.y;
export const distance = (a: XY, b: XY): number => Math.hypot(b.x - a.x, b.y - a.y);

/** The same direction with length 1; a vector of no length stays as it is. */
export function unit(a: XY): XY {
  const length = Math.hypot(a.x, a.y);
  return length === 0 ? a : times(a, 1 / length);
}

/** `a` turned round `centre`; a positive angle (radians) turns clockwise as drawn, since `y` grows downward. */
export function turn(a: XY, centre: XY, angle: number): XY {
  const { x, y } = minus(a, centre);
  const [sin, cos] = [Math.sin(angle), Math.cos(angle)];
  return { x: centre.x + x * cos - y * sin, y: centre.y + x * sin + y * cos };
}

/** The angle between two directions, degrees, 0–180. */
export const angleBetween = (a: XY, b: XY): number =>
  (Math.atan2(Math.abs(cross(a, b)), dot(a, b)) * 180) / Math.PI;
