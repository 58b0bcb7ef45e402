import type { MeasureId } from '../measuring/measures';

/** How many seam allowances lie in a measure taken across the paper's edges: round the garment, round one leg, or along a seam. */
const ALLOWANCES: Partial<Record<MeasureId, number>> = {
  waist: 8, 'high-hip': 8, hip: 8, // two fronts and two backs, an edge on either side of each
  thigh: 4, knee: 4, calf: 4, // one front and one back of a leg
  'front-crotch-length': 2, 'back-crotch-length': 2, // at the waist and at the inseam
  'crotch-length': 4, 'seated-depth': 1, inseam: 1, outseam: 1, // at the waist or at the fork; a hem is no allowance
}; // prettier-ignore

/** The length between seamlines of a measure that was taken over the allowances, mm. */
export const betweenSeamlinesMm = (measure: MeasureId, overEdgesMm: number, allowanceMm: number): number =>
  overEdgesMm - (ALLOWANCES[measure] ?? 0) * allowanceMm;
