import type { Sign } from '../schema';

type Template = NonNullable<Sign['template']>;
type Range = { from: number; to: number };

/** Level, within 20 degrees. */
export const LEVEL: Range = { from: 70, to: 110 };
/** Along the leg, within 20 degrees of plumb. */
export const UPRIGHT: Range = { from: -20, to: 20 };
/** Going up it leans to the side seam (in side views: to the front). */
export const RISES_OUT: Range = { from: 100, to: 165 };
/** Going down it leans to the side seam (in side views: to the back). */
export const FALLS_OUT: Range = { from: 15, to: 80 };
/** Slanting one way or the other. */
export const SLANTING: Range = { from: 20, to: 160 };

interface Ends {
  anchor?: string;
  target?: string;
  /** Length over the figure's crotch depth. */
  length?: [from: number, to: number];
}

/** What a mark of a sign looks like on the figure. Directions and places are read from the sign's own description (common practice). */
export function mark(
  kinds: Template['kinds'][number] | Template['kinds'],
  angleDeg: Range | null,
  zones: Template['zones'],
  { anchor, target, length }: Ends = {},
): Template {
  return {
    zones,
    kinds: typeof kinds === 'string' ? [kinds] : kinds,
    angleDeg,
    anchor: anchor ?? null,
    target: target ?? null,
    lengthRatio: length ? { from: length[0], to: length[1] } : null,
  };
}
