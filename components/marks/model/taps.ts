import { POINTS_MAX } from '../mark-limits-schema';
import type { MarkKind, PhotoPoint } from './mark';

/** Points that have been set one by one; the line is made when `isDone`. */
export interface Taps {
  points: PhotoPoint[];
  isDone: boolean;
}

/** A pin has one point, a level two ends; every other line goes on until it is ended. */
const POINTS_WHOLE: Partial<Record<MarkKind, number>> = { pin: 1, tilt: 2 };
/** Screen pixels within which a tap means the last point again. Keys mean it only at the very same place. */
export const TAP_AGAIN_PX = 16;
export const KEY_AGAIN_PX = 0.5;

/**
 * Sets one more point, or ends the line by setting the last one again.
 * @param size of the photo on the screen, in pixels
 * @param againPx how near a point must lie to mean the last one
 */
export function tapAt(
  points: readonly PhotoPoint[],
  at: PhotoPoint,
  kind: MarkKind,
  size: { width: number; height: number },
  againPx: number,
): Taps {
  const last = points.at(-1);
  const isAgain = last && Math.hypot((at.x - last.x) * size.width, (at.y - last.y) * size.height) <= againPx;
  if (isAgain) return { points: [...points], isDone: points.length > 1 };
  const now = [...points, at];
  return { points: now, isDone: now.length >= (POINTS_WHOLE[kind] ?? POINTS_MAX) };
}
