import type { Body } from './case-schema';
import type { Knowledge } from './garments/schema';

type Level = Knowledge['dimensions'][number]['sizeLevel'];

/** Girths of the reference body, mm, that the tables of amounts are written for. */
const REFERENCE_MM = { waist: 800, hip: 1000, thigh: 600, knee: 400, calf: 360 } as const;
/** Lengths grow less than girths do. */
const LENGTH_RANGE = [0.8, 1.3] as const;
/** Beyond these a girth is taken for a slip of the tape, and scales stay where they can still be seen. */
const GIRTH_RANGE = [0.4, 3] as const;

/**
 * Factors that carry the tables' millimetres (scales, tolerances, first amounts, caps) to a body: the girth of the level
 * over the reference; lengths follow the hip within 0.8 to 1.3. A level that was not measured follows the hip.
 */
export function sizeFactors(body: Body): Record<Level, number> {
  const hip = body.hipMm / REFERENCE_MM.hip;
  const girth = (measuredMm: number | undefined, level: keyof typeof REFERENCE_MM) =>
    within(measuredMm === undefined ? hip : measuredMm / REFERENCE_MM[level], GIRTH_RANGE);
  return {
    waist: girth(body.waistMm, 'waist'),
    hip: girth(body.hipMm, 'hip'),
    thigh: girth(body.thighMm, 'thigh'),
    knee: girth(body.kneeMm, 'knee'),
    calf: girth(body.calfMm, 'calf'),
    length: within(hip, LENGTH_RANGE),
  };
}

function within(value: number, [low, high]: readonly [number, number]): number {
  return Math.min(high, Math.max(low, value));
}
