import type { Side } from './point';

/**
 * What may differ between drawn figures. `hip`, `waist`, `thigh` and `height` multiply the reference; `front` (rounding of
 * the front), `seat` (rounding of the seat) and `legLine` (−1 knees near, +1 knees apart) lean from 0, the reference.
 */
export type Proportions = {
  readonly hip: number;
  readonly waist: number;
  readonly front: number;
  readonly seat: number;
  readonly thigh: number;
  readonly legLine: number;
  readonly height: number;
  readonly hipHigherSide: Side | null;
};

/** Least and greatest value of each proportion that the drawing holds for. */
export const PROPORTION_RANGES = {
  hip: { min: 0.8, max: 1.5 },
  waist: { min: 0.75, max: 1.8 },
  front: { min: -1, max: 1 },
  seat: { min: -1, max: 1 },
  thigh: { min: 0.8, max: 1.4 },
  legLine: { min: -1, max: 1 },
  height: { min: 0.85, max: 1.15 },
} as const;

export const REFERENCE_PROPORTIONS: Proportions = {
  hip: 1,
  waist: 1,
  front: 0,
  seat: 0,
  thigh: 1,
  legLine: 0,
  height: 1,
  hipHigherSide: null,
};

type Amount = keyof typeof PROPORTION_RANGES;

/** The nearest proportions that can be drawn; a value that is not a number becomes the reference. */
export function clampProportions(wanted: Partial<Proportions>): Proportions {
  const keep = (name: Amount): number => {
    const value = wanted[name];
    if (value === undefined || !Number.isFinite(value)) return REFERENCE_PROPORTIONS[name];
    return Math.min(PROPORTION_RANGES[name].max, Math.max(PROPORTION_RANGES[name].min, value));
  };
  return {
    hip: keep('hip'),
    waist: keep('waist'),
    front: keep('front'),
    seat: keep('seat'),
    thigh: keep('thigh'),
    legLine: keep('legLine'),
    height: keep('height'),
    hipHigherSide: wanted.hipHigherSide ?? null,
  };
}

/** The same body seen in a mirror. */
export function mirrorProportions(proportions: Proportions): Proportions {
  const { hipHigherSide } = proportions;
  if (hipHigherSide === null) return proportions;
  return { ...proportions, hipHigherSide: hipHigherSide === 'left' ? 'right' : 'left' };
}
