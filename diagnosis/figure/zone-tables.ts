import type { Zone } from '../garments/schema';

/** Levels of the standing garment: 0 the waist, 1 crotch level; below it before `height` is applied. */
export const LEVELS = {
  waist: 0,
  bandEdge: 0.12,
  waistDart: 0.29,
  highHip: 0.42,
  hip: 0.72,
  crotch: 1,
  thigh: 1.3,
  knee: 2.15,
  calf: 2.65,
  hem: 3.6,
} as const;

type ZoneTable = { readonly rows: readonly number[]; readonly zones: readonly (readonly Zone[])[] };

const across = (zone: Zone, count: number): Zone[] => Array.from({ length: count }, () => zone);

/** Columns: centre or inseam, inner, outer, pocket, side. */
export const FRONT_ZONES: ZoneTable = {
  rows: [0, 0.12, 0.29, 0.45, 0.64, 0.82, 1, 1.12, 1.3, 1.95, 2.4, 3.35, 3.6],
  zones: [
    across('waistband', 5),
    ['fly', 'waist-front', 'waist-front', 'pocket', 'waist-side'],
    ['fly', 'abdomen', 'abdomen', 'pocket', 'high-hip-side'],
    ['fly', 'abdomen', 'hip-front', 'pocket', 'hip-side'],
    ['fork-front', 'hip-front', 'hip-front', 'hip-front', 'hip-side'],
    ['fork-front', 'fork-front', 'thigh-front', 'thigh-front', 'side-seam'],
    ['fork-front', 'inner-thigh', 'thigh-front', 'thigh-front', 'side-seam'],
    ['inner-thigh', 'inner-thigh', 'thigh-front', 'thigh-front', 'side-seam'],
    ['inseam', 'thigh-front', 'thigh-front', 'thigh-front', 'side-seam'],
    ['inseam', 'knee', 'knee', 'knee', 'side-seam'],
    ['inseam', 'lower-leg', 'lower-leg', 'lower-leg', 'side-seam'],
    across('hem', 5),
  ],
};

export const BACK_ZONES: ZoneTable = {
  rows: [0, 0.12, 0.3, 0.48, 0.78, 0.94, 1, 1.12, 1.22, 1.5, 1.95, 2.4, 3.35, 3.6],
  zones: [
    across('waistband', 5),
    ['waist-back', 'waist-back', 'waist-back', 'waist-back', 'waist-side'],
    ['waist-back', 'waist-back', 'hip-back', 'hip-back', 'high-hip-side'],
    ['seat', 'seat', 'seat', 'hip-back', 'hip-side'],
    ['fork-back', 'seat', 'seat', 'hip-back', 'hip-side'],
    ['fork-back', 'under-seat', 'under-seat', 'under-seat', 'side-seam'],
    ['fork-back', 'under-seat', 'under-seat', 'under-seat', 'side-seam'],
    ['inner-thigh', 'under-seat', 'under-seat', 'under-seat', 'side-seam'],
    ['inner-thigh', 'inner-thigh', 'thigh-back', 'thigh-back', 'side-seam'],
    ['inseam', 'thigh-back', 'thigh-back', 'thigh-back', 'side-seam'],
    ['inseam', 'behind-knee', 'behind-knee', 'behind-knee', 'side-seam'],
    ['inseam', 'calf', 'calf', 'calf', 'side-seam'],
    across('hem', 5),
  ],
};

/** Columns from the front edge to the back edge: front, pocket, side seam, back, back edge. */
export const SIDE_ZONES: ZoneTable = {
  rows: [0, 0.12, 0.3, 0.5, 0.64, 0.86, 1.12, 1.95, 2.4, 3.35, 3.6],
  zones: [
    across('waistband', 5),
    ['waist-front', 'waist-front', 'waist-side', 'waist-back', 'waist-back'],
    ['abdomen', 'pocket', 'high-hip-side', 'hip-back', 'hip-back'],
    ['abdomen', 'pocket', 'hip-side', 'hip-back', 'seat'],
    ['hip-front', 'hip-front', 'hip-side', 'seat', 'seat'],
    ['thigh-front', 'thigh-front', 'side-seam', 'under-seat', 'under-seat'],
    ['thigh-front', 'thigh-front', 'side-seam', 'thigh-back', 'thigh-back'],
    ['knee', 'knee', 'side-seam', 'behind-knee', 'behind-knee'],
    ['lower-leg', 'lower-leg', 'side-seam', 'calf', 'calf'],
    across('hem', 5),
  ],
};

const CENTRE_ZONES = new Set<Zone>(['waistband', 'waist-back', 'fly', 'fork-front', 'fork-back']);

/** Whether the front and back views show the zone once on each side. */
export function isSidedZone(zone: Zone): boolean {
  return !CENTRE_ZONES.has(zone);
}
