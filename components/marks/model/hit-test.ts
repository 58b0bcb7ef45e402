import type { Mark } from './mark';
import { distanceToChord } from './simplify';

/** Screen pixels around a mark that still mean it: half a fingertip. */
export const HIT_PX = 24;

interface Size {
  width: number;
  height: number;
}

/** Pixels between a place on the photo and the nearest spot of a mark. */
function distanceTo(mark: Mark, at: { x: number; y: number }, { width, height }: Size): number {
  const points = mark.points.map(({ x, y }) => ({ x: x * width, y: y * height }));
  const place = { x: at.x * width, y: at.y * height };
  const chords = points.slice(1).map((end, i) => distanceToChord(place, points[i]!, end));
  const [first] = points;
  if (!first) return Infinity;
  return chords.length > 0 ? Math.min(...chords) : Math.hypot(first.x - place.x, first.y - place.y);
}

/**
 * The mark that a touch means: the nearest within 24 pixels; of two as near, the one drawn last.
 * @param at fractions of the photo
 * @param size of the photo on the screen, in pixels
 */
export function markAt(marks: readonly Mark[], at: { x: number; y: number }, size: Size): Mark | null {
  let [found, nearest]: [Mark | null, number] = [null, HIT_PX];
  for (const mark of marks) {
    const distance = distanceTo(mark, at, size);
    if (distance <= nearest) [found, nearest] = [mark, distance];
  }
  return found;
}
