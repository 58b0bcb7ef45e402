import { POINTS_MAX } from '../mark-limits-schema';
import { type PhotoPoint, photoPoint } from './mark';
import { simplify } from './simplify';

interface Pixel {
  x: number;
  y: number;
}

/** Screen pixels: what a hand cannot hold steadier anyway. */
const TOLERANCE_PX = 1.5;
/** A stroke that never leaves this reach is a tap. */
export const TAP_PX = 8;

export function isTap(pixels: readonly Pixel[]): boolean {
  const [first] = pixels;
  return !first || pixels.every(({ x, y }) => Math.hypot(x - first.x, y - first.y) < TAP_PX);
}

/** More points than a hand draws in ten seconds; beyond them every so many are enough. */
const DRAWN_MAX = 2000;
/** A line that wants more points than there may be even at this tolerance is a scribble: it is thinned evenly. */
const TOLERANCE_MAX_PX = 6;

/** At most so many points, evenly chosen, first and last among them. */
function thinned<P>(points: readonly P[], most: number): P[] {
  if (points.length <= most) return [...points];
  const step = (points.length - 1) / (most - 1);
  return Array.from({ length: most }, (_, i) => points[Math.round(i * step)]!);
}

/**
 * A freehand stroke as a line of few points, first and last where they were drawn.
 * @param pixels on the screen, from the upper left of the photo
 * @param size of the photo on the screen, in the same pixels
 * @returns at most 400 points
 */
export function lineOf(pixels: readonly Pixel[], size: { width: number; height: number }): PhotoPoint[] {
  const drawn = thinned(pixels, DRAWN_MAX);
  let tolerancePx = TOLERANCE_PX;
  let kept = simplify(drawn, tolerancePx);
  while (kept.length > POINTS_MAX && tolerancePx < TOLERANCE_MAX_PX) {
    tolerancePx *= 2;
    kept = simplify(drawn, tolerancePx);
  }
  return thinned(kept, POINTS_MAX).map(({ x, y }) => photoPoint(x / size.width, y / size.height));
}
