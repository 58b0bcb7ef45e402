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

/**
 * A freehand stroke as a line of few points, first and last where they were drawn.
 * @param pixels on the screen, from the upper left of the photo
 * @param size of the photo on the screen, in the same pixels
 * @returns at most 400 points: the tolerance grows until they suffice
 */
export function lineOf(pixels: readonly Pixel[], size: { width: number; height: number }): PhotoPoint[] {
  let tolerancePx = TOLERANCE_PX;
  let kept = simplify(pixels, tolerancePx);
  while (kept.length > POINTS_MAX) {
    tolerancePx *= 1.5;
    kept = simplify(pixels, tolerancePx);
  }
  return kept.map(({ x, y }) => photoPoint(x / size.width, y / size.height));
}
